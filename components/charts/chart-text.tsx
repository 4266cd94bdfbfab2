import type { ReactNode } from "react";
import { joinClasses } from "@/components/ui/join-classes";

const TONES = {
  ink: "fill-ink",
  quiet: "fill-ink-2",
  hint: "fill-ink-3",
  cobalt: "fill-cobalt",
  brass: "fill-brass",
  tawny: "fill-tawny",
  oxide: "fill-oxide",
} as const;
export type Tone = keyof typeof TONES;

const FACES = { sans: "font-sans", mono: "font-mono tracking-[-0.01em]", note: "font-serif italic" } as const;

type ChartTextProps = {
  x: number;
  y: number;
  /** Real px: charts are drawn at their real width. 13 at least. */
  size?: number;
  tone?: Tone;
  face?: keyof typeof FACES;
  anchor?: "start" | "middle" | "end";
  isStrong?: boolean;
  /** A rim in the colour of the ground, for a label that may lie on a line or a point. */
  hasHalo?: boolean;
  children: ReactNode;
};

/** A text in a drawing. */
export function ChartText({
  x,
  y,
  size = 13,
  tone = "quiet",
  face = "sans",
  anchor,
  isStrong,
  hasHalo,
  children,
}: ChartTextProps) {
  return (
    <text
      x={x}
      y={y}
      fontSize={size}
      textAnchor={anchor}
      className={joinClasses(
        TONES[tone],
        FACES[face],
        isStrong && "font-semibold",
        hasHalo && "stroke-surface stroke-4 [paint-order:stroke] [stroke-linejoin:round]",
      )}
    >
      {children}
    </text>
  );
}
