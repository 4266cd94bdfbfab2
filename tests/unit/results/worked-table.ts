import { ALIGNED, type Finding } from "@/lib/reflex/finding";
import type { ShownItem } from "@/lib/results/examiner-figures";
import { deviation } from "../reflex/build-finding";

/** The same id for the same letter, as the database would give it. */
export const itemId = (letter: string) =>
  `00000000-0000-4000-8000-${letter.charCodeAt(0).toString().padStart(12, "0")}`;

export function shown(letter: string, reference: Finding, reading: Finding | null, kind: ShownItem["kind"] = "first") {
  return { itemId: itemId(letter), kind, reference, reading };
}

const notReadable: Finding = { readable: false, reason: "blurred" };

/**
 * Eight cases and a repeat, made up so that everything occurs once. What is in degrees is worked below in two columns:
 * signed components (eso +, right over left +) and size.
 *
 * | case | reference    | reading  | label  | error            | horizontal | vertical | size    | steps    |
 * |------|--------------|----------|--------|------------------|------------|----------|---------|----------|
 * | A    | L exo 20     | L exo 25 | agrees | -                | −25, −20   | 0, 0     | 25, 20  | 15 → 30  |
 * | B    | L exo 30     | R exo 30 | -      | other eye        | −30, −30   | 0, 0     | 30, 30  | 30 → 30  |
 * | C    | R eso 15     | R exo 15 | -      | reversed         | −15, +15   | 0, 0     | -       | 15 → 15  |
 * | D    | R hyper 10   | L hypo 10| agrees | -  (other eye)   | 0, 0       | +10, +10 | 10, 10  | 15 → 15  |
 * | E    | aligned      | aligned  | agrees | -                | 0, 0       | 0, 0     | -       | 0 → 0    |
 * | F    | not readable | L exo 30 | -      | not readable     | -          | -        | -       | -        |
 * | G    | L exo >45    | L exo 45 | agrees | size             | -          | 0, 0     | -       | >45 → 45 |
 * | H    | L exo 40     | unread   | -      | -                | -          | -        | -       | -        |
 */
export const WORKED_TABLE: ShownItem[] = [
  shown("A", deviation("left", { exo: 20 }), deviation("left", { exo: 25 })),
  shown("B", deviation("left", { exo: 30 }), deviation("right", { exo: 30 })),
  shown("C", deviation("right", { eso: 15 }), deviation("right", { exo: 15 })),
  shown("D", deviation("right", { hyper: 10 }), deviation("left", { hypo: 10 })),
  shown("E", ALIGNED, ALIGNED),
  shown("F", notReadable, deviation("left", { exo: 30 })),
  shown("G", deviation("left", { exo: ">45" }), deviation("left", { exo: 45 })),
  shown("H", deviation("left", { exo: 40 }), null),
  // A again, read quite differently: a repeat counts for nothing but its number.
  shown("I", deviation("left", { exo: 20 }), deviation("right", { eso: 1 }), "repeat"),
];
