import type { PhotographParameters } from "@/lib/eyes/parameters";

/**
 * SHA-256 of the bytes of small pictures, made once by the first, untyped version of the drawing code, whose pictures
 * were looked at one by one and are the standard to keep. Another JavaScript engine may round sines and powers
 * differently in the last place; then look at the pictures before taking its hashes.
 */
export const EXPECTED_PIXELS: { name: string; parameters: PhotographParameters; sha256: string }[] = [
  {
    name: "an aligned pair, fair and freckled",
    parameters: {
      width: 160,
      height: 70,
      seed: 31,
      skin: "A",
      iris: "blue",
      freckles: 0.4,
      fieldMm: 117,
    },
    sha256: "4de1298593559bb4cd43b08b5dbe6942304c0e7c49b95fdb9e30e38617c0c52c",
  },
  {
    name: "folds at the inner corners",
    parameters: {
      width: 160,
      height: 70,
      seed: 17,
      skin: "B",
      iris: "umber",
      hairColour: "#14100e",
      crease: 0.4,
      epicanthus: 0.9,
      pupilDistanceMm: 58,
      kappaMm: 0.7,
    },
    sha256: "440db82af4ba321b6c9f5674bd82f3eb202b2123744fda846bbe8172eb7fc33a",
  },
  {
    name: "a reflex on the sclera",
    parameters: {
      width: 160,
      height: 70,
      seed: 13,
      skin: "F",
      iris: "amber",
      right: {
        esoDegrees: -55,
      },
      pupilMm: 3.8,
    },
    sha256: "474a512a752958edcb1f5d54fa42ab26fe18bc2d4da0673ae0058925263f48b9",
  },
  {
    name: "both parts, tilted, optical",
    parameters: {
      width: 160,
      height: 70,
      seed: 18,
      skin: "C",
      iris: "hazel",
      left: {
        esoDegrees: -30,
        hyperDegrees: -15,
      },
      tiltDegrees: 2,
      model: "optical",
    },
    sha256: "0ca067bf25ea5a9d85a626061454f9f4448f32bbd333fc883fcb33b0fa88db65",
  },
  {
    name: "a blink",
    parameters: {
      width: 160,
      height: 70,
      seed: 45,
      skin: "E",
      iris: "brown",
      lidOpening: 0.27,
      right: {
        esoDegrees: 10,
      },
      left: {
        opening: 1.12,
      },
    },
    sha256: "cb8f755a0f5aed12a842f4466d18226f61978ec6b5a8ca3bfe65ce306bda1a9c",
  },
  {
    name: "out of focus",
    parameters: {
      width: 160,
      height: 70,
      seed: 46,
      skin: "D",
      iris: "green",
      left: {
        esoDegrees: -20,
      },
      blurPx: 2,
      tiltDegrees: 3,
    },
    sha256: "768a720fbfd997c1c5a22ce2a117aa07e088b327485e8582b20251f7d6682357",
  },
  {
    name: "a face given in full",
    parameters: {
      width: 160,
      height: 70,
      seed: 5,
      skin: "B",
      iris: "grey",
      left: {
        esoDegrees: 20,
        iris: "brown",
        pupilMm: 2.6,
        opening: 0.7,
      },
      noseWidth: 1.3,
      brow: 0,
      age: 0.9,
      lash: 0.5,
      grain: 0,
      exposure: 1.2,
      supersample: 1,
      irisDiameterMm: 12.2,
      eyeLevel: 0.5,
      reflexBrightness: 0.8,
      warmth: 0.2,
      browArch: 0,
      browWeight: 1,
      browHeightMm: 0,
      canthalTiltDegrees: 1,
      lidPeak: 0,
      crease: 1,
    },
    sha256: "d04042f862ff6e44b7d310ea25c7d3b1508781d5a24a4855814537fc2efa89cf",
  },
];
