import { describe, expect, it } from "vitest";
import { agree } from "@/lib/agree/agree";
import type { Report } from "@/lib/agree/report";
// Shrout & Fleiss, Psychological Bulletin 1979; 86: 420-428, table 2: 6 targets, 4 judges.
import shroutFleiss from "../../reference/icc-shrout-fleiss-1979.json";
// Krippendorff, Computing Krippendorff's alpha-reliability, 2011: 4 observers, 12 units, some missing.
import krippendorff from "../../reference/krippendorff-4x12.json";
import { near } from "../statistics/near";
import { findingTable } from "./finding-table";

const run = (text: string, ...args: string[]) => agree(["readings.csv", ...args], () => text);

function reportOf(text: string, ...args: string[]): Report {
  const { output, errors, exitCode } = run(text, "--json", ...args);
  expect({ errors, exitCode }).toEqual({ errors: "", exitCode: 0 });
  return JSON.parse(output);
}

function resultOf(report: Report, title: string, statistic: string, of: string, variant?: string) {
  const section = report.sections.find((candidate) => candidate.title === title);
  return section?.statistics.find((one) => one.statistic === statistic && one.of === of && one.variant === variant)
    ?.result;
}

/** Long tables of a ratings matrix: subjects in rows, raters in columns. */
function valueTable(ratings: readonly (readonly (number | string | null)[])[], raters = "ABCDEFGH"): string {
  const lines = ratings.flatMap((row, subject) =>
    row.map((value, rater) => `${subject + 1},${raters[rater]},${value ?? ""}`),
  );
  return ["subject,rater,value", ...lines].join("\r\n");
}

const PAIR = findingTable(
  "1 reference right eso 15",
  "2 reference left exo 30",
  "3 reference none",
  "4 reference right hyper 10",
  "5 Reference left eso 20",
  "6 reference right exo 25",
  "1 A right eso 17",
  "2 A left exo 33",
  "3 A none",
  "4 A left hypo 10",
  "5 A left exo 20",
  "6 A right exo 50".replace("50", "45"),
  "1 B right eso 15",
  "2 B left exo 28",
  "3 B right eso 5",
  "4 B right hyper 12",
  "5 B no",
  "6 B",
);

describe("agree on findings", () => {
  const report = reportOf(PAIR);

  it("says what the table holds", () => {
    expect(report).toMatchObject({
      table: "findings",
      caseCount: 6,
      readingCount: 11,
      examiners: ["A", "B"],
      rounds: [],
      hasReference: true,
    });
    expect(report.sections.map(({ title }) => title)).toEqual([
      "A against the reference",
      "B against the reference",
      "All against the reference",
      "Among the examiners",
    ]);
  });

  it("compares directions with the reference, a vertical deviation on whichever eye it is named", () => {
    // A reads case 5 reversed and all others right: 5 of 6. B: case 3 wrong, 5 not readable, 6 not read: 3 of 5.
    expect(resultOf(report, "A against the reference", "cohenKappa", "direction")).toMatchObject({
      n: 6,
      observed: near(5 / 6),
    });
    expect(resultOf(report, "B against the reference", "cohenKappa", "direction")).toMatchObject({
      n: 5,
      observed: near(3 / 5),
    });
    expect(resultOf(report, "A against the reference", "gwetAC", "direction")).toMatchObject({ observed: near(5 / 6) });
    expect(resultOf(report, "A against the reference", "cohenKappa", "deviating eye")).toMatchObject({ observed: 1 });
    expect(
      resultOf(
        report,
        "A against the reference",
        "wilsonInterval",
        "direction and degrees",
        "same label and within tolerance",
      ),
    ).toMatchObject({ n: 6, share: { estimate: near(4 / 6) } });
  });

  it("compares signed degrees and says what is left out", () => {
    // Horizontal, A: 17−15, −33+30, 0, 0, −20−20, −45+25.
    expect(resultOf(report, "A against the reference", "limitsOfAgreement", "horizontal degrees")).toMatchObject({
      n: 6,
      bias: { estimate: near((2 - 3 - 40 - 20) / 6) },
      leftOut: { unread: 0, notReadable: 0 },
    });
    expect(resultOf(report, "B against the reference", "limitsOfAgreement", "horizontal degrees")).toMatchObject({
      n: 4,
      bias: { estimate: near((0 + 2 + 5 + 0) / 4) },
      leftOut: { unread: 1, notReadable: 1 },
    });
  });

  it("frees the bias of each from the cases read, reading minus reference", () => {
    // A reads far too little, by a reversal among others; B reads the cases both read 0, 2, 5 and 0 degrees too far eso.
    const bias = resultOf(report, "All against the reference", "twoWayBias", "horizontal degrees");
    expect(bias).toMatchObject({
      n: 10,
      examiners: [
        { examiner: "A", n: 6 },
        { examiner: "B", n: 4 },
      ],
    });
    const pooled = resultOf(report, "All against the reference", "limitsOfAgreement", "horizontal degrees");
    expect(pooled).toMatchObject({ n: 10, bias: { estimate: near((2 - 3 - 40 - 20 + 7) / 10) } });
    // Of the four cases that both read, A's mean difference is (2 − 3)/4 and B's 7/4: two degrees between them.
    const [a, b] = Object.values(bias?.examiners ?? []).map((row) => row.bias.estimate);
    expect(b - a).toBeCloseTo(2, 9);
  });

  it("counts the kinds of error", () => {
    expect(resultOf(report, "A against the reference", "errorKinds", "findings")).toEqual({
      ok: true,
      n: 6,
      "horizontal direction reversed": 1,
      "unit slip": 1,
      "named on the other eye": 1,
    });
  });

  it("compares the examiners with each other", () => {
    expect(resultOf(report, "Among the examiners", "pairwiseKappa", "direction")).toMatchObject({
      pairs: [{ pair: "A and B", n: 5 }],
    });
    expect(resultOf(report, "Among the examiners", "caseDisagreement", "direction")).toMatchObject({
      cases: expect.arrayContaining([expect.objectContaining({ case: "3", split: true })]),
    });
  });

  it("compares an examiner's repeats, and nothing else where there is nobody else", () => {
    const alone = reportOf(findingTable("1 A right eso 10", "2 A none", "1 A right eso 14", "2 A left exo 5"));
    expect(alone.sections.map(({ title }) => title)).toEqual(["A against own repeats"]);
    // Differences of 4 and 5 degrees: within variance (4² + 5²)/4.
    expect(resultOf(alone, "A against own repeats", "repeatability", "horizontal degrees")).toMatchObject({
      n: 2,
      withinSd: { estimate: near(Math.sqrt(41 / 4)) },
    });
    expect(resultOf(alone, "A against own repeats", "wilsonInterval", "direction", "same label")).toMatchObject({
      n: 2,
      share: { estimate: 0.5 },
    });
  });

  it("takes a vertical deviation for the same on either eye, among examiners and in repeats", () => {
    const lines = [
      "1 A right hyper 5",
      "2 A none",
      "1 B left hypo 5",
      "2 B none",
      "1 A left hypo 5",
      "2 A right eso 10",
    ];
    const report = reportOf(findingTable(...lines));
    expect(resultOf(report, "Among the examiners", "fleissKappa", "direction")).toMatchObject({ observed: 1 });
    const share = resultOf(report, "A against own repeats", "wilsonInterval", "direction", "same label");
    expect(share).toMatchObject({ n: 2, share: { estimate: 0.5 } });
    const again = reportOf(findingTable("1 A right hyper 5", "1 A left hypo 5"));
    expect(resultOf(again, "A against own repeats", "wilsonInterval", "direction", "same label")).toMatchObject({
      share: { estimate: 1 },
    });
  });

  it("follows nobody over a single round", () => {
    const [header, ...lines] = PAIR.split("\n");
    const report = reportOf([`${header},round`, ...lines.map((line) => `${line},1`)].join("\n"));
    expect(report.rounds).toEqual(["1"]);
    expect(report.sections.map(({ title }) => title)).not.toContain("A over the rounds");
  });

  it("follows an examiner over the rounds, in the order of their numbers", () => {
    const reference = [
      "1 reference right eso 10",
      "2 reference none",
      "3 reference left exo 20",
      "4 reference right eso 30",
    ];
    const readingsOf = (shift: number) => [
      `1 A right eso ${10 + shift}`,
      "2 A none",
      `3 A left exo ${20 - shift}`,
      `4 A right eso ${31 + shift}`,
    ];
    const rounds = [10, 9, 2].flatMap((round, index) =>
      findingTable(...readingsOf(index))
        .split("\n")
        .slice(1)
        .map((line) => `${line},${round}`),
    );
    const [header = "", ...references] = findingTable(...reference).split("\n");
    const report = reportOf([`${header},round`, ...references.map((line) => `${line},`), ...rounds].join("\n"));
    expect(report.rounds).toEqual(["2", "9", "10"]);
    // Biases by hand: (2+0+2+3)/4 in round 2, (1+0+1+2)/4 in round 9, 1/4 in round 10.
    expect(resultOf(report, "A over the rounds", "shewhart", "horizontal degrees")).toMatchObject({
      n: 3,
      points: [
        { round: "2", value: near(7 / 4) },
        { round: "9", value: near(1) },
        { round: "10", value: near(1 / 4) },
      ],
    });
    expect(resultOf(report, "A over the rounds", "ewma", "horizontal degrees", "lambda 0.2")).toMatchObject({
      width: near(2.962, 1e-3),
    });
  });

  it("prints the same for people", () => {
    const { output, exitCode } = run(PAIR);
    expect(exitCode).toBe(0);
    expect(output).toContain("Findings: 11 readings, 2 examiners, 6 cases, with a reference.");
    expect(output).toContain("  direction: Cohen's kappa (n 6, too few to say)");
    expect(output).toContain("1 unread, 1 not readable");
    expect(output).toContain("    horizontal direction reversed 1");
    expect(output).not.toMatch(/NaN|undefined|null|\[object/);
  });

  it("says that there is nothing to compare", () => {
    expect(run(findingTable("1 A none")).output).toContain("Nothing to compare");
  });
});

describe("agree on values", () => {
  it("gives the published intraclass correlations of measurements", () => {
    const report = reportOf(valueTable(shroutFleiss.data.ratings), "--scale", "interval");
    expect(resultOf(report, "Among the examiners", "intraclassCorrelation", "values")).toMatchObject({
      n: 6,
      icc11: { estimate: expect.closeTo(0.17, 2) },
      icc21: { estimate: expect.closeTo(0.29, 2) },
      icc31: { estimate: expect.closeTo(0.71, 2) },
      icc3k: { estimate: expect.closeTo(0.91, 2) },
    });
  });

  it.each([
    ["nominal", 0.743],
    ["ordinal", 0.815],
    ["interval", 0.849],
  ])("gives the published alpha of the %s scale, missing ratings and all", (scale, alpha) => {
    const report = reportOf(valueTable(krippendorff.data.ratings), "--scale", scale);
    expect(resultOf(report, "Among the examiners", "krippendorffAlpha", "values", scale)).toMatchObject({
      alpha: { estimate: expect.closeTo(alpha, 3) },
    });
  });

  it("compares with a reference on each scale", () => {
    const rows = [
      ["reference", 1, 2, 3, 4],
      ["A", 1, 2, 4, 4],
      ["B", 2, 2, 3, 4],
    ].flatMap(([rater, ...values]) => values.map((value, index) => `${index + 1},${rater},${value}`));
    const text = ["subject,rater,value", ...rows].join("\n");
    const nominal = reportOf(text, "--scale=nominal");
    expect(resultOf(nominal, "A against the reference", "cohenKappa", "values")).toMatchObject({
      n: 4,
      observed: 0.75,
    });
    expect(resultOf(nominal, "A against the reference", "cohenKappa", "values", "linear weights")).toBeUndefined();
    expect(resultOf(nominal, "A against the reference", "wilsonInterval", "values", "same label")).toMatchObject({
      share: { estimate: 0.75 },
    });
    const ordinal = reportOf(text, "--scale=ordinal");
    expect(resultOf(ordinal, "A against the reference", "cohenKappa", "values", "linear weights")).toMatchObject({
      observed: near(1 - 1 / 12),
    });
    const interval = reportOf(text, "--scale=interval");
    expect(resultOf(interval, "B against the reference", "limitsOfAgreement", "values")).toMatchObject({
      bias: { estimate: 0.25 },
    });
    expect(resultOf(interval, "Among the examiners", "twoWayBias", "values")).toMatchObject({
      mean: { estimate: near(0.25) },
    });
    expect(resultOf(interval, "Among the examiners", "limitsOfAgreement", "values", "A minus B")).toMatchObject({
      bias: { estimate: 0 },
    });
  });

  it("takes limits from the repeats of two examiners", () => {
    const lines = [1, 2, 3].flatMap((subject) => [
      `${subject},A,${subject}`,
      `${subject},A,${subject + 1}`,
      `${subject},B,${subject}`,
      `${subject},B,${subject + 3}`,
    ]);
    const report = reportOf(["subject,rater,value", ...lines].join("\n"), "--scale", "interval");
    expect(resultOf(report, "Among the examiners", "limitsWithReplicates", "values", "A minus B")).toMatchObject({
      bias: { estimate: near(-1) },
    });
    const ofOne = reportOf(
      ["subject,rater,value", ...lines.slice(0, -1).filter((_, index) => index % 4 < 3)].join("\n"),
      "--scale",
      "interval",
    );
    expect(ofOne.sections[0]?.statistics.map(({ statistic }) => statistic)).not.toContain("limitsWithReplicates");
    expect(resultOf(report, "B against own repeats", "repeatability", "values")).toMatchObject({
      n: 3,
      withinSd: { estimate: near(Math.sqrt(4.5)) },
    });
  });
});

describe("agree on what it cannot read", () => {
  it.each([
    ["no file", [], "Name a file."],
    ["two files", ["a.csv", "b.csv"], "One file at a time."],
    ["an unknown option", ["a.csv", "--fast"], "--fast is not known."],
    ["an unknown scale", ["a.csv", "--scale", "ratio"], "--scale is nominal, ordinal, interval; got ratio."],
    ["a scale that is not there", ["a.csv", "--scale"], "--scale is nominal, ordinal, interval; got nothing."],
  ])("ends with 2 and the usage on %s", (_, args, message) => {
    const { output, errors, exitCode } = agree(args, () => "");
    expect({ output, exitCode }).toEqual({ output: "", exitCode: 2 });
    expect(errors.split("\n")[0]).toBe(message);
    expect(errors).toContain("npm run agree -- FILE.csv");
  });

  it("ends with 2 where the file cannot be read", () => {
    const missing = () => {
      throw new Error("ENOENT");
    };
    expect(agree(["gone.csv"], missing)).toEqual({ output: "", errors: "gone.csv cannot be read.", exitCode: 2 });
  });

  it.each([
    [
      "a direction that does not exist",
      findingTable("1 A right eso 15", "2 A right iso 15").replace("none,,none,", "iso,15,none,"),
      "line 3, column horizontal: ",
    ],
    ["degrees beyond 45", findingTable("1 A right eso 46"), "line 2, column horizontal_degrees: "],
    ["degrees that are not whole", findingTable("1 A right eso 1.5"), "line 2, column horizontal_degrees: "],
    [
      "degrees without a direction",
      findingTable("1 A none").replace("none,none,,none", "none,none,5,none"),
      "line 2, column horizontal_degrees: ",
    ],
    ["a quote that never closes", `${findingTable("1 A none")}\n2,"A`, "line 3, column 3: "],
    ["a missing column", "case,examiner,eye\n1,A,none", "line 1, column horizontal: "],
    ["semicolons", "case;examiner;eye\n1;A;none", "line 1, column header: Fields are separated by commas"],
    ["an empty file", "", "line 1, column header: The file is empty."],
    ["a header alone", findingTable(), "line 2, column header: There are no readings."],
    [
      "a second reference",
      findingTable("1 reference none", "1 A none", "1 REFERENCE none"),
      'line 4, column examiner: Case "1" has its reference on line 2 already.',
    ],
    ["a reference alone", findingTable("1 reference none"), "column examiner: No examiner has a reading."],
  ])("ends with 2 and the place of %s", (_, text, message) => {
    const { output, errors, exitCode } = run(text);
    expect({ output, exitCode }).toEqual({ output: "", exitCode: 2 });
    expect(errors).toContain(`readings.csv: ${message}`);
  });

  it("asks for the scale of values, and refuses one for findings", () => {
    expect(run(valueTable([[1, 2]])).errors).toContain("--scale nominal or ordinal or interval");
    expect(run(PAIR, "--scale", "nominal").exitCode).toBe(2);
  });

  it("wants numbers where the scale has an order, and takes any text where it has none", () => {
    const text = valueTable([
      ["mild", "severe"],
      ["mild", "mild"],
    ]);
    expect(run(text, "--scale", "ordinal").errors).toContain("readings.csv: line 2, column value: Write a number");
    expect(run(text, "--scale", "nominal").exitCode).toBe(0);
    for (const word of ["NA", "1,5", "0x10", "Infinity", "1 2"]) {
      expect(run(valueTable([[1, `"${word}"`]]), "--scale", "interval").exitCode).toBe(2);
    }
    expect(run(valueTable([["-1.5", "+.5e1"]]), "--scale", "interval").exitCode).toBe(0);
  });

  it("lists the first faults and counts the rest", () => {
    const { errors } = run(findingTable(...Array.from({ length: 25 }, (_, index) => `${index} A right eso 99`)));
    const lines = errors.split("\n");
    expect(lines).toHaveLength(21);
    expect(lines.at(-1)).toBe("readings.csv: and 5 more like these.");
  });

  it("explains itself", () => {
    expect(agree(["--help"], () => "")).toMatchObject({ exitCode: 0, errors: "" });
  });
});
