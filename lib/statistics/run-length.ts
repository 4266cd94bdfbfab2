import { cusumRunLength } from "./cusum-run-length";
import { ewmaRunLength } from "./ewma-run-length";

/** How many points a chart takes on average to signal: in control, or after a shift. */
export const runLength = { ewma: ewmaRunLength, cusum: cusumRunLength };
