import { parentPort, workerData } from "node:worker_threads";
import { drawPhotograph } from "./draw-photograph";

// Thrown errors reach the parent as the worker's `error` event.
const { width, height, data, truth } = drawPhotograph(workerData);
parentPort?.postMessage({ width, height, data, truth }, [data.buffer]);
