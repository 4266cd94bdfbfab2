import type { ReactNode } from "react";

type EmptyStateProps = {
  title: string;
  /** What will come, and when. */
  children: ReactNode;
  /** One thing to do meanwhile. */
  action?: ReactNode;
  level?: 2 | 3;
};

export function EmptyState({ title, children, action, level = 2 }: EmptyStateProps) {
  const Heading = level === 2 ? "h2" : "h3";
  return (
    <div className="border border-dashed border-edge px-5 py-7.5 text-center">
      <Heading className="text-h3">{title}</Heading>
      <p className="mx-auto mt-2 max-w-[38ch] text-ink-2">{children}</p>
      {action && <div className="mt-4">{action}</div>}
    </div>
  );
}
