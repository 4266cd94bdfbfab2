/** A figure with the ends of its interval; an end that could not be computed is left out. */
export type Interval = { estimate: number; low?: number; high?: number };
