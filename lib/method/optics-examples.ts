import { formatNumber } from "@/lib/format/numbers";
import type { Convention } from "@/lib/reflex/convention";
import { degreesFromDisplacement } from "@/lib/reflex/displacement";
import { landmarkRuleReading, MEASURED_LEVER_MM } from "@/lib/reflex/landmark-rule-reading";
import { prismDioptres, prismDioptresByRule } from "@/lib/reflex/prism";
import { type ExampleTable, present, type WorkedExample } from "./worked-example";

export function prismExample(): WorkedExample {
  return {
    data: "From the definition.",
    tables: [
      {
        caption: "Degrees, prism dioptres, and the rule of thumb",
        heads: ["degrees", "Δ", "by the rule"],
        rows: [1, 5, 10, 15, 20, 30, 35, 45].map((degrees) => ({
          head: `${degrees}°`,
          cells: [formatNumber(prismDioptres(degrees)), prismDioptresByRule(degrees)],
        })),
      },
    ],
    note: "The rule is 13 % high at 1°, right near 35° and low above. It is shown as a rough figure and never converts what was typed.",
  };
}

/** What each convention reads of a reflex where measurement puts it, at true angles from 5° to 50°. */
export function conventionsTable(): ExampleTable {
  const sevenPerMm: Convention = { kind: "perMm", degreesPerMm: 7 };
  const twelvePerMm: Convention = { kind: "perMm", degreesPerMm: 12, from: "pupil-centre" };
  const elevenPerMm: Convention = { kind: "perMm", degreesPerMm: 11, from: "limbus-centre" };
  const rows = [5, 10, 15, 20, 25, 30, 35, 40, 45, 50].map((trueDegrees) => {
    const sine = Math.sin((trueDegrees * Math.PI) / 180);
    const fromPupilMm = MEASURED_LEVER_MM.pupilCentre * sine;
    const fromLimbusMm = MEASURED_LEVER_MM.limbusCentre * sine;
    const readings = [
      landmarkRuleReading(trueDegrees, { pupilMm: 3 }),
      landmarkRuleReading(trueDegrees),
      degreesFromDisplacement(fromPupilMm, sevenPerMm),
      degreesFromDisplacement(fromPupilMm, twelvePerMm),
      degreesFromDisplacement(fromLimbusMm, elevenPerMm),
    ];
    return {
      head: `${trueDegrees}°`,
      cells: [fromPupilMm.toFixed(2), ...readings.map((degrees) => (degrees === null ? ">45" : formatNumber(degrees)))],
    };
  });
  return {
    caption: "What each convention reads at each true angle, in degrees; rule: the landmark rule",
    heads: ["true", "mm", "rule, 3 mm pupil", "rule, 4 mm pupil", "7° per mm", "12° per mm", "11° per mm, limbus"],
    rows,
  };
}

export function conventionsExample(): WorkedExample {
  return {
    data: "Displacements from the levers of Barry & Backes (1997), 4.884 and 5.243 mm for each sine of the angle, taken from notes on the paper; iris 11.7 mm.",
    tables: [conventionsTable()],
    note: "An examiner on 7° per mm reads a true 20° as 12°. The landmark rule depends on the pupil, which is one more reason to photograph undilated eyes.",
  };
}

export function schematicEyeExample(): WorkedExample {
  const degreesPerMm = present(degreesFromDisplacement(0.01, { kind: "schematicEye" })) * 100;
  return {
    data: "Published ratios of rotation to displacement, to hold the conventions against.",
    tables: [
      {
        caption: "Measured",
        isText: true,
        heads: ["source", "value"],
        rows: [
          { head: "Riddell, Hainline & Abramov (1994), infants and adults", cells: ["22Δ per mm"] },
          { head: "Hasebe et al. (1995), from 0.18 mm = 2.2°", cells: ["12.2° per mm"] },
          { head: "Hasebe et al. (1998), 262 eyes of 131 children", cells: ["19.9Δ per mm, SD 1.9"] },
          { head: "Model, Eizenman & Sturm (2010), 43 adults", cells: ["12.81° per mm, SD 1.22"] },
          { head: "Model & Eizenman (2011), mean of the literature", cells: ["12.5° per mm"] },
        ],
      },
    ],
    figures: [
      { label: "Schematic eye near zero, degrees per mm", value: degreesPerMm, digits: 2, recomputed: 12.321673 },
      {
        label: "Schematic eye near zero, Δ per mm",
        value: prismDioptres(degreesPerMm / 100) * 100,
        digits: 1,
        recomputed: 21.5053763,
      },
    ],
    note: "People differ: with an SD of 1.22 around 12.81, one ratio for everybody is off by more than about a fifth for one person in twenty. No examiner can remove that.",
  };
}
