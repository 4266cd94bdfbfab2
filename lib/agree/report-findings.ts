import {
  DIRECTION_LABELS,
  deviatingEye,
  directionLabel,
  horizontalDirection,
  verticalDirection,
} from "@/lib/reflex/direction-label";
import type { Finding } from "@/lib/reflex/finding";
import { nameVerticalOnEye } from "@/lib/reflex/name-vertical-on-eye";
import { signedComponents } from "@/lib/reflex/signed-components";
import { STEPS, stepOfFinding } from "@/lib/reflex/step";
import { compareDegrees, DEGREES_MEASURES, type DegreesMeasure, degreesFigures } from "@/lib/results/degrees-figures";
import { examinerFigures, onReferenceEye, type ShownItem } from "@/lib/results/examiner-figures";
import { panelFigures } from "@/lib/results/panel-figures";
import { cohenKappa } from "@/lib/statistics/cohen-kappa";
import { crossTable } from "@/lib/statistics/cross-table";
import { gwetAC } from "@/lib/statistics/gwet-ac";
import type { Label } from "@/lib/statistics/labels";
import type { BiasReading } from "@/lib/statistics/two-way-bias";
import { chartRounds } from "./chart-rounds";
import { compareAmong, compareLabels, describeCases, type LabelScale } from "./label-statistics";
import { arrangePanel, type LongReading, type Panel } from "./long-table";
import { measureAgainst, measureAmong, measureBias, measureRepeats } from "./measurement-statistics";
import { againstOwnRepeats, againstReference, amongExaminers, column, toReport } from "./panel-sections";
import type { Report, Section, Statistic } from "./report";

const COMPONENTS = ["horizontal", "vertical"] as const;
type Component = (typeof COMPONENTS)[number];

const DIRECTION: LabelScale = { of: "direction", categories: DIRECTION_LABELS, metric: "nominal" };
const STEP_SCALE: LabelScale = { of: "steps", categories: STEPS.map((_, index) => index), metric: "ordinal" };

/** Every statistic that applies to findings, against the reference where there is one. Throws TableError. */
export function reportFindings(readings: readonly LongReading<Finding>[]): Report {
  const panel = arrangePanel(readings);
  const shown = panel.references ? panel.examiners.map((_, index) => showingsOf(panel, index)) : [];
  return toReport(panel, { table: "findings" }, [
    ...againstReference(panel, (index) => statisticsAgainst(shown[index] ?? [])),
    ...(shown.length > 1 ? [allAgainst(panel, shown)] : []),
    ...amongExaminers(panel, () => statisticsAmong(panel)),
    ...againstOwnRepeats(panel, statisticsOfRepeats),
    ...panel.examiners.flatMap((examiner, index) => chartRounds(examiner, panel, shown[index] ?? [])),
  ]);
}

/** The cases with a reference, in the eyes of one examiner. The place in the table serves as their number. */
function showingsOf({ readings, references }: Panel<Finding>, examiner: number): ShownItem[] {
  return (references ?? []).flatMap((reference, row): ShownItem[] =>
    reference ? [{ itemId: String(row), kind: "first", reading: readings[row]?.[examiner] ?? null, reference }] : [],
  );
}

function statisticsAgainst(items: readonly ShownItem[]): Statistic[] {
  const figures = examinerFigures(items);
  const named = items.flatMap(({ reading, reference }) =>
    reading ? [{ reading: onReferenceEye(reading, reference), reference }] : [],
  );
  const labels = named.map(({ reading, reference }) => [directionLabel(reference), directionLabel(reading)]);
  const subScale = (of: string, labelOf: (finding: Finding) => Label | null): Statistic => {
    const table = crossTable(
      named.map(({ reference }) => labelOf(reference)),
      named.map(({ reading }) => labelOf(reading)),
    );
    return { statistic: "cohenKappa", of, result: table.ok ? cohenKappa(table.counts) : table };
  };
  return [
    { statistic: "cohenKappa", of: "direction", result: figures.kappa },
    { statistic: "wilsonInterval", of: "direction", variant: "same label", result: figures.observedAgreement },
    { statistic: "gwetAC", of: "direction", result: gwetAC(labels, { categories: DIRECTION_LABELS }) },
    {
      statistic: "wilsonInterval",
      of: "direction and degrees",
      variant: "same label and within tolerance",
      result: figures.withinTolerance,
    },
    subScale("horizontal direction", horizontalDirection),
    subScale("vertical direction", verticalDirection),
    subScale("deviating eye", deviatingEye),
    { statistic: "cohenKappa", of: "steps", variant: "linear weights", result: figures.stepsLinear },
    { statistic: "cohenKappa", of: "steps", variant: "quadratic weights", result: figures.stepsQuadratic },
    ...DEGREES_MEASURES.flatMap((measure) => degreesAgainst(items, measure)),
    {
      statistic: "errorKinds",
      of: "findings",
      result: {
        ok: true,
        n: figures.readCount,
        ...figures.errorCounts,
        "named on the other eye": figures.namedOnOtherEye,
      },
    },
  ];
}

/** With the number of readings that are left out of all three, and why, beside the limits. */
function degreesAgainst(items: readonly ShownItem[], measure: DegreesMeasure): Statistic[] {
  const { figures, pairs } = degreesFigures(items, measure);
  const statistics = measureAgainst(
    pairs.map((pair) => pair?.reading ?? null),
    pairs.map((pair) => pair?.reference ?? null),
    measure === "size" ? "size where the direction agrees" : `${measure} degrees`,
  );
  return statistics.map((statistic) =>
    statistic.statistic === "limitsOfAgreement"
      ? { ...statistic, result: { ...statistic.result, leftOut: figures.leftOut } }
      : statistic,
  );
}

/** All readings together, with intervals that resample cases; and the bias of each, freed from the cases read. */
function allAgainst(panel: Panel<Finding>, shown: readonly ShownItem[][]): Section {
  const figures = panelFigures(shown);
  const all = COMPONENTS.flatMap((component): Statistic[] => [
    { statistic: "limitsOfAgreement", of: `${component} degrees`, result: figures[component] },
    measureBias(differencesOf(panel, shown, component), `${component} degrees`),
  ]);
  return {
    title: "All against the reference",
    statistics: [{ statistic: "cohenKappa", of: "direction", result: figures.kappa }, ...all],
  };
}

function differencesOf(panel: Panel<Finding>, shown: readonly ShownItem[][], component: Component): BiasReading[] {
  return shown.flatMap((items, index) =>
    items.map((item) => {
      const compared = compareDegrees(item, component);
      const row = panel.rows[Number(item.itemId)];
      return {
        examiner: panel.examiners[index] ?? "",
        case: row?.case ?? "",
        ...(row?.round ? { round: row.round } : {}),
        difference: typeof compared === "string" ? null : compared.reading - compared.reference,
      };
    }),
  );
}

function statisticsAmong({ readings, references, rows, examiners }: Panel<Finding>): Statistic[] {
  const named = readings.map((row, index) => {
    const reference = references?.[index] ?? null;
    return row.map(
      (reading) => reading && (reference ? onReferenceEye(reading, reference) : nameVerticalOnEye(reading, "right")),
    );
  });
  const mapAll = <Out>(mapOne: (finding: Finding) => Out | null) =>
    named.map((row) => row.map((finding) => finding && mapOne(finding)));
  const labels = mapAll(directionLabel);
  return [
    ...compareAmong(labels, examiners, DIRECTION),
    ...compareAmong(mapAll(stepIndex), examiners, STEP_SCALE).filter(({ statistic }) => statistic !== "pairwiseKappa"),
    ...COMPONENTS.flatMap((component) =>
      measureAmong(
        mapAll((finding) => signedComponents(finding)[component]),
        examiners,
        `${component} degrees`,
      ),
    ),
    describeCases(
      labels,
      rows.map((row) => (row.round === null ? row.case : `${row.case} in round ${row.round}`)),
      "direction",
    ),
  ];
}

function statisticsOfRepeats(own: Finding[][]): Statistic[] {
  const labels = own.map((row) => row.map((finding) => directionLabel(nameVerticalOnEye(finding, "right"))));
  return [
    ...compareLabels(column(labels, 0), column(labels, 1), DIRECTION),
    ...COMPONENTS.map((component) =>
      measureRepeats(
        own.map((row) => row.map((finding) => signedComponents(finding)[component])),
        `${component} degrees`,
      ),
    ),
  ];
}

function stepIndex(finding: Finding): number | null {
  const step = stepOfFinding(finding);
  return step === null ? null : STEPS.indexOf(step);
}
