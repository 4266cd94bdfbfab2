import { createLucideIcon } from "lucide-react";

/** The sign of an error and of an action limit. The icon set has diamonds, but none with an exclamation mark. */
export const DiamondAlert = createLucideIcon("diamond-alert", [
  ["path", { d: "M12 2.5 21.5 12 12 21.5 2.5 12Z", key: "frame" }],
  ["path", { d: "M12 7.5V13", key: "stroke" }],
  ["path", { d: "M12 16v.2", key: "point" }],
]);
