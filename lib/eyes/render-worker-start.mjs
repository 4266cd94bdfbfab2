// Node 20 starts a worker from JavaScript only. This file teaches the worker TypeScript and then hands over.
import { register } from "tsx/esm/api";

register();
await import("./render-worker.ts");
