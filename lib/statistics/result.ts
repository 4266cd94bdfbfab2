/** A caller's mistake: arguments that cannot be what was meant. The message says what to change. */
export class InputError extends Error {
  override readonly name = "InputError";
}

/** A figure with its uncertainty. A part that cannot be computed is left out; it is never NaN, infinite or a made-up 0. */
export type Estimate = {
  estimate: number;
  standardError?: number;
  /** Lower and upper end of the interval at the confidence asked for; not clipped to the range of the statistic. */
  low?: number;
  high?: number;
};

/** Sound data that cannot answer: how many observations there were, and why they do not suffice. */
export type Refusal = { ok: false; n: number; reason: string };

export type Result<Parts> = ({ ok: true; n: number } & Parts) | Refusal;

export function refuse(n: number, reason: string): Refusal {
  return { ok: false, n, reason };
}
