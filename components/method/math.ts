import { createElement, type ReactElement, type ReactNode } from "react";

/** Plain text is read as MathML: letters as identifiers, digits as numbers, ~ as a thin space, the rest as operators. */
export type Piece = string | ReactElement;

/** Lower-case letters that touch and are one name; others are read one by one, as in p with the index ij. */
const NAMES = ["arctan", "bias", "limit", "log", "max", "min", "sin", "tan"];

const TOKENS = /(\d+(?:\.\d+)?)|([A-Za-z\u0370-\u03ff]+)|([^\sA-Za-z\u0370-\u03ff\d])/gu;

/**
 * A row of a formula written as a template: m`κ = ${frac(m`${sub("p", "o")} − ${sub("p", "e")}`, m`1 − ${sub("p", "e")}`)}`.
 * Capitals that touch make one name (SE). A minus is −, a product is put by a space.
 */
export function m(texts: TemplateStringsArray, ...parts: Piece[]): ReactElement {
  return row(texts.flatMap((text, index) => [...tokens(text), ...pieces(parts[index])]));
}

/** Words inside a formula, upright and with their spaces. */
export function words(text: string): ReactElement {
  return createElement("mtext", null, text);
}

export function frac(top: Piece, bottom: Piece): ReactElement {
  return element("mfrac", top, bottom);
}

export function root(of: Piece): ReactElement {
  return element("msqrt", of);
}

export function sub(base: Piece, index: Piece): ReactElement {
  return element("msub", base, index);
}

export function sup(base: Piece, power: Piece): ReactElement {
  return element("msup", base, power);
}

export function subSup(base: Piece, index: Piece, power: Piece): ReactElement {
  return element("msubsup", base, index, power);
}

/** A mean. */
export function bar(base: Piece): ReactElement {
  return createElement("mover", { accent: "true" }, row(pieces(base)), operator("¯", { stretchy: "false" }));
}

/** A sum over what stands under it. */
export function sum(over: Piece): ReactElement {
  return element("munder", operator("∑"), over);
}

/** The size of something without its sign. */
export function abs(inner: Piece): ReactElement {
  return row([operator("|", { form: "prefix" }), ...pieces(inner), operator("|", { form: "postfix" })]);
}

/** Lines of a case distinction: what it is, and when. */
export function cases(...lines: readonly (readonly [value: Piece, when: string])[]): ReactElement {
  const rows = lines.map(([value, when]) =>
    createElement("mtr", null, cell(row(pieces(value))), cell(createElement("mtext", null, when))),
  );
  return row([operator("{", { form: "prefix", stretchy: "true" }), createElement("mtable", null, ...rows)]);
}

function cell(content: ReactElement): ReactElement {
  // The padding that browsers give to cells is lost to the reset of all paddings.
  return createElement("mtd", { style: { textAlign: "left", padding: "0.15em 0.8em 0.15em 0.2em" } }, content);
}

function element(name: string, ...children: Piece[]): ReactElement {
  return createElement(name, null, ...children.map((child) => row(pieces(child))));
}

function pieces(piece: Piece | undefined): ReactElement[] {
  if (piece === undefined) return [];
  return typeof piece === "string" ? tokens(piece) : [piece];
}

/** One element stands by itself; several are grouped. Children are spread, so that they need no keys. */
function row(children: readonly ReactNode[]): ReactElement {
  return createElement("mrow", null, ...children);
}

function operator(sign: string, settings: Record<string, string> | null = null): ReactElement {
  return createElement("mo", settings, sign);
}

function tokens(text: string): ReactElement[] {
  return [...text.matchAll(TOKENS)].flatMap(([, number, letters, sign]) => {
    if (number !== undefined) return [createElement("mn", null, number)];
    if (sign !== undefined) return [sign === "~" ? createElement("mspace", { width: "0.22em" }) : operator(sign)];
    return namesIn(letters ?? "").map((name) => createElement("mi", null, name));
  });
}

function namesIn(letters: string): string[] {
  return NAMES.includes(letters) || letters !== letters.toLowerCase() ? [letters] : [...letters];
}
