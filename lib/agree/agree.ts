import { formatReport } from "./format-report";
import { readFindings } from "./read-findings";
import { readNumber, readValues, SCALES, type Scale } from "./read-values";
import type { Report } from "./report";
import { reportFindings } from "./report-findings";
import { reportLabels, reportMeasurements } from "./report-values";
import { readRows } from "./table-columns";
import { TableError, type TableFault } from "./table-error";

export type Printed = { output: string; errors: string; exitCode: 0 | 2 };

const USAGE = `npm run agree -- FILE.csv [--json]
    case,examiner,eye,horizontal,horizontal_degrees,vertical,vertical_degrees,readable[,round]
npm run agree -- FILE.csv --scale nominal|ordinal|interval [--json]
    subject,rater,value
An examiner or rater called "reference" is the reference.`;

const FAULTS_SHOWN = 20;

/**
 * The command for people outside the browser: prints every statistic that applies to a long table.
 * `readFile` gives the text of a file or throws. Bad arguments, a file that cannot be read and a bad table end with 2.
 */
export function agree(args: readonly string[], readFile: (path: string) => string): Printed {
  const options = parseArguments(args);
  if (typeof options === "string") return { output: "", errors: `${options}\n${USAGE}`, exitCode: 2 };
  if (options.help) return { output: USAGE, errors: "", exitCode: 0 };
  let text: string;
  try {
    text = readFile(options.file);
  } catch {
    return { output: "", errors: `${options.file} cannot be read.`, exitCode: 2 };
  }
  try {
    const report = reportTable(text, options.scale);
    return { output: options.json ? JSON.stringify(report, null, 2) : formatReport(report), errors: "", exitCode: 0 };
  } catch (error) {
    if (!(error instanceof TableError)) throw error;
    return { output: "", errors: formatFaults(options.file, error.faults), exitCode: 2 };
  }
}

/** Chooses what applies by the columns and the scale. Throws TableError. */
export function reportTable(text: string, scale: Scale | undefined): Report {
  const table = readRows(text);
  const reject = (message: string) => new TableError([{ line: 1, column: "header", message }]);
  if (table.kind === "findings") {
    if (scale) throw reject("These columns hold findings, which have no --scale.");
    return reportFindings(readFindings(table));
  }
  if (!scale) throw reject(`Say what the values are: --scale ${SCALES.join(" or ")}.`);
  if (scale === "nominal")
    return reportLabels(
      readValues(table, (label) => label),
      scale,
    );
  if (scale === "ordinal") return reportLabels(readValues(table, readNumber), scale);
  return reportMeasurements(readValues(table, readNumber));
}

type Options = { file: string; scale?: Scale; json: boolean; help: boolean };

/** The options, or what is wrong with the arguments. */
function parseArguments(args: readonly string[]): Options | string {
  const options: Options = { file: "", json: false, help: false };
  const rest = [...args];
  for (let word = rest.shift(); word !== undefined; word = rest.shift()) {
    if (word === "--json") options.json = true;
    else if (word === "--help") options.help = true;
    else if (word === "--scale" || word.startsWith("--scale=")) {
      const name = word === "--scale" ? rest.shift() : word.slice("--scale=".length);
      options.scale = SCALES.find((scale) => scale === name);
      if (!options.scale) return `--scale is ${SCALES.join(", ")}; got ${name ?? "nothing"}.`;
    } else if (word.startsWith("--")) return `${word} is not known.`;
    else if (options.file) return "One file at a time.";
    else options.file = word;
  }
  return options.file || options.help ? options : "Name a file.";
}

function formatFaults(file: string, faults: readonly TableFault[]): string {
  const lines = faults.slice(0, FAULTS_SHOWN).map(({ line, column, message }) => {
    const place = line === 0 ? "" : `line ${line}, `;
    return `${file}: ${place}column ${column}: ${message}`;
  });
  const hidden = faults.length - lines.length;
  return [...lines, ...(hidden > 0 ? [`${file}: and ${hidden} more like these.`] : [])].join("\n");
}
