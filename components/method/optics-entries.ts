import { conventionsExample, prismExample, schematicEyeExample } from "@/lib/method/optics-examples";
import { cases, frac, m } from "./math";
import type { MethodEntry } from "./method-entry";

/** From the place of a reflex to degrees, and from degrees to prism dioptres. */
export const OPTICS_ENTRIES: readonly MethodEntry[] = [
  {
    id: "prism-dioptres",
    title: "Degrees and prism dioptres",
    answers: "How many prism dioptres an angle is. Either may be typed; the unit typed is stored and the other shown.",
    formulas: [
      { math: m`Δ = 100 ~tan~ θ`, reading: "prism dioptres are one hundred times the tangent of the angle." },
      {
        math: m`θ = arctan~ ${frac("Δ", "100")}`,
        reading: "the angle is the arc tangent of prism dioptres over one hundred.",
      },
    ],
    letters: [{ sign: m`θ`, meaning: "angle of deviation, within 90° either way" }],
    limits:
      "Prism dioptres are a tangent: they do not add up or average at large angles, so everything here is computed in degrees. In the interface the unit is always Δ.",
    source: "Definition: a shift of 1 unit in 100 units.",
    example: prismExample(),
  },
  {
    id: "conventions",
    title: "Conventions of conversion",
    answers:
      "How the place of the reflex is turned into degrees. The department chooses the convention, a round fixes it, every reading stores it, and every screen with a converted value names it. Results on different conventions are never pooled silently.",
    formulas: [
      {
        math: m`θ = ${cases(["15°", "at the pupil margin"], ["30°", "midway to the limbus"], ["45°", "at the limbus"])}`,
        reading:
          "the landmark rule, which is the default because it is what examiners are taught; straight lines lie between the landmarks, and beyond the limbus there is no number.",
      },
      {
        math: m`θ = c x`,
        reading:
          "so many degrees for each millimetre: 7 from the pupil centre, 12 from the pupil centre, 11 from the limbus centre, or the department’s own figure.",
      },
    ],
    letters: [
      { sign: m`x`, meaning: "displacement of the reflex from the centre named, in mm" },
      { sign: m`c`, meaning: "degrees per mm" },
    ],
    limits:
      "The landmark rule and 7° per mm are taught as one rule and are two. Both read small and middle angles too low: the landmark rule with a 4 mm pupil reads a true 15° as 10°, and comes right only near the limbus. Readings of one department can be compared with each other on any convention, and with measurement only on one that measurement supports.",
    source:
      "Landmark rule and 7° per mm: common practice, no source. 12° (rounded from 11.82°) and 11° per mm: Barry & Backes, Investigative Ophthalmology & Visual Science 1997; 38: 2597-2607.",
    example: conventionsExample(),
  },
  {
    id: "schematic-eye",
    title: "Schematic eye",
    answers: "What optics says: how far the reflex moves from the centre of the pupil when an average eye turns.",
    formulas: [
      {
        math: m`x = (r − p) ~sin~ θ`,
        reading:
          "the displacement is the corneal radius less the depth of the entrance pupil, times the sine of the angle.",
      },
    ],
    letters: [
      { sign: m`r`, meaning: "radius of the cornea, 7.7 mm unless set" },
      { sign: m`p`, meaning: "depth of the entrance pupil behind the cornea, 3.05 mm unless set" },
    ],
    limits:
      "For a distant light and camera on one axis, and an eye without angle kappa. A slight nasal decentration that is the same in both eyes is normal, and the deviating eye’s reflex is therefore held against the other eye’s.",
    source:
      "Gullstrand’s exact schematic eye, in Helmholtz, Treatise on Physiological Optics; the relation follows from its geometry.",
    example: schematicEyeExample(),
  },
];
