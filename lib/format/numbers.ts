/** The true minus sign: as wide as a plus, and never broken from its number at a line end. */
const MINUS = "\u2212";
const NO_BREAK_SPACE = "\u00a0";

/**
 * A number with a fixed count of decimals and a real minus sign. A value that rounds to zero has no sign.
 * Throws RangeError for NaN and infinities: a figure that could not be computed has a reason to show instead.
 */
export function formatNumber(value: number, digits = 1): string {
  if (!Number.isFinite(value)) throw new RangeError("Only a finite number can be shown; show the reason instead.");
  const size = Math.abs(value).toFixed(digits);
  return value < 0 && Number(size) !== 0 ? MINUS + size : size;
}

/** As formatNumber, with a plus before what stays above zero after rounding. */
export function formatSigned(value: number, digits = 1): string {
  const text = formatNumber(value, digits);
  return value > 0 && Number(text) !== 0 ? `+${text}` : text;
}

/** The two ends of an interval in words, because a dash beside a minus sign misleads: "0.62 to 0.95". */
export function formatInterval(low: number, high: number, digits = 2): string {
  return `${formatNumber(low, digits)} to ${formatNumber(high, digits)}`;
}

/** As formatInterval, for differences: both ends carry their sign. */
export function formatSignedInterval(low: number, high: number, digits = 1): string {
  return `${formatSigned(low, digits)} to ${formatSigned(high, digits)}`;
}

/** A share from 0 to 1 as a percentage: "86 %", with a space that does not break. */
export function formatShare(share: number, digits = 0): string {
  return `${formatNumber(share * 100, digits)}${NO_BREAK_SPACE}%`;
}

/** A count with its noun: "1 reading", "1 200 readings". */
export function formatCount(count: number, one: string, many = `${one}s`): string {
  return `${groupDigits(count)} ${count === 1 ? one : many}`;
}

function groupDigits(count: number): string {
  return formatNumber(count, 0).replace(/\B(?=(\d{3})+$)/g, NO_BREAK_SPACE);
}
