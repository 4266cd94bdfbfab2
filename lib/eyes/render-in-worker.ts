import { Worker } from "node:worker_threads";
import type { DrawnPhotograph } from "./draw-photograph";
import type { PhotographParameters } from "./parameters";

/**
 * Draws a photograph in a thread of its own, because it takes tens of seconds of a processor. One thread a call: the
 * caller decides how many go on at once. Rejects with what the drawing throws.
 *
 * The thread starts from a small .mjs file that registers tsx and then imports the TypeScript, so it works the same
 * under tsx and under vitest. A bundler would leave that file behind: call this from scripts and jobs, not from a page.
 */
export function renderPhotograph(parameters: PhotographParameters): Promise<DrawnPhotograph> {
  return new Promise((resolve, reject) => {
    const worker = new Worker(new URL("./render-worker-start.mjs", import.meta.url), { workerData: parameters });
    worker.once("message", (photograph: DrawnPhotograph) => resolve(photograph));
    worker.once("error", reject);
    worker.once("exit", () => reject(new Error("The drawing thread ended without a photograph."))); // late: no effect
  });
}
