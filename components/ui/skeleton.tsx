import type { ReactNode } from "react";
import { joinClasses } from "./join-classes";
import { SlowNote } from "./slow-note";

type SkeletonProps = {
  /** What is being fetched: "Loading progress". Spoken, not shown. */
  label: string;
  /** The sentence shown after eight seconds: what is still awaited and what is safe. */
  slow?: string;
  /** Skeleton lines and blocks in the shape of what will come. */
  children: ReactNode;
  className?: string;
};

export function Skeleton({ label, slow, children, className }: SkeletonProps) {
  return (
    <div role="status" className={className}>
      <span className="sr-only">{label}</span>
      {children}
      {slow && <SlowNote text={slow} />}
    </div>
  );
}

/** A line of text to come; give it a width. */
export function SkeletonLine({ className = "w-full" }: { className?: string }) {
  return <div aria-hidden="true" className={joinClasses("shimmer my-2.5 h-3.5 rounded-tag", className)} />;
}

/** A figure or picture to come; give it a height. */
export function SkeletonBlock({ className = "h-21" }: { className?: string }) {
  return <div aria-hidden="true" className={joinClasses("shimmer", className)} />;
}
