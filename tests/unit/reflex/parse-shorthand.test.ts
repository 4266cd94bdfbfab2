import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ALIGNED, findingFaults, UNREADABLE_REASONS } from "@/lib/reflex/finding";
import { parseShorthand } from "@/lib/reflex/parse-shorthand";
import { NOTATIONS, shorthand } from "@/lib/reflex/shorthand";
import { signedComponents } from "@/lib/reflex/signed-components";
import { arbitraryDeviation, arbitraryFinding } from "./arbitrary-finding";
import { deviation } from "./build-finding";

const leftExo30 = deviation("left", { exo: 30 });
const rightEso15 = deviation("right", { eso: 15 });
const combined = deviation("left", { exo: 30, hypo: 15 });

/** What a refusal looks like: a sentence holding these words, about something wrong or something missing. */
const wrong = (words: string | RegExp) => ({
  ok: false,
  isIncomplete: false,
  reason: expect.stringMatching(words),
});
const incomplete = (words: string | RegExp) => ({ ...wrong(words), isIncomplete: true });

describe("parseShorthand", () => {
  it("reads back every finding that shorthand writes, in each notation and any letter case", () => {
    fc.assert(
      fc.property(arbitraryFinding, fc.constantFrom(...NOTATIONS), (finding, notation) => {
        const written = shorthand(finding, notation);
        for (const text of [
          written,
          written.toLowerCase(),
          written.toUpperCase(),
          ` ${written.replaceAll("°", "")} `,
        ]) {
          expect(parseShorthand(text)).toMatchObject({ ok: true, finding, note: null });
        }
      }),
      { numRuns: 500 },
    );
  });

  it.each([
    ["lxt 30", leftExo30],
    ["LXT30", leftExo30],
    ["lxt 30 degrees", leftExo30],
    ["lxt: 30º.", leftExo30],
    ["LDS 30°", leftExo30],
    ["LXOT 30", leftExo30],
    ["left exo 30", leftExo30],
    ["L exotropia 30", leftExo30],
    ["left eye, divergent squint of 30 deg", leftExo30],
    ["exo 30 left", leftExo30],
    ["ret 15", rightEso15],
    ["rcs 15", rightEso15],
    ["RSOT 15", rightEso15],
    ["r et 15", rightEso15],
    ["rht 15", deviation("right", { hyper: 15 })],
    ["RHyperT 15", deviation("right", { hyper: 15 })],
    ["lhot 15", deviation("left", { hypo: 15 })],
    ["LHypoT 15", deviation("left", { hypo: 15 })],
    ["LXT 30° LHoT 15°", combined],
    ["lhot 15 lxt 30", combined],
    ["lxt 30 + lhot 15", combined],
    ["left exo 30, hypo 15", combined],
    ["l exo 30 and hypo 15", combined],
    ["ret >45", deviation("right", { eso: ">45" })],
    ["ret > 45°", deviation("right", { eso: ">45" })],
    ["ret 45+", deviation("right", { eso: ">45" })],
    ["ret beyond the limbus", deviation("right", { eso: ">45" })],
    ["ret beyond, rht 5", deviation("right", { eso: ">45", hyper: 5 })],
    ["ret 45", deviation("right", { eso: 45 })],
    ["exo 45+hypo 15 left", deviation("left", { exo: 45, hypo: 15 })],
  ])("understands %s", (text, finding) => {
    expect(parseShorthand(text)).toMatchObject({ ok: true, finding, note: null });
  });

  it.each(["ortho", "Ortho.", "ORTHOTROPIC", "aligned", "straight", "no deviation", "Neither eye deviates."])(
    "understands %s as aligned",
    (text) => {
      expect(parseShorthand(text)).toMatchObject({ ok: true, finding: ALIGNED });
    },
  );

  it.each([
    ["nr blurred", "blurred"],
    ["NR: blurry", "blurred"],
    ["not readable, reflex hidden", "reflex-hidden"],
    ["unreadable doubled", "reflex-hidden"],
    ["nr pupil not visible", "pupil-not-visible"],
    ["nr not fixating", "not-fixating"],
    ["nr dilated", "irregular-pupil"],
    ["nr cover test", "needs-cover-test"],
    ["Not readable: cannot be judged without a cover test.", "needs-cover-test"],
    ["nr other", "other"],
  ])("understands %s", (text, reason) => {
    expect(parseShorthand(text)).toMatchObject({ ok: true, finding: { readable: false, reason } });
  });

  it("knows the stored name of every reason", () => {
    for (const reason of UNREADABLE_REASONS) {
      expect(parseShorthand(`nr ${reason}`)).toMatchObject({ ok: true, finding: { readable: false, reason } });
    }
  });
});

describe("two parts that name different eyes", () => {
  it("takes the eye of the horizontal part, renames the vertical one and says so", () => {
    const read = parseShorthand("rht 15 let >45");
    expect(read).toMatchObject({
      ok: true,
      finding: deviation("left", { eso: ">45", hypo: 15 }),
      note: "Taken right hyper as left hypo, the same deviation, because the horizontal part is in the left eye.",
    });
    expect(parseShorthand("let >45 rht 15")).toEqual(read);
  });

  it("never changes how the eyes stand", () => {
    fc.assert(
      fc.property(arbitraryDeviation, arbitraryDeviation, (first, second) => {
        const horizontalPart = deviation(first.eye === "left" ? "left" : "right", {
          eso: first.horizontalDegrees ?? 7,
        });
        const verticalPart = deviation(second.eye === "left" ? "left" : "right", { hypo: second.verticalDegrees ?? 4 });
        const read = parseShorthand(`${shorthand(verticalPart)} ${shorthand(horizontalPart)}`);
        expect(read.ok && signedComponents(read.finding)).toEqual({
          horizontal: signedComponents(horizontalPart).horizontal,
          vertical: signedComponents(verticalPart).vertical,
          censored: {
            horizontal: signedComponents(horizontalPart).censored.horizontal,
            vertical: signedComponents(verticalPart).censored.vertical,
          },
        });
      }),
    );
  });

  it("refuses two horizontal or two vertical parts", () => {
    expect(parseShorthand("ret 15 let 30")).toEqual(wrong("one horizontal part"));
    expect(parseShorthand("lxt 15 let 30")).toEqual(wrong("one horizontal part"));
    expect(parseShorthand("rht 15 lhot 15")).toEqual(wrong("one vertical part"));
  });
});

describe("prism dioptres in shorthand", () => {
  it.each(["lxt 30Δ", "lxt 30 ∆", "lxt 30 prism", "lxt 30 prism dioptres", "lxt 30 prism diopters"])(
    "converts %s by the tangent and keeps the unit typed",
    (text) => {
      // 30Δ is 16.7°, and not the 15° of the rule of thumb.
      expect(parseShorthand(text)).toEqual({
        ok: true,
        finding: deviation("left", { exo: 17 }),
        typed: { horizontal: { value: 30, unit: "prism-dioptres" }, vertical: null },
        note: null,
      });
    },
  );

  it("keeps degrees as degrees, a bare number among them", () => {
    expect(parseShorthand("lxt 30 lhot 15°")).toMatchObject({
      typed: { horizontal: { value: 30, unit: "degrees" }, vertical: { value: 15, unit: "degrees" } },
    });
    expect(parseShorthand("lxt >45")).toMatchObject({ typed: { horizontal: { value: ">45", unit: "degrees" } } });
  });

  it("takes a unit for each part, and refuses a bare number beside a number in Δ", () => {
    expect(parseShorthand("lxt 30° lhot 10Δ")).toMatchObject({ finding: deviation("left", { exo: 30, hypo: 6 }) });
    expect(parseShorthand("lxt 30 lhot 10Δ")).toEqual(wrong("unit on both numbers"));
    expect(parseShorthand("lxt >45 lhot 10Δ")).toMatchObject({ finding: deviation("left", { exo: ">45", hypo: 6 }) });
  });

  it("does not take PD, which also means pupillary distance", () => {
    expect(parseShorthand("lxt 30 pd")).toEqual(wrong("pupillary distance.*30Δ"));
    expect(parseShorthand("lxt 30PD")).toEqual(wrong("pupillary distance"));
  });

  it("refuses sizes that are no deviation or more than can be read", () => {
    expect(parseShorthand("lxt 120Δ")).toEqual(wrong(/^120Δ is 50°.*Write >45/));
    expect(parseShorthand("lxt 0.5Δ")).toEqual(wrong("less than half a degree"));
  });
});

describe("what parseShorthand refuses, with what to write instead", () => {
  it.each([
    ["lxt 60", "60° is more than the 45°"],
    ["lxt 46", "46° is more than"],
    ["lxt 0", "no deviation"],
    ["lxt 12.5", "whole numbers"],
    ["lxt .5", "not understood"],
    ["lxt -30", "without a sign"],
    ["lxt 15-20", "without a sign or a range"],
    ["lxt >30", "Only >45"],
    ["lxt 30 20", "one number for each direction"],
    ["l exo+hypo 30 15", "one number for each direction"],
    ["30 lxt", "before the degrees"],
    ["30", "before the degrees"],
    ["aet 20", "name the eye"],
    ["alternating eso 20", "name the eye"],
    ["lx(t) 30", "what this photograph shows"],
    ["lx 30", "latent deviation"],
    ["left exophoria 30", "latent deviation"],
    ["r/l 10", "RHT or LHoT if the right eye is higher"],
    ["l over r 10", "do not name the eye"],
    ["ortho lxt 30", "alone"],
    ["lxt 30 nr", "alone"],
    ["lxt 30x", "“30x” is not understood"],
    ["hello 30", "“hello” is not understood"],
    ["nr rain", "Say why it cannot be read: blurred, reflex hidden or doubled"],
  ])("refuses %s", (text, words) => {
    expect(parseShorthand(text)).toEqual(wrong(words));
  });

  it.each([
    ["", "Write a finding"],
    ["  ", "Write a finding"],
    ["the eye", "Write a finding"],
    ["l", "which way the left eye deviates"],
    ["lxt 30 r", "which way the right eye deviates"],
    ["exo 30 left hypo 5 right", "which way the right eye"],
    ["xt 30", "which eye deviates: right or left exo"],
    ["lxt", "how many degrees the exo part has"],
    ["lxt 30 lhot", "how many degrees the hypo part has"],
    ["nr", "Say why"],
    ["nr blu", "Say why"],
    ["orth", "not understood"],
    ["lh", "latent deviation"],
    ["lxt >4", "Only >45"],
    ["lxt 30 lho", "not understood"],
  ])("calls %s incomplete, not wrong, and says what is missing", (text, words) => {
    expect(parseShorthand(text)).toEqual(incomplete(words));
  });

  it("gives a sound finding or a reason for any text, and never throws", () => {
    const scraps = ["lxt", "R", "left", "30", "15Δ", ">45", "hypo", "et", "nr", "ortho", "°", "-", ".", "/", "pd", "x"];
    const anyText = fc.oneof(
      fc.string({ unit: "binary" }),
      fc.array(fc.constantFrom(...scraps), { maxLength: 6 }).map((words) => words.join(" ")),
      fc.array(fc.constantFrom(...scraps), { maxLength: 6 }).map((words) => words.join("")),
    );
    fc.assert(
      fc.property(anyText, (text) => {
        const read = parseShorthand(text);
        if (read.ok) expect(findingFaults(read.finding)).toEqual([]);
        else expect(read.reason).toMatch(/^.+\.$/su);
      }),
      { numRuns: 3000 },
    );
  });
});
