export const HEADER = "case,examiner,eye,horizontal,horizontal_degrees,vertical,vertical_degrees,readable";

/** A table of findings, one string a line: "1 A right eso 15", "1 A none", "1 A no", "1 A right eso 15 hyper 5", "1 A". */
export function findingTable(...lines: string[]): string {
  return [HEADER, ...lines.map(toCsvLine)].join("\n");
}

function toCsvLine(line: string): string {
  const [name, examiner, eye = "", ...parts] = line.split(" ");
  if (eye === "" || eye === "no") return [name, examiner, "", "", "", "", "", eye].join(",");
  const [horizontal, vertical] = [partOf(parts, ["eso", "exo"]), partOf(parts, ["hyper", "hypo"])];
  return [name, examiner, eye, horizontal, vertical, "yes"].join(",");
}

function partOf(parts: readonly string[], directions: readonly string[]): string {
  const place = parts.findIndex((part) => directions.includes(part));
  return place < 0 ? "none," : `${parts[place]},${parts[place + 1]}`;
}
