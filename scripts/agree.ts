import { readFileSync } from "node:fs";
import { agree } from "@/lib/agree/agree";

// npm run agree -- FILE.csv prints every statistic that applies to a long table of readings.
const { output, errors, exitCode } = agree(process.argv.slice(2), (path) => readFileSync(path, "utf8"));
process.exitCode = exitCode;
process.stdout.on("error", () => {}); // whoever reads on may stop early, as head does
if (output) console.log(output);
if (errors) console.error(errors);
