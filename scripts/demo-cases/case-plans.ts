import { ALIGNED_CASES } from "./aligned-cases";
import type { CasePlan } from "./demo-case";
import { ESO_CASES } from "./eso-cases";
import { EXO_CASES } from "./exo-cases";
import { UNREADABLE_CASES } from "./unreadable-cases";
import { COMBINED_CASES, VERTICAL_CASES } from "./vertical-cases";

/** Every case of the demo in the order of its code. */
export const CASE_PLANS: CasePlan[] = [
  ...ALIGNED_CASES,
  ...ESO_CASES,
  ...EXO_CASES,
  ...VERTICAL_CASES,
  ...COMBINED_CASES,
  ...UNREADABLE_CASES,
].sort((a, b) => a.code.localeCompare(b.code));
