"use client";

import type { KeyboardEvent, PointerEvent } from "react";
import { joinClasses } from "@/components/ui/join-classes";
import { DEGREES_MAX, type Degrees } from "@/lib/reflex/finding";
import styles from "./landmark-rule.module.css";
import { LandmarkScale } from "./landmark-scale";
import { ariaPosition, percentAlongRule, speakDegrees, valueAfterKey, valueAtShare } from "./landmark-steps";

type LandmarkRuleProps = {
  /** What is measured: "Horizontal degrees". */
  label: string;
  value: Degrees | null;
  onChange: (value: Degrees) => void;
};

/**
 * Degrees by landmark: half an eye laid flat, from the pupil centre to the sclera. Drag, tap, or use the keys of a
 * slider: arrows by one degree, Page Up and Page Down (or Shift and an arrow) by landmark, Home and End to the ends.
 */
export function LandmarkRule({ label, value, onChange }: LandmarkRuleProps) {
  const change = (next: Degrees) => {
    if (next !== value) onChange(next);
  };
  const followPointer = (event: PointerEvent<HTMLDivElement>) => {
    const { left, width } = event.currentTarget.getBoundingClientRect();
    if (width > 0) change(valueAtShare((event.clientX - left) / width));
  };
  const onPointerDown = (event: PointerEvent<HTMLDivElement>) => {
    if (event.button !== 0) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    followPointer(event);
  };
  const onPointerMove = (event: PointerEvent<HTMLDivElement>) => {
    if (event.currentTarget.hasPointerCapture(event.pointerId)) followPointer(event);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLDivElement>) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const next = valueAfterKey(value, event.key, event.shiftKey);
    if (next === null) return;
    event.preventDefault();
    change(next);
  };
  return (
    <div
      role="slider"
      tabIndex={0}
      aria-label={`${label} by landmark`}
      aria-orientation="horizontal"
      aria-valuemin={value === null ? 0 : 1}
      aria-valuemax={DEGREES_MAX + 1}
      aria-valuenow={ariaPosition(value)}
      aria-valuetext={speakDegrees(value)}
      onPointerDown={onPointerDown}
      onPointerMove={onPointerMove}
      onKeyDown={onKeyDown}
      className={joinClasses("relative h-20 cursor-pointer touch-pan-y select-none", styles.rule)}
    >
      <LandmarkScale />
      {value !== null && <Thumb percent={percentAlongRule(value)} />}
    </div>
  );
}

/** A hairline with a glint in a ring, so that it is seen on pupil, iris and sclera alike. */
function Thumb({ percent }: { percent: number }) {
  return (
    <svg
      width={28}
      height={54}
      aria-hidden="true"
      className="pointer-events-none absolute top-0 -ml-3.5 block"
      style={{ left: `${percent}%` }}
    >
      <path d="M14 0V54" stroke="var(--paper)" strokeWidth={6} />
      <path d="M14 0V54" stroke="var(--ink)" strokeWidth={2} />
      <circle cx={14} cy={24} r={10.5} fill="var(--sheet)" stroke="var(--ink)" strokeWidth={3} />
      <circle cx={14} cy={24} r={4} fill="var(--brass-dot)" />
    </svg>
  );
}
