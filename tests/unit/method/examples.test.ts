import { describe, expect, it } from "vitest";
import * as data from "@/lib/method/examples";
import { bootstrapExample } from "@/lib/method/precision-examples";
import { errorKindsExample } from "@/lib/method/scoring-examples";
import { type FigureValue, formatFigure } from "@/lib/method/worked-example";
import { ERROR_KINDS } from "@/lib/reflex/error-kind";
import algorithmA from "../../reference/algorithm-a.json";
import arlCusum from "../../reference/arl-cusum.json";
import arlEwma from "../../reference/arl-ewma.json";
import cardiac from "../../reference/ba-cardiac-output-1999.json";
import peakFlow from "../../reference/ba-pefr-1986.json";
import bootstrap from "../../reference/bootstrap-intervals.json";
import cusumNist from "../../reference/chart-cusum-nist.json";
import ewmaNist from "../../reference/chart-ewma-nist.json";
import psychiatric from "../../reference/fleiss-1971-psychiatric.json";
import abstractors from "../../reference/gwet-table-3x3-abstractors.json";
import judges from "../../reference/icc-shrout-fleiss-1979.json";
import anxiety from "../../reference/irr-anxiety.json";
import diagnoses from "../../reference/kappa-fleiss-cohen-everitt-1969.json";
import paradox from "../../reference/kappa-paradox-feinstein-cicchetti-1990.json";
import krippendorff from "../../reference/krippendorff-4x12.json";
import dentists from "../../reference/loam-icc-dmfs-dentists.json";
import slopes from "../../reference/theil-sen.json";
import wilson from "../../reference/wilson-interval.json";
import { HELD } from "./held-figures";

const paradoxTable = (id: string) => paradox.data.cases.find((entry) => entry.id === id)?.table;
const creosote = algorithmA.data.cases.find(({ id }) => id === "creosote")?.values;
const oneOutlier = slopes.data.cases.find(({ id }) => id === "oneOutlier");
const runLengthOptions = (id: string) => arlEwma.data.cases.find((entry) => entry.id === id);

describe("the published tables behind the examples", () => {
  it.each([
    ["diagnoses", data.DIAGNOSES_1969, { categories: diagnoses.data.categories, table: diagnoses.data.table }],
    ["paradox A", data.PARADOX_1990.balanced, paradoxTable("paradox1a")],
    ["paradox B", data.PARADOX_1990.prevalent, paradoxTable("paradox1b")],
    ["anxiety", data.ANXIETY, anxiety.data.ratings],
    ["psychiatric ratings", data.PSYCHIATRIC_1971.ratings, psychiatric.data.ratings],
    [
      "psychiatric categories",
      data.PSYCHIATRIC_1971.categories,
      psychiatric.data.categoryNames.map((name) => name.toLowerCase()),
    ],
    ["Krippendorff", data.KRIPPENDORFF_2011, krippendorff.data.ratings],
    ["abstractors", data.ABSTRACTORS_2014.table, abstractors.data.table],
    ["judges", data.JUDGES_1979, judges.data.ratings],
    ["Wright", data.PEAK_FLOW_1986.wright, peakFlow.data.x],
    ["mini", data.PEAK_FLOW_1986.mini, peakFlow.data.y],
    ["Wright again", data.PEAK_FLOW_1986.wrightAgain, peakFlow.data.x2],
    ["mini again", data.PEAK_FLOW_1986.miniAgain, peakFlow.data.y2],
    ["ventriculography", data.CARDIAC_OUTPUT_1999.ventriculography, cardiac.data.RV],
    ["impedance", data.CARDIAC_OUTPUT_1999.impedance, cardiac.data.IC],
    ["dentists", data.DENTISTS_1986, dentists.data.ratings],
    ["Newcombe", data.NEWCOMBE_1998, wilson.data.cases.slice(0, 4).map(({ x, n }) => ({ count: x, n }))],
    ["one outlier", { id: "oneOutlier", ...data.ONE_OUTLIER }, oneOutlier],
    ["creosote", data.CREOSOTE_1998, creosote],
    ["EWMA", data.NIST_EWMA, (({ L: width, ...rest }) => ({ ...rest, width }))(ewmaNist.data)],
    ["CUSUM", data.NIST_CUSUM, cusumNist.data],
  ])("are those of the reference file: %s", (_, copied, reference) => {
    expect(copied).toEqual(reference);
  });

  it("name run length schemes whose shifts are in the reference file", () => {
    const { fast, slow, cusum, shifts } = data.RUN_LENGTH_SCHEMES;
    expect(runLengthOptions("LS90-0.5")).toMatchObject({ lambda: fast.lambda, L: fast.width });
    expect(runLengthOptions("LS90-0.03")).toMatchObject({ lambda: slow.lambda, L: slow.width });
    expect(arlCusum.data.cases[0]).toMatchObject(cusum);
    expect(arlCusum.data.cases[0]?.mu).toEqual(expect.arrayContaining([...shifts]));
  });
});

describe("the worked examples", () => {
  it.each(HELD)("come out as the reference file has them, in every digit shown: %s", (_, { figures = [] }, held) => {
    const against = figures.filter(({ printed, recomputed }) => printed !== undefined || recomputed !== undefined);
    expect(against.map(({ label }) => label).toSorted()).toEqual(Object.keys(held).toSorted());
    for (const { label, value, digits, printed, recomputed } of against) {
      const expected = held[label];
      if (expected === undefined) expect.fail(`the reference file has nothing for ${label}`);
      const shown = `${label}: ${formatFigure(expected, digits)}`;
      expect(`${label}: ${formatFigure(value, digits)}`).toBe(shown);
      expect(`${label}: ${formatFigure(printed ?? recomputed ?? Number.NaN, digits)}`).toBe(shown);
    }
  });

  it("give a bootstrap interval within the Monte Carlo error of the one from 200,000 resamples", () => {
    const [percentile, bca, formula] = bootstrapExample().figures ?? [];
    const { kappaUnweighted: expected } = bootstrap.expected.cases;
    const { monteCarloSeAtB2000: error } = expected;
    const distances = (value: FigureValue | undefined, low: number, high: number) =>
      Array.isArray(value) ? [Math.abs(value[0] - low), Math.abs(value[1] - high)] : [Number.NaN];
    // Five standard errors at 2,000 resamples, as the reference file allows.
    const [low = Number.NaN, high = Number.NaN] = distances(
      percentile?.value,
      expected.percentileLow,
      expected.percentileHigh,
    );
    expect(low).toBeLessThan(5 * error.percentileLow);
    expect(high).toBeLessThan(5 * error.percentileHigh);
    const [bcaLow = Number.NaN, bcaHigh = Number.NaN] = distances(bca?.value, expected.bcaLow, expected.bcaHigh);
    expect(bcaLow).toBeLessThan(5 * error.bcaLow);
    expect(bcaHigh).toBeLessThan(5 * error.bcaHigh);
    expect(percentile?.recomputed).toEqual([
      expect.closeTo(expected.percentileLow, 6),
      expect.closeTo(expected.percentileHigh, 6),
    ]);
    expect(bca?.recomputed).toEqual([expect.closeTo(expected.bcaLow, 6), expect.closeTo(expected.bcaHigh, 6)]);
    const { ciLow, ciHigh } = diagnoses.expected.unweighted;
    expect(formula?.value).toEqual([expect.closeTo(ciLow, 9), expect.closeTo(ciHigh, 9)]);
  });

  it("show every kind of error once, in the order of the list", () => {
    const rows = errorKindsExample().tables?.flatMap(({ rows }) => rows) ?? [];
    expect(rows.map(({ cells }) => cells[1])).toEqual(ERROR_KINDS);
  });
});
