import { mkdir, writeFile } from "node:fs/promises";
import path from "node:path";
import { parseArgs } from "node:util";
import type { PhotographParameters } from "@/lib/eyes/parameters";
import { renderPhotograph } from "@/lib/eyes/render-in-worker";
import { CASE_PLANS } from "./demo-cases/case-plans";
import { describeCase } from "./demo-cases/describe-case";
import { encodeJpeg } from "./demo-cases/encode-jpeg";

/*
 * Draws the photographs of the demo, once: their JPEGs are kept in the repository.
 *
 *   npx tsx scripts/render-demo-cases.ts              demo-cases.json alone, in a second
 *   npx tsx scripts/render-demo-cases.ts 014 031      and the photographs of these cases
 *   npx tsx scripts/render-demo-cases.ts --all        and all of them, about half a minute each
 *   npx tsx scripts/render-demo-cases.ts --sign-in    and the picture of the sign-in page
 */

const root = path.join(import.meta.dirname, "..");
const seeds = path.join(root, "db", "seeds");

/** The sign-in page shows an aligned pair, wide and without brows; its caption says half a millimetre nasal. */
const SIGN_IN_EYES: PhotographParameters = {
  seed: 160,
  skin: "C",
  iris: "hazel",
  pupilMm: 3.4,
  kappaMm: 0.5,
  browHeightMm: -2.2,
  width: 1600,
  height: 560,
  fieldMm: 112,
  eyeLevel: 0.5,
};

const { values, positionals } = parseArgs({
  allowPositionals: true,
  options: { all: { type: "boolean", default: false }, "sign-in": { type: "boolean", default: false } },
});

await writeFile(path.join(seeds, "demo-cases.json"), formatCases());
await mkdir(path.join(seeds, "photographs"), { recursive: true });
for (const { code, parameters } of choosePlans()) {
  await draw(parameters, path.join(seeds, "photographs", `${code}.jpg`));
}
if (values["sign-in"]) await draw(SIGN_IN_EYES, path.join(root, "public", "sign-in-eyes.jpg"));

function choosePlans() {
  if (values.all) return CASE_PLANS;
  const unknown = positionals.filter((code) => !CASE_PLANS.some((plan) => plan.code === code));
  if (unknown.length > 0) throw new Error(`No case has the code ${unknown.join(", ")}.`);
  return CASE_PLANS.filter(({ code }) => positionals.includes(code));
}

/** One case a line, so that a change shows as the cases it is about. */
function formatCases(): string {
  const lines = CASE_PLANS.map((plan) => JSON.stringify(describeCase(plan)));
  return `{"cases": [\n${lines.join(",\n")}\n]}\n`;
}

async function draw(parameters: PhotographParameters, file: string): Promise<void> {
  const started = Date.now();
  await writeFile(file, await encodeJpeg(await renderPhotograph(parameters)));
  console.log(`${path.relative(root, file)} in ${((Date.now() - started) / 1000).toFixed(0)} s`);
}
