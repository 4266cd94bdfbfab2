import fc from "fast-check";

// On a coarse grid, so that no property hangs on the last digit.
const value = fc.integer({ min: -40, max: 40 }).map((eighths) => eighths / 8);

/** Values of a chart, some of them missing but never all. */
export const arbitraryPoints = fc
  .array(fc.option(value, { freq: 4 }), { minLength: 1, maxLength: 25 })
  .filter((points) => points.some((point) => point !== null));

export const arbitraryFullPoints = fc.array(value, { minLength: 1, maxLength: 25 });
