import { formatSigned } from "@/lib/format/numbers";
import { directionLabel } from "@/lib/reflex/direction-label";
import { BLUNDERS, errorKind } from "@/lib/reflex/error-kind";
import { ALIGNED, BEYOND_LIMBUS, DEGREES_MAX, type ReadableFinding } from "@/lib/reflex/finding";
import { parseShorthand } from "@/lib/reflex/parse-shorthand";
import { signedComponents } from "@/lib/reflex/signed-components";
import { STEPS, stepOf } from "@/lib/reflex/step";
import { isWithinTolerance } from "@/lib/reflex/tolerance";
import { wilsonInterval } from "@/lib/statistics";
import { ends, known, type WorkedExample } from "./worked-example";

const WHOLE_DEGREES = Array.from({ length: DEGREES_MAX }, (_, index) => index + 1);

export function signedExample(): WorkedExample {
  const findings = ["ortho", "RET 20", "LXT 30", "RHT 10", "LHoT 10", "LXT 30 LHT 10", "RET >45"];
  return {
    data: "Findings as the trade writes them, by the same rule that scores them.",
    tables: [
      {
        caption: "Label and components",
        isText: true,
        heads: ["finding", "label", "horizontal", "vertical"],
        rows: findings.map((text) => {
          const finding = findingOf(text);
          const { horizontal, vertical } = signedComponents(finding);
          return { head: text, cells: [directionLabel(finding), ...[horizontal, vertical].map(signedText)] };
        }),
      },
    ],
    note: "ET esotropia, XT exotropia, HT hypertropia, HoT hypotropia; R and L are the patient’s eyes. RHT 10 and LHoT 10 have the same vertical component.",
  };
}

export function stepsExample(): WorkedExample {
  return {
    data: "Every whole number of degrees, by the same rule that scores a reading.",
    tables: [
      {
        caption: "Steps",
        isText: true,
        heads: ["step", "degrees"],
        rows: STEPS.map((step) => ({
          head: step === BEYOND_LIMBUS ? "beyond the limbus" : `${step}°`,
          cells: [
            step === BEYOND_LIMBUS ? ">45" : rangeOf([0, ...WHOLE_DEGREES].filter((size) => stepOf(size) === step)),
          ],
        })),
      },
    ],
  };
}

export function toleranceExample(): WorkedExample {
  const rightEso = (degrees: number): ReadableFinding => ({
    ...ALIGNED,
    eye: "right",
    horizontal: "eso",
    horizontalDegrees: degrees,
  });
  return {
    data: "Readings of a right esotropia that count as within tolerance, by the same rule that scores them.",
    tables: [
      {
        caption: "Accepted readings",
        isText: true,
        heads: ["reference", "accepted", "aligned accepted"],
        rows: [3, 5, 10, 20, 21, 30, 40].map((reference) => ({
          head: `${reference}°`,
          cells: [
            rangeOf(WHOLE_DEGREES.filter((read) => isWithinTolerance(rightEso(read), rightEso(reference)))),
            isWithinTolerance(ALIGNED, rightEso(reference)) ? "yes" : "no",
          ],
        })),
      },
    ],
    note: "A reading of “aligned” for a reference of 5° lies within tolerance in size; its direction label still differs, and that is counted as a squint missed.",
  };
}

/** Readings that show each kind: reference, reading. */
const PAIRS = [
  ["RET 20", "not readable: blurred"],
  ["ortho", "RET 10"],
  ["RET 20", "ortho"],
  ["RET 20", "RXT 20"],
  ["RHT 15", "RHoT 15"],
  ["RET 20", "LET 20"],
  ["RET 20 RHT 10", "RET 20"],
  ["RET 20 RHT 10", "RHT 10"],
  ["RET 15", "RET 30"],
  ["RET 15", "RET 22"],
] as const;

export function errorKindsExample(): WorkedExample {
  return {
    data: "One made-up reading for each kind, judged by the same rule that scores a round.",
    tables: [
      {
        caption: "Kinds, in the order in which they are looked for",
        isText: true,
        heads: ["reference", "reading", "kind", "blunder"],
        rows: PAIRS.map(([reference, reading]) => {
          const kind = errorKind(findingOf(reading), findingOf(reference));
          return { head: reference, cells: [reading, kind, kind && BLUNDERS.includes(kind) ? "yes" : "no"] };
        }),
      },
    ],
    note: "ET esotropia, XT exotropia, HT hypertropia, HoT hypotropia; R and L are the patient’s eyes.",
  };
}

export function agreementScoreExample(): WorkedExample {
  return {
    data: "Nine of ten cases read right, from more and more cases.",
    figures: [10, 20, 40, 100].map((n) => ({
      label: `${(n * 9) / 10} of ${n} read right`,
      value: ends(known(wilsonInterval((n * 9) / 10, n))),
      digits: 2,
    })),
    note: "From 10 cases the true share may be 0.60 or 0.98. Ninety per cent means little without the number of cases.",
  };
}

function signedText(degrees: number | null): string {
  return degrees === null ? "no number" : formatSigned(degrees, 0);
}

function findingOf(text: string) {
  const parsed = parseShorthand(text);
  if (!parsed.ok) throw new Error(`An example cannot be read: ${parsed.reason}`);
  return parsed.finding;
}

function rangeOf(sizes: readonly number[]): string {
  const [first] = sizes;
  return first === undefined ? "none" : `${first}° to ${sizes.at(-1)}°`;
}
