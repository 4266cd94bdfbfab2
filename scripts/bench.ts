import type { Bench } from "./bench/measure";

// npm run bench -- NAME measures one part of the program on this machine. One file a bench, in scripts/bench.
const BENCHES: Record<string, () => Promise<Bench>> = {
  statistics: () => import("./bench/statistics"),
};

const name = process.argv[2] ?? "";
const load = Object.hasOwn(BENCHES, name) ? BENCHES[name] : undefined;
if (load) {
  const { run } = await load();
  await run();
} else {
  console.error(`npm run bench -- NAME, where NAME is one of: ${Object.keys(BENCHES).join(", ")}`);
  process.exitCode = 2;
}
