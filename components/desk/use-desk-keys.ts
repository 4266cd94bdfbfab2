"use client";

import { useEffect, useEffectEvent } from "react";
import type { Answer } from "@/lib/desk/draft-finding";
import type { Degrees } from "@/lib/reflex/finding";

const ANSWERS: Record<string, Answer> = {
  r: { question: "eye", value: "right" },
  l: { question: "eye", value: "left" },
  n: { question: "eye", value: "none" },
  e: { question: "horizontal", value: "eso" },
  x: { question: "horizontal", value: "exo" },
  s: { question: "horizontal", value: "none" },
  u: { question: "vertical", value: "hyper" },
  d: { question: "vertical", value: "hypo" },
  v: { question: "vertical", value: "none" },
  q: { question: "readable", value: false },
};

/** Keys by their place, so that Shift gives the same landmark for the vertical part on every layout. */
const STEPS: Record<string, Degrees> = { Digit1: 15, Digit2: 30, Digit3: 45, Digit4: ">45" };

type DeskKeys = {
  onAnswer: (answer: Answer) => void;
  onSave: () => void;
  onStep: (by: 1 | -1) => void;
  /** Digits name the reasons while the question is why a picture cannot be read. */
  onReason: ((position: number) => void) | null;
  /** Which part digits set without Shift: the vertical one where it is the only one that deviates. */
  digitsSet: "horizontalDegrees" | "verticalDegrees";
};

/** The keys of the desk. They rest while a field has the focus, a dialog is open, or a modifier belongs to the system. */
export function useDeskKeys({ onAnswer, onSave, onStep, onReason, digitsSet }: DeskKeys): void {
  const press = useEffectEvent((event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey || event.isComposing || isTyping(event.target)) return;
    const given = ANSWERS[event.key.toLowerCase()];
    const step = STEPS[event.code];
    if (given) onAnswer(given);
    else if (onReason && /^Digit[1-9]$/.test(event.code)) onReason(Number(event.code.slice(5)));
    else if (step) onAnswer({ question: event.shiftKey ? "verticalDegrees" : digitsSet, value: step });
    else if (event.key === "Enter" && !isControl(event.target)) onSave();
    else if (event.key === ",") onStep(-1);
    else if (event.key === ".") onStep(1);
    else return;
    event.preventDefault();
  });
  useEffect(() => {
    const listener = (event: KeyboardEvent) => press(event);
    document.addEventListener("keydown", listener);
    return () => document.removeEventListener("keydown", listener);
  }, []);
}

function isTyping(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false;
  if (target.closest("dialog[open]")) return true;
  return target.matches("textarea, select, input:not([type=radio]):not([type=checkbox])");
}

/** Enter on a button or link is its own. */
function isControl(target: EventTarget | null): boolean {
  return target instanceof HTMLElement && target.closest("button, a, summary") !== null;
}
