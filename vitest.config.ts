import path from "node:path";
import { defineConfig } from "vitest/config";

const root = import.meta.dirname;
const services = ["tests/support/services.ts"];

/** Three kinds of test, run in this order; the last ones share one browser and one machine, so one file at a time. */
export default defineConfig({
  resolve: {
    alias: {
      "@": root,
      // The package refuses to be imported outside a server bundle, which a test is not.
      "server-only": path.join(root, "tests/support/empty.ts"),
    },
  },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: "unit",
          include: ["tests/unit/**/*.test.{ts,tsx}"],
          testTimeout: 30_000, // of a busy machine; each is quick by itself
          sequence: { groupOrder: 1 },
        },
      },
      {
        extends: true,
        test: {
          name: "integration",
          include: ["tests/integration/**/*.test.{ts,tsx}"],
          globalSetup: services,
          setupFiles: ["tests/support/session.ts"],
          testTimeout: 30_000,
          hookTimeout: 60_000,
          sequence: { groupOrder: 2 },
        },
      },
      {
        extends: true,
        test: {
          name: "browser",
          include: ["tests/browser/**/*.test.{ts,tsx}"],
          globalSetup: services,
          testTimeout: 300_000,
          hookTimeout: 600_000, // the first one may have to build
          maxWorkers: 1,
          sequence: { groupOrder: 3 },
        },
      },
    ],
  },
});
