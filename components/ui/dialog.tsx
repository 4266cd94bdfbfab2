"use client";

import { type ReactNode, useEffect, useId, useRef } from "react";
import { joinClasses } from "./join-classes";

type DialogProps = {
  isOpen: boolean;
  /** Asked for by Escape. The caller decides. */
  onClose: () => void;
  title: string;
  className?: string;
  children: ReactNode;
};

/**
 * The browser's own modal dialog: it holds the focus, makes the page behind it inert and gives the focus back.
 * Focus starts on the title, so that nothing is done by an Enter meant for the page before.
 */
export function Dialog({ isOpen, onClose, title, className, children }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const heading = useRef<HTMLHeadingElement>(null);
  const titleId = useId();
  useEffect(() => {
    if (isOpen && !dialog.current?.open) {
      dialog.current?.showModal();
      heading.current?.focus();
    }
    if (!isOpen) dialog.current?.close();
  }, [isOpen]);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      className={joinClasses(
        "m-auto max-h-[calc(100dvh-2rem)] w-[min(33.75rem,calc(100vw-2rem))] overflow-y-auto border border-ink bg-sheet p-4 text-ink shadow-float backdrop:bg-pupil/45 sm:p-6.5",
        className,
      )}
    >
      <h2 ref={heading} id={titleId} tabIndex={-1} className="mb-2.5 text-h2 outline-none">
        {title}
      </h2>
      {isOpen && children}
    </dialog>
  );
}
