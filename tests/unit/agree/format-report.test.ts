import { describe, expect, it } from "vitest";
import { formatReport } from "@/lib/agree/format-report";
import type { Report, Statistic } from "@/lib/agree/report";

function report(...statistics: Statistic[]): Report {
  return {
    table: "findings",
    caseCount: 1,
    readingCount: 1234,
    examiners: ["A", "B"],
    rounds: ["1", "2"],
    hasReference: false,
    sections: statistics.length > 0 ? [{ title: "A section", statistics }] : [],
  };
}

function linesOf(statistic: Statistic): string[] {
  return formatReport(report(statistic)).split("\n").slice(4);
}

describe("formatReport", () => {
  it("says what the table holds", () => {
    const [first] = formatReport(report()).split("\n");
    expect(first).toBe("Findings: 1\u00a0234 readings, 2 examiners, 1 case, 2 rounds, without a reference.");
    const values: Report = { ...report(), table: "values", scale: "ordinal", rounds: [], hasReference: true };
    expect(formatReport(values)).toMatch(/^Values on the ordinal scale: .*1 case, with a reference\./);
  });

  it("prints figures with their intervals, a real minus sign, and fewer decimals the larger they are", () => {
    const result = {
      ok: true,
      n: 20,
      kappa: { estimate: -0.12345, standardError: 9, low: -0.5, high: 0.25 },
      observed: 12.3456,
      expected: 123.456,
      pabak: 1,
      exact: { lower: { low: -1.5, high: 2 } },
    };
    expect(linesOf({ statistic: "cohenKappa", of: "steps", variant: "linear weights", result })).toEqual([
      "  steps: Cohen's kappa, linear weights (n 20)",
      "    kappa                    −0.123 (−0.500 to 0.250)",
      "    observed                 12.35",
      "    expected                 123.5",
      "    PABAK                    1",
      "    exact",
      "      lower                    −1.500 to 2",
    ]);
  });

  it("says that fewer than 20 are too few to say, but counts rounds as rounds", () => {
    const result = { ok: true, n: 19 };
    expect(linesOf({ statistic: "cohenKappa", of: "direction", result })).toEqual([
      "  direction: Cohen's kappa (n 19, too few to say)",
    ]);
    expect(linesOf({ statistic: "ewma", of: "degrees", result, nOf: "round" })).toEqual([
      "  degrees: EWMA chart of bias (19 rounds)",
    ]);
  });

  it("gives the reason where there is no figure, of a list's entry too", () => {
    const reason = "one category only";
    expect(linesOf({ statistic: "gwetAC", of: "direction", result: { ok: false, n: 30, reason } })).toEqual([
      "  direction: Gwet's agreement coefficient: cannot be computed, one category only (n 30)",
    ]);
    const pairs = [
      { pair: "A and B", kappa: { estimate: 0.5, low: 0.25, high: 0.75 }, n: 30 },
      { pair: "A and C", ok: false, n: 3, reason },
    ];
    expect(
      linesOf({ statistic: "pairwiseKappa", of: "direction", result: { ok: true, n: 30, pairs } }).slice(1),
    ).toEqual([
      "    pairs",
      "      A and B: kappa 0.500 (0.250 to 0.750), n 30",
      "      A and C: cannot be computed, one category only",
    ]);
  });

  it("prints what is left out only where something is", () => {
    const leftOutOf = (leftOut: unknown) =>
      linesOf({ statistic: "limitsOfAgreement", of: "degrees", result: { ok: true, n: 30, leftOut } }).slice(1);
    expect(leftOutOf({ unread: 2, notReadable: 0, beyondLimbus: 1 })).toEqual([
      "    left out                 2 unread, 1 beyond limbus",
    ]);
    expect(leftOutOf({ unread: 0 })).toEqual([]);
    expect(leftOutOf(0)).toEqual([]);
    expect(leftOutOf(7)).toEqual(["    left out                 7 resamples that give no value"]);
  });

  it("does not print a p of 0", () => {
    const result = {
      ok: true,
      n: 30,
      p: 0.0004,
      icc11: { estimate: 0.5, p: 0.0000001 },
      icc21: { estimate: 0.5, p: 0.01 },
    };
    expect(linesOf({ statistic: "intraclassCorrelation", of: "degrees", result }).slice(1)).toEqual([
      "    p                        below 0.001",
      "    ICC(1,1)                 0.500, p below 0.001",
      "    ICC(2,1)                 0.500, p 0.010",
    ]);
  });

  it("keeps names longer than their column apart from the figure, and leaves empty lists out", () => {
    const result = { ok: true, n: 3, "horizontal direction reversed": 2, rounds: [] };
    expect(linesOf({ statistic: "errorKinds", of: "findings", result })).toEqual([
      "  findings: kinds of error (n 3)",
      "    horizontal direction reversed 2",
    ]);
  });
});
