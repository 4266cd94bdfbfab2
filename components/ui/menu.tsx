"use client";

import { ChevronDown } from "lucide-react";
import { type KeyboardEvent, type ReactNode, useEffect, useId, useRef, useState } from "react";
import { Icon } from "./icon";
import { joinClasses } from "./join-classes";

type MenuProps = {
  /** What stands on the button. */
  label: ReactNode;
  /** Sections, links, buttons. They are ordinary controls reached by Tab, not an application menu. */
  children: ReactNode;
  className?: string;
};

/** A button that shows and hides a panel. Escape, a press outside, leaving it and following a link all close it. */
export function Menu({ label, children, className }: MenuProps) {
  const [isOpen, setIsOpen] = useState(false);
  const root = useRef<HTMLDivElement>(null);
  const button = useRef<HTMLButtonElement>(null);
  const panelId = useId();

  useEffect(() => {
    if (!isOpen) return;
    const closeOutside = (event: PointerEvent) => {
      if (event.target instanceof Node && !root.current?.contains(event.target)) setIsOpen(false);
    };
    document.addEventListener("pointerdown", closeOutside);
    return () => document.removeEventListener("pointerdown", closeOutside);
  }, [isOpen]);

  const closeOnEscape = (event: KeyboardEvent) => {
    if (event.key !== "Escape" || !isOpen) return;
    event.stopPropagation();
    setIsOpen(false);
    button.current?.focus();
  };
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: it listens for Escape from the controls inside it
    <div
      ref={root}
      onKeyDown={closeOnEscape}
      onBlur={(event) => {
        if (event.relatedTarget && !event.currentTarget.contains(event.relatedTarget)) setIsOpen(false);
      }}
      className={joinClasses("relative flex print:hidden", className)}
    >
      <button
        ref={button}
        type="button"
        aria-expanded={isOpen}
        aria-controls={isOpen ? panelId : undefined}
        onClick={() => setIsOpen(!isOpen)}
        className="flex min-h-touch min-w-0 items-center gap-2 rounded-control px-2 text-left text-small hover:bg-sunk"
      >
        {label}
        <Icon icon={ChevronDown} />
      </button>
      {isOpen && (
        // biome-ignore lint/a11y/noStaticElementInteractions: it closes after a link inside it was followed
        // biome-ignore lint/a11y/useKeyWithClickEvents: following a link by keyboard is a click too
        <div
          id={panelId}
          onClick={(event) => {
            if (event.target instanceof Element && event.target.closest("a")) setIsOpen(false);
          }}
          className="absolute top-full right-0 z-20 mt-1 w-[min(20rem,calc(100vw-2rem))] border border-ink bg-sheet py-1 text-body shadow-float"
        >
          {children}
        </div>
      )}
    </div>
  );
}
