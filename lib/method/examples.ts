/**
 * Small published tables behind the worked examples of the page Method. Only data: what is computed from them, and the
 * value printed beside it, stands in the files named after each group of figures.
 */

/** Fleiss, Cohen & Everitt (1969): diagnoses of 200 patients by two raters, rows the first. */
export const DIAGNOSES_1969 = {
  categories: ["personality disorder", "neurosis", "psychosis"],
  table: [
    [106, 10, 4],
    [22, 28, 10],
    [2, 12, 6],
  ],
} as const;

/** Feinstein & Cicchetti (1990): two tables of 100 cases with the same agreement. */
export const PARADOX_1990 = {
  balanced: [
    [40, 9],
    [6, 45],
  ],
  prevalent: [
    [80, 10],
    [5, 5],
  ],
} as const;

/** Data set anxiety of the R package irr (artificial): 20 subjects, 3 raters, scores 1 to 6. */
export const ANXIETY = [
  [3, 3, 2],
  [3, 6, 1],
  [3, 4, 4],
  [4, 6, 4],
  [5, 2, 3],
  [5, 4, 2],
  [2, 2, 1],
  [3, 4, 6],
  [5, 3, 1],
  [2, 3, 1],
  [2, 2, 1],
  [6, 3, 2],
  [1, 3, 3],
  [5, 3, 3],
  [2, 2, 1],
  [2, 2, 1],
  [1, 1, 3],
  [2, 3, 3],
  [4, 3, 2],
  [3, 4, 2],
] as const;

/** Fleiss (1971), table 1: 30 patients, 6 ratings each (columns as arranged in the R package irr). */
export const PSYCHIATRIC_1971 = {
  categories: ["depression", "personality disorder", "schizophrenia", "neurosis", "other"],
  ratings: [
    [4, 4, 4, 4, 4, 4],
    [2, 2, 2, 5, 5, 5],
    [2, 3, 3, 3, 3, 5],
    [5, 5, 5, 5, 5, 5],
    [2, 2, 2, 4, 4, 4],
    [1, 1, 3, 3, 3, 3],
    [3, 3, 3, 3, 5, 5],
    [1, 1, 3, 3, 3, 4],
    [1, 1, 4, 4, 4, 4],
    [5, 5, 5, 5, 5, 5],
    [1, 4, 4, 4, 4, 4],
    [1, 2, 4, 4, 4, 4],
    [2, 2, 2, 3, 3, 3],
    [1, 4, 4, 4, 4, 4],
    [2, 2, 4, 4, 4, 5],
    [3, 3, 3, 3, 3, 5],
    [1, 1, 1, 4, 5, 5],
    [1, 1, 1, 1, 1, 2],
    [2, 2, 4, 4, 4, 4],
    [1, 3, 3, 5, 5, 5],
    [5, 5, 5, 5, 5, 5],
    [2, 4, 4, 4, 4, 4],
    [2, 2, 4, 5, 5, 5],
    [1, 1, 4, 4, 4, 4],
    [1, 4, 4, 4, 4, 5],
    [2, 2, 2, 2, 2, 4],
    [1, 1, 1, 1, 5, 5],
    [2, 2, 4, 4, 4, 4],
    [1, 3, 3, 3, 3, 3],
    [5, 5, 5, 5, 5, 5],
  ],
} as const;

/** Krippendorff (2011), section C: 12 units, 4 observers, null where an observer gave nothing. */
export const KRIPPENDORFF_2011 = [
  [1, 1, null, 1],
  [2, 2, 3, 2],
  [3, 3, 3, 3],
  [3, 3, 3, 3],
  [2, 2, 2, 2],
  [1, 2, 3, 4],
  [4, 4, 4, 4],
  [1, 1, 2, 1],
  [2, 2, 2, 2],
  [null, 5, 5, 5],
  [null, null, 1, 1],
  [null, null, 3, null],
] as const;

/** Gwet (2014): pregnancies classified by two abstractors, 100 cases. */
export const ABSTRACTORS_2014 = {
  categories: ["ectopic", "AIU", "NIU"],
  table: [
    [13, 0, 0],
    [0, 20, 7],
    [0, 4, 56],
  ],
} as const;

/** Shrout & Fleiss (1979), table 2: 6 targets, 4 judges. */
export const JUDGES_1979 = [
  [9, 2, 5, 8],
  [6, 1, 3, 2],
  [8, 4, 6, 8],
  [7, 1, 2, 6],
  [10, 5, 6, 9],
  [6, 2, 4, 7],
] as const;

/** Bland & Altman (1986), table I: peak expiratory flow of 17 people in L/min, two readings with each meter. */
export const PEAK_FLOW_1986 = {
  wright: [494, 395, 516, 434, 476, 557, 413, 442, 650, 433, 417, 656, 267, 478, 178, 423, 427],
  mini: [512, 430, 520, 428, 500, 600, 364, 380, 658, 445, 432, 626, 260, 477, 259, 350, 451],
  wrightAgain: [490, 397, 512, 401, 470, 611, 415, 431, 638, 429, 420, 633, 275, 492, 165, 372, 421],
  miniAgain: [525, 415, 508, 444, 500, 625, 460, 390, 642, 432, 420, 605, 227, 467, 268, 370, 443],
} as const;

/** Bland & Altman (1999), table 4: cardiac output of 12 people in L/min, 3 to 6 pairs each. */
export const CARDIAC_OUTPUT_1999 = {
  ventriculography: [
    [7.83, 7.42, 7.89, 7.12, 7.88],
    [6.16, 7.26, 6.71, 6.54],
    [4.75, 5.24, 4.86, 4.78, 6.05, 5.42],
    [4.21, 3.61, 3.72, 3.87, 3.92],
    [3.13, 2.98, 2.85, 3.17, 3.09, 3.12],
    [5.92, 6.42, 5.92, 6.27],
    [7.13, 6.62, 6.58, 6.93],
    [4.54, 4.81, 5.11, 5.29, 5.39, 5.57],
    [4.48, 4.92, 3.97],
    [4.22, 4.65, 4.74, 4.44, 4.5],
    [6.78, 6.07, 6.52, 6.42, 6.41, 5.76],
    [5.06, 4.72, 4.9, 4.8, 4.9, 5.1],
  ],
  impedance: [
    [6.57, 5.62, 6.9, 6.57, 6.35],
    [4.06, 4.29, 4.26, 4.09],
    [4.71, 5.5, 5.08, 5.02, 6.01, 5.67],
    [4.14, 4.2, 4.61, 4.68, 5.04],
    [3.03, 2.86, 2.77, 2.46, 2.32, 2.43],
    [5.9, 5.81, 5.7, 5.76],
    [5.09, 4.63, 4.61, 5.09],
    [4.72, 4.61, 4.36, 4.2, 4.36, 4.2],
    [3.17, 3.12, 2.96],
    [4.35, 4.62, 3.16, 3.53, 3.53],
    [7.2, 6.09, 7, 7.1, 7.4, 6.8],
    [4.5, 4.2, 3.8, 3.8, 4.2, 4.5],
  ],
} as const;

/** Fleiss (1986), as reused by Jones, Dobson & O'Brian (2011): DMFS scores of 10 patients by 4 dentists. */
export const DENTISTS_1986 = [
  [8, 7, 11, 7],
  [13, 11, 15, 13],
  [0, 0, 2, 1],
  [3, 6, 9, 6],
  [13, 13, 17, 10],
  [19, 23, 27, 18],
  [0, 0, 1, 0],
  [2, 0, 4, 5],
  [18, 20, 22, 16],
  [5, 3, 8, 3],
] as const;

/** Newcombe (1998), table I: successes and trials. */
export const NEWCOMBE_1998 = [
  { count: 81, n: 263 },
  { count: 15, n: 148 },
  { count: 0, n: 20 },
  { count: 1, n: 29 },
] as const;

/** Constructed: a straight line with one wild value. */
export const ONE_OUTLIER = {
  x: [1, 2, 3, 4, 5, 6, 7, 8, 9, 10],
  y: [2.1, 2.9, 4.2, 4.8, 6.1, 30, 8.2, 8.9, 10.1, 10.8],
} as const;

/** ISO 5725-5:1998: the mean of each of nine laboratories, creosote oil. */
export const CREOSOTE_1998 = [24.14, 20.155, 19.5, 20.3, 20.705, 17.57, 20.1, 20.94, 21.185] as const;

/** NIST/SEMATECH e-Handbook of Statistical Methods, section 6.3.2.4. */
export const NIST_EWMA = {
  values: [
    52, 47, 53, 49.3, 50.1, 47, 51, 50.1, 51.2, 50.5, 49.6, 47.6, 49.9, 51.3, 47.8, 51.2, 52.6, 52.4, 53.6, 52.1,
  ],
  target: 50,
  sigma: 2.0539,
  lambda: 0.3,
  width: 3,
} as const;

/** NIST/SEMATECH e-Handbook of Statistical Methods, section 6.3.2.3; k and h in the units of the values. */
export const NIST_CUSUM = {
  values: [
    324.925, 324.675, 324.725, 324.35, 325.35, 325.225, 324.125, 324.525, 325.225, 324.6, 324.625, 325.15, 328.325,
    327.25, 327.825, 328.5, 326.675, 327.775, 326.875, 328.35,
  ],
  target: 325,
  k: 0.3175,
  h: 4.1959,
} as const;

/** Lucas & Saccucci (1990), table 3, and Lucas & Crosier (1982), table 1: the shifts, in sigma, shown on the page. */
export const RUN_LENGTH_SCHEMES = {
  fast: { lambda: 0.5, width: 3.071 },
  slow: { lambda: 0.03, width: 2.437 },
  cusum: { k: 0.5, h: 4 },
  shifts: [0, 0.25, 0.5, 1, 2],
} as const;
