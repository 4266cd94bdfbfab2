import { cusum, ewma, runLength, shewhart } from "@/lib/statistics";
import { NIST_CUSUM, NIST_EWMA, RUN_LENGTH_SCHEMES } from "./examples";
import { known, present, type WorkedExample } from "./worked-example";

const NIST = "NIST/SEMATECH e-Handbook of Statistical Methods";

export function shewhartExample(): WorkedExample {
  const { values, target, sigma } = NIST_EWMA;
  const { points } = known(shewhart(values, { target, sigma }));
  const { lower, upper } = present(points[0]);
  return {
    data: `20 values, target 50, sigma 2.0539: the data of the EWMA example, ${NIST}, section 6.3.2.4.`,
    figures: [
      { label: "Action limits", value: [lower, upper], digits: 2 },
      { label: "Points beyond them", value: points.filter(({ state }) => state === "action").length, digits: 0 },
      { label: "False alarm once in so many points", value: runLength.ewma({ lambda: 1, width: 3 }), digits: 0 },
      {
        label: "Points until a shift of 1 sigma is seen",
        value: runLength.ewma({ lambda: 1, width: 3, shift: 1 }),
        digits: 0,
      },
    ],
    note: "The handbook prints no Shewhart chart of these data. The average run lengths are those of an EWMA with lambda 1, which is this chart.",
  };
}

export function ewmaExample(): WorkedExample {
  const { values, ...options } = NIST_EWMA;
  const { points } = known(ewma(values, { ...options, limits: "steady" }));
  const average = (point: number) => present(points[point - 1]).statistic;
  const { lower, upper } = present(points[0]);
  return {
    data: `20 values, target 50, sigma 2.0539, lambda 0.3, width 3: ${NIST}, section 6.3.2.4.`,
    tables: [
      valuesTable("Values and averages", values, ["average"], (index) => [points[index]?.statistic.toFixed(2) ?? null]),
    ],
    figures: [
      { label: "Average after point 1", value: average(1), digits: 2, printed: 50.6 },
      { label: "Average after point 8", value: average(8), digits: 2, printed: 49.85 },
      { label: "Average after point 20", value: average(20), digits: 2, printed: 51.99 },
      { label: "Steady limits", value: [lower, upper], digits: 2, printed: [47.41, 52.59] },
      {
        label: "Points beyond them",
        value: points.filter(({ state }) => state === "action").length,
        digits: 0,
        printed: 0,
      },
    ],
    note: "Quoted from memory of the public page and checked by recomputation. The page prints the limits as 47.4115 and 52.5884, from a rounded root.",
  };
}

export function cusumExample(): WorkedExample {
  const { values, ...options } = NIST_CUSUM;
  const { points } = known(cusum(values, { ...options, sigma: 1 }));
  const upper = (point: number) => present(points[point - 1]).upper;
  const firstSignal = points.findIndex(({ state }) => state === "action") + 1;
  return {
    data: `20 values, target 325, slack 0.3175, decision interval 4.1959: ${NIST}, section 6.3.2.3.`,
    tables: [
      valuesTable("Values and sums", values, ["upper sum", "lower sum"], (index) => {
        const point = points[index];
        return point ? [point.upper.toFixed(2), point.lower.toFixed(2)] : [];
      }),
    ],
    figures: [
      { label: "Upper sum after point 13", value: upper(13), digits: 2, printed: 3.01 },
      { label: "Upper sum after point 14", value: upper(14), digits: 2, printed: 4.94 },
      { label: "Lower sum after point 8", value: present(points[7]).lower, digits: 2, printed: 0.72 },
      { label: "First signal at point", value: firstSignal, digits: 0, printed: 14 },
    ],
    note: "Quoted from memory of the public page and checked by recomputation.",
  };
}

export function runLengthExample(): WorkedExample {
  const { fast, slow, cusum: scheme, shifts } = RUN_LENGTH_SCHEMES;
  const printed = {
    fast: [500, 255, 88.8, 17.5, 3.63],
    slow: [500, 76.7, 29.3, 12.6, 5.99],
    cusum: [168, 74.2, 26.6, 8.38, 3.34],
  };
  const digits = { fast: [0, 0, 1, 1, 2], slow: [0, 1, 1, 1, 2], cusum: [0, 1, 1, 2, 2] };
  const figures = (name: keyof typeof printed, label: string, at: (shift: number) => number) =>
    shifts.map((shift, index) => ({
      label: `${label}, shift ${shift}`,
      value: at(shift),
      digits: digits[name][index] ?? 0,
      printed: printed[name][index],
    }));
  return {
    data: "EWMA: Lucas & Saccucci (1990), table 3. CUSUM: Lucas & Crosier (1982), table 1. Shifts in sigma.",
    figures: [
      ...figures("fast", "EWMA 0.5, width 3.071", (shift) => runLength.ewma({ ...fast, shift })),
      ...figures("slow", "EWMA 0.03, width 2.437", (shift) => runLength.ewma({ ...slow, shift })),
      ...figures("cusum", "CUSUM k 0.5, h 4", (shift) => runLength.cusum({ ...scheme, shift })),
    ],
    note: "A small lambda sees half a sigma after 29 points and a large one after 89; for a shift of two sigma it is the other way round.",
  };
}

function valuesTable(
  caption: string,
  values: readonly number[],
  heads: readonly string[],
  cellsAt: (index: number) => (string | null)[],
) {
  return {
    caption,
    heads: ["point", "value", ...heads],
    rows: values.map((value, index) => ({ head: `${index + 1}`, cells: [value, ...cellsAt(index)] })),
    isLong: true,
  };
}
