import { createElement, type ReactElement } from "react";
import type { MethodFormula } from "./method-entry";

// Only faces with tables for mathematics stretch braces and roots. Some systems have one and do not know it by "math".
const MATH_FACES =
  '"Latin Modern Math", "STIX Two Math", "Cambria Math", "Libertinus Math", "TeX Gyre Termes Math", "DejaVu Math TeX Gyre", math, serif';

/** A formula in the browser's own mathematics, and the same in words under it. */
export function Formula({ formula: { math, reading } }: { formula: MethodFormula }) {
  return (
    <div className="py-1.5">
      <div className="overflow-x-auto overflow-y-hidden py-1.5 text-h3 leading-normal">
        {createElement("math", { display: "block", className: "w-max", style: { fontFamily: MATH_FACES } }, math)}
      </div>
      <p className="mt-1 text-small text-ink-2">In words: {reading}</p>
    </div>
  );
}

/** A letter of a formula, in running text. */
export function Sign({ sign }: { sign: ReactElement }) {
  return createElement("math", { style: { fontFamily: MATH_FACES } }, sign);
}
