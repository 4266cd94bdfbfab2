import type { ReactElement } from "react";
import type { WorkedExample } from "@/lib/method/worked-example";

export type MethodFormula = {
  math: ReactElement;
  /** The same in words, for those who do not see or do not read formulas. Without Greek: the text faces have none. */
  reading: string;
};

/** One figure of the program: what it answers, how it is computed, where that is from, and what it cannot say. */
export type MethodEntry = {
  /** The anchor of the entry. Links from other pages go by it: never rename one. */
  id: string;
  title: string;
  answers: string;
  formulas?: readonly MethodFormula[];
  letters?: readonly { sign: ReactElement; meaning: string }[];
  source: string;
  limits: string;
  example: WorkedExample;
};

export type MethodGroup = { id: string; title: string; entries: readonly MethodEntry[] };
