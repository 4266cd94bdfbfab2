import { createElement } from "react";
import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, it } from "vitest";
import { Contents } from "@/components/method/contents";
import { METHOD_GROUPS } from "@/components/method/groups";
import { MethodEntryView } from "@/components/method/method-entry-view";

const entries = METHOD_GROUPS.flatMap((group) => group.entries);
const markupOf = (entry: (typeof entries)[number]) => renderToStaticMarkup(createElement(MethodEntryView, { entry }));

describe("the page Method", () => {
  it("reaches every group and entry from the contents, each by an anchor of its own", () => {
    const links = [
      ...renderToStaticMarkup(createElement(Contents, { groups: METHOD_GROUPS })).matchAll(/href="#([^"]+)"/g),
    ];
    const anchors = [...METHOD_GROUPS, ...entries].map(({ id }) => id);
    expect(new Set(links.map(([, id]) => id))).toEqual(new Set(anchors));
    expect(new Set(anchors).size).toBe(anchors.length);
  });

  it.each(entries.map((entry) => [entry.id, entry] as const))("keeps Greek letters inside formulas: %s", (_, entry) => {
    // The text faces have no Greek but Δ, so that any other letter would come from the system.
    const text = markupOf(entry).replace(/<math.*?<\/math>/gs, "");
    expect(text).not.toMatch(/(?!Δ)\p{Script=Greek}/u);
  });

  it("writes each formula as MathML with a reading in words", () => {
    const formulas = entries.flatMap((entry) => entry.formulas ?? []);
    const markup = entries.map(markupOf).join("");
    expect(markup.match(/<math display="block"/g)).toHaveLength(formulas.length);
    expect(markup.match(/In words: \S/g)).toHaveLength(formulas.length);
  });

  it("reads letters, numbers and signs of a formula apart", () => {
    const definition = entries.find(({ id }) => id === "prism-dioptres")?.formulas?.[0];
    const markup = definition && renderToStaticMarkup(definition.math).replace(/<mspace[^>]*><\/mspace>/g, " ");
    expect(markup).toBe("<mrow><mi>Δ</mi><mo>=</mo><mn>100</mn> <mi>tan</mi> <mi>θ</mi></mrow>");
  });
});
