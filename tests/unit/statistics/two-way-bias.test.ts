import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/statistics/result";
import { type BiasReading, twoWayBias } from "@/lib/statistics/two-way-bias";
import shroutFleiss from "../../reference/icc-shrout-fleiss-1979.json"; // Shrout & Fleiss 1979, table 2: 6 targets, 4 judges
import { expectOk } from "./close-to";
import { near } from "./near";

const reading = (examiner: string, item: string, difference: number | null, round?: string): BiasReading => ({
  examiner,
  case: item,
  difference,
  ...(round !== undefined && { round }),
});

/** Ten readings by three examiners of four cases in two rounds, some missing, one repeated. */
const unbalanced = [
  reading("Ana", "c1", 2, "r1"),
  reading("Ana", "c2", 3.5, "r1"),
  reading("Ana", "c3", 6, "r2"),
  reading("Ben", "c1", -1, "r1"),
  reading("Ben", "c3", 2.5, "r2"),
  reading("Ben", "c4", 0.5, "r2"),
  reading("Cleo", "c2", 1.5, "r1"),
  reading("Cleo", "c4", 1, "r2"),
  reading("Cleo", "c4", 2, "r2"),
  reading("Cleo", "c1", 1, "r2"),
];
const withoutRounds = unbalanced.map(({ round: _, ...rest }) => rest);

const found = (estimate: number, standardError: number) => ({
  estimate: near(estimate),
  standardError: near(standardError),
});

describe("twoWayBias on data with a known answer", () => {
  // Effects-coded least squares with NumPy 2.4: inverse of the full normal equations, no elimination.
  it("gives examiner, case and round effects of an unbalanced table", () => {
    const result = expectOk(twoWayBias(unbalanced));
    expect(result).toMatchObject({
      n: 10,
      df: 3,
      residualSd: near(0.43832593994609725),
      mean: found(2.0162037037037037, 0.1496177590481425),
      examiners: [
        {
          examiner: "Ana",
          n: 3,
          effect: found(1.7685185185185186, 0.24351441108116512),
          bias: found(3.7847222222222223, 0.2708926810569192),
        },
        {
          examiner: "Ben",
          n: 3,
          effect: found(-1.4259259259259254, 0.22843676629584364),
          bias: found(0.5902777777777783, 0.27089268105691927),
        },
        {
          examiner: "Cleo",
          n: 4,
          effect: found(-0.3425925925925932, 0.2711661719706503),
          bias: found(1.6736111111111105, 0.3246605143661258),
        },
      ],
      cases: [
        { case: "c1", n: 3, effect: found(-1.1805555555555554, 0.2781825754203338) },
        { case: "c2", n: 2, effect: found(0.2777777777777794, 0.503492177126898) },
        { case: "c3", n: 2, effect: found(1.5555555555555545, 0.47061955706250874) },
        { case: "c4", n: 3, effect: found(-0.6527777777777786, 0.33076751685400013) },
      ],
      rounds: [
        { round: "r1", n: 4, effect: found(-0.5069444444444445, 0.3367637908431446) },
        { round: "r2", n: 6, effect: found(0.5069444444444445, 0.3367637908431446) },
      ],
    });
    // t at 3 degrees of freedom, 95 percent: 3.182 in printed tables.
    expect(result.mean.high).toEqual(near(2.0162037037037037 + 3.182446305284263 * 0.1496177590481425));
  });

  it("gives examiner and case effects when no rounds are named", () => {
    expect(twoWayBias(withoutRounds)).toMatchObject({
      ok: true,
      df: 4,
      residualSd: near(0.5029325764658601),
      mean: found(2.0857843137254903, 0.1632728273401166),
      examiners: [
        { effect: found(1.6333333333333335, 0.2597132657223286), bias: found(3.719117647058824, 0.30677189659385745) },
        {
          effect: found(-1.5372549019607848, 0.24799077260803729),
          bias: found(0.5485294117647055, 0.30918746063375335),
        },
        {
          effect: found(-0.09607843137254868, 0.24799077260803729),
          bias: found(1.9897058823529417, 0.28410912178172804),
        },
      ],
      rounds: [],
    });
  });

  it("is the row and column means of a balanced table, with the mean square that Shrout & Fleiss print", () => {
    const { ratings } = shroutFleiss.data;
    const table = ratings.flatMap((row, target) =>
      row.map((value, judge) => reading(`judge ${judge}`, `target ${target}`, value)),
    );
    const { examiners, residualSd, df } = expectOk(twoWayBias(table));
    expect(df).toBe(15);
    expect(residualSd).toEqual(near(Math.sqrt(shroutFleiss.expected.MSE)));
    // Printed in their table 3: residual mean square 1.02.
    expect((residualSd ?? 0) ** 2).toBeCloseTo(shroutFleiss.published.MSE, 2);
    const error = Math.sqrt((shroutFleiss.expected.MSE / 6) * (1 - 1 / 4));
    expect(examiners.map(({ effect }) => effect)).toMatchObject([
      found(2.375, error),
      found(-67 / 24, error),
      found(-23 / 24, error),
      found(1.375, error),
    ]);
  });
});

describe("twoWayBias", () => {
  it("does not charge an examiner with the cases that happened to be read", () => {
    // Both read 1 too much everywhere; the hard case adds 8, and only Ben reads it three times.
    const table = [
      reading("Ana", "easy", 1),
      reading("Ana", "plain", 1),
      reading("Ana", "hard", 9),
      ...[1, 2, 3].map(() => reading("Ben", "hard", 9)),
      reading("Ben", "easy", 1),
    ];
    const { examiners } = expectOk(twoWayBias(table));
    expect(examiners).toMatchObject([
      { examiner: "Ana", effect: { estimate: near(0, 0, 1e-12), standardError: 0 }, bias: { estimate: near(11 / 3) } },
      { examiner: "Ben", effect: { estimate: near(0, 0, 1e-12), standardError: 0 }, bias: { estimate: near(11 / 3) } },
    ]);
  });

  it("leaves out standard errors without spare readings, and the effect of a factor with one level", () => {
    expect(twoWayBias([reading("Ana", "c1", 4)])).toEqual({
      ok: true,
      n: 1,
      mean: { estimate: 4 },
      df: 0,
      examiners: [{ examiner: "Ana", n: 1, bias: { estimate: 4 } }],
      cases: [{ case: "c1", n: 1 }],
      rounds: [],
    });
    expect(twoWayBias([reading("Ana", "c1", 4), reading("Ben", "c1", 2)])).toMatchObject({
      df: 0,
      examiners: [{ effect: { estimate: 1 } }, { effect: { estimate: -1 } }],
      cases: [{ case: "c1", n: 2 }],
    });
  });

  it("follows one examiner over rounds that share cases", () => {
    const rounds = ["spring", "summer"].flatMap((round, i) =>
      ["c1", "c2", "c3"].map((item, j) => reading("Ana", item, j + 4 * i, round)),
    );
    expect(twoWayBias(rounds)).toMatchObject({
      ok: true,
      rounds: [{ effect: { estimate: near(-2) } }, { effect: { estimate: near(2) } }],
      examiners: [{ bias: { estimate: near(3) } }],
    });
  });

  it("refuses an empty table and tables that fall apart, with the reason", () => {
    const refusal = (table: BiasReading[]) => {
      const result = twoWayBias(table);
      return result.ok ? "none" : `${result.n}: ${result.reason}`;
    };
    expect(refusal([])).toBe("0: no differences");
    expect(refusal([reading("Ana", "c1", null)])).toBe("0: no differences");
    expect(refusal([reading("Ana", "c1", 1), reading("Ben", "c2", 2)])).toBe("2: groups of examiners share no case");
    // A gap can take away the only link.
    expect(refusal([reading("Ana", "c1", 1), reading("Ben", "c2", 2), reading("Ana", "c2", null)])).toBe(
      "2: groups of examiners share no case",
    );
    const noAnchor = ["Ana", "Ben"].flatMap((name) => [reading(name, "c1", 1, "r1"), reading(name, "c2", 2, "r2")]);
    expect(refusal(noAnchor)).toBe("4: groups of rounds share no case");
    const ownRounds = ["c1", "c2"].flatMap((item) => [reading("Ana", item, 1, "r1"), reading("Ben", item, 2, "r2")]);
    expect(refusal(ownRounds)).toBe("4: groups of rounds share no examiner");
    // Any two factors are linked, yet six unknowns meet five readings.
    const tangled = [
      reading("Ana", "c1", 1, "r1"),
      reading("Ana", "c2", 2, "r2"),
      reading("Ben", "c1", 3, "r2"),
      reading("Ben", "c3", 4, "r1"),
      reading("Cleo", "c2", 3, "r1"),
    ];
    expect(refusal(tangled)).toBe("5: the effects of examiners, cases and rounds cannot be told apart");
  });

  it("throws on bad numbers, and on rounds named for some readings only", () => {
    expect(() => twoWayBias([reading("Ana", "c1", Number.NaN)])).toThrow(InputError);
    expect(() => twoWayBias([reading("Ana", "c1", 1, "r1"), reading("Ben", "c1", 2)])).toThrow(InputError);
    expect(() => twoWayBias(unbalanced, { confidence: 95 })).toThrow(InputError);
  });

  const table = fc
    .array(fc.tuple(fc.nat(4), fc.nat(5), fc.nat(2), fc.option(fc.integer({ min: -20, max: 20 }))), {
      minLength: 15,
      maxLength: 50,
    })
    .map((rows) => rows.map(([examiner, item, round, difference]) => ({ examiner, case: item, round, difference })));

  it("has effects that add up to zero, and residuals that no effect explains", () => {
    fc.assert(
      fc.property(table, (rows) => {
        const result = twoWayBias(Object.freeze(rows.map((row) => Object.freeze(row))));
        if (!result.ok) return;
        const values = (levels: { effect?: { estimate: number } }[]) =>
          levels.map(({ effect }) => effect?.estimate ?? 0);
        for (const levels of [result.examiners, result.cases, result.rounds]) {
          expect(values(levels).reduce((sum, value) => sum + value, 0)).toEqual(near(0, 0, 1e-9));
        }
        const effectOf = new Map<string, number>([
          ...result.examiners.map(({ examiner, effect }) => [`e${examiner}`, effect?.estimate ?? 0] as const),
          ...result.cases.map((level) => [`c${level.case}`, level.effect?.estimate ?? 0] as const),
          ...result.rounds.map(({ round, effect }) => [`r${round}`, effect?.estimate ?? 0] as const),
        ]);
        const sums = new Map<string, number>();
        for (const { examiner, case: item, round, difference } of rows) {
          if (difference === null) continue;
          const keys = [`e${examiner}`, `c${item}`, `r${round}`];
          const residual = keys.reduce(
            (rest, key) => rest - (effectOf.get(key) ?? 0),
            difference - result.mean.estimate,
          );
          for (const key of keys) sums.set(key, (sums.get(key) ?? 0) + residual);
        }
        for (const total of sums.values()) expect(total).toEqual(near(0, 0, 1e-8));
      }),
    );
  });

  it("moves every bias with a shift and no effect, and does not mind the order", () => {
    fc.assert(
      fc.property(table, fc.integer({ min: -30, max: 30 }), (rows, shift) => {
        const before = twoWayBias(rows);
        const moved = rows.map((row) => ({
          ...row,
          difference: row.difference === null ? null : row.difference + shift,
        }));
        const after = twoWayBias(moved.reverse());
        expect(after.ok).toBe(before.ok);
        if (!before.ok || !after.ok) return;
        for (const { examiner, bias, effect } of before.examiners) {
          const same = after.examiners.find((other) => other.examiner === examiner);
          expect(same?.bias.estimate).toEqual(near(bias.estimate + shift, 1e-8, 1e-8));
          expect(same?.effect?.estimate ?? 0).toEqual(near(effect?.estimate ?? 0, 1e-8, 1e-8));
          expect(same?.effect?.standardError ?? 0).toEqual(near(effect?.standardError ?? 0, 1e-6, 1e-6));
        }
      }),
    );
  });
});
