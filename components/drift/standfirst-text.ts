import type { DriftBoard, DriftChart, DriftMeasure, DriftPoint } from "@/lib/drift/schema";

export const STATE_ORDER: DriftPoint["state"][] = ["action", "warning", "in", "none"];

/** The state of the latest round that has a figure. */
export function latestState({ points }: DriftChart): DriftPoint["state"] {
  return points.findLast(({ value }) => value !== undefined)?.state ?? "none";
}

const MEASURE_WORDS: Record<DriftMeasure, string> = {
  kappa: "direction kappa",
  size: "the size of deviations",
  horizontal: "horizontal bias",
  vertical: "vertical bias",
};

/** Who lies beyond a limit now, and whether the panel as a whole moved. */
export function driftStandfirst(board: DriftBoard, measure: DriftMeasure): string {
  const beyond = board.examiners.filter((row) => ["action", "warning"].includes(latestState(row[measure])));
  const names = beyond.map(({ name }) => name);
  const who =
    names.length === 0
      ? `In ${MEASURE_WORDS[measure]} nobody lies beyond a limit in the latest round.`
      : `In ${MEASURE_WORDS[measure]} ${listNames(names)} ${names.length === 1 ? "lies" : "lie"} beyond a limit in the latest round.`;
  const panel = latestState(board.panel[measure]);
  const whole =
    panel === "in" || panel === "none"
      ? "The panel as a whole is within its limits."
      : "The panel as a whole lies beyond its limits: look at the reference and the case set first.";
  return `${who} ${whole}`;
}

function listNames(names: string[]): string {
  return names.length < 2 ? names.join("") : `${names.slice(0, -1).join(", ")} and ${names.at(-1)}`;
}
