import { describe, expect, it } from "vitest";
import * as statistics from "@/lib/statistics";

describe("the public arithmetic", () => {
  it("exports these names and no others", () => {
    expect(Object.keys(statistics).sort()).toEqual(
      [
        ...["crossTable", "cohenKappa", "fleissKappa", "lightKappa", "congerKappa", "pairwiseKappa"],
        ...["krippendorffAlpha", "gwetAC", "intraclassCorrelation", "limitsOfAgreement", "limitsWithReplicates"],
        ...["repeatability", "limitsWithMean", "concordance", "ewma", "cusum", "shewhart", "runLength"],
        ...["widthForRunLength", "decisionIntervalForRunLength", "robustLocationScale", "zScores"],
        ...["bootstrapInterval", "wilsonInterval", "theilSen", "compareKappas", "planLimits", "planKappa"],
        ...["casesForLimits", "casesForKappa", "caseDisagreement", "twoWayBias", "InputError"],
      ].sort(),
    );
  });
});
