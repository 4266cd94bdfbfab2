import { describe, expect, it } from "vitest";
import { readFindings } from "@/lib/agree/read-findings";
import { readRows } from "@/lib/agree/table-columns";
import { TableError, type TableFault } from "@/lib/agree/table-error";
import { ALIGNED } from "@/lib/reflex/finding";
import { deviation } from "../reflex/build-finding";
import { HEADER } from "./finding-table";

const read = (...lines: string[]) => readFindings(readRows([HEADER, ...lines].join("\n")));

function faultsOf(text: string): readonly TableFault[] {
  try {
    readFindings(readRows(text));
  } catch (error) {
    if (error instanceof TableError) return error.faults;
  }
  throw new Error("no TableError");
}

describe("readFindings", () => {
  it("reads findings in any case of letters, with empty directions for none", () => {
    const readings = read(
      "1,A,Right,ESO,15,none,,yes",
      "1,A,left,exo,>45,hyper,5,true",
      "1,A,none,,,,,YES",
      "1,A,right,,,hypo,3,yes",
      "1,A, left , exo , 20 ,,, yes ",
    );
    expect(readings.map(({ value }) => value)).toEqual([
      deviation("right", { eso: 15 }),
      deviation("left", { exo: ">45", hyper: 5 }),
      ALIGNED,
      deviation("right", { hypo: 3 }),
      deviation("left", { exo: 20 }),
    ]);
  });

  it("reads what is not readable, and a row without a reading", () => {
    const readings = read("1,A,none,none,,none,,no", "2,A,,,,,,false", "3,A,,,,,,");
    expect(readings.map(({ value }) => value)).toEqual([
      { readable: false, reason: "other" },
      { readable: false, reason: "other" },
      null,
    ]);
    expect(readings.map(({ line, case: name, examiner, round }) => [line, name, examiner, round])).toEqual([
      [2, "1", "A", null],
      [3, "2", "A", null],
      [4, "3", "A", null],
    ]);
  });

  it("takes columns in any order, and needs a round of everybody but the reference", () => {
    const text = "Round,readable,vertical_degrees,vertical,horizontal_degrees,horizontal,eye,examiner,case";
    const rows = readRows(`${text}\n2,yes,,none,10,eso,right,A,7\n,yes,,none,10,eso,right,reference,7`);
    expect(readFindings(rows)).toMatchObject([
      { case: "7", examiner: "A", round: "2", value: deviation("right", { eso: 10 }) },
      { case: "7", examiner: "reference", round: null },
    ]);
    expect(faultsOf(`${text}\n,yes,,none,10,eso,right,A,7`)).toEqual([
      { line: 2, column: "round", message: "Name the round." },
    ]);
  });

  it.each([
    ["no eye", "1,A,,eso,15,none,,yes", ["eye"]],
    ["an eye that is not one", "1,A,both,eso,15,none,,yes", ["eye"]],
    ["no word on readability", "1,A,right,eso,15,none,,", ["readable"]],
    ["a deviation of neither eye", "1,A,none,eso,15,none,,yes", ["eye"]],
    ["an eye without a deviation", "1,A,right,none,,none,,yes", ["horizontal"]],
    ["a direction without degrees", "1,A,right,eso,,hyper,,yes", ["horizontal_degrees", "vertical_degrees"]],
    ["words for degrees", "1,A,right,eso,many,none,,yes", ["horizontal_degrees"]],
    ["a finding of what is not readable", "1,A,right,eso,15,none,,no", ["eye", "horizontal", "horizontal_degrees"]],
    ["nobody", "1,,right,eso,15,none,,yes", ["examiner"]],
    ["no case", ",A,right,eso,15,none,,yes", ["case"]],
  ])("names the columns of %s", (_, line, columns) => {
    const faults = faultsOf(`${HEADER}\n${line}`);
    expect(faults.map(({ column }) => column)).toEqual(columns);
    expect(faults.every((fault) => fault.line === 2)).toBe(true);
  });

  it("says what degrees may be, whatever stands there instead", () => {
    for (const text of ["many", "46", "0", "1.5", "-3", "> 45"]) {
      const [fault] = faultsOf(`${HEADER}\n1,A,right,eso,${text},none,,yes`);
      expect(fault?.message).toBe("Degrees are whole numbers from 1 to 45, or >45 beyond the limbus.");
    }
  });

  it("finds the faults of every row, with lines that count those within quotes", () => {
    const faults = faultsOf(`${HEADER}\n"1\n",A,up,eso,15,none,,yes\n2,A,right,eso,99,none,,yes`);
    expect(faults.map(({ line, column }) => [line, column])).toEqual([
      [2, "eye"],
      [4, "horizontal_degrees"],
    ]);
  });

  it.each([
    ["an unknown column", `${HEADER},colour\n1,A,none,none,,none,,yes,red`, "colour"],
    ["a column that is there twice", `${HEADER},eye\n1,A,none,none,,none,,yes,none`, "eye"],
    ["a round of values", "subject,rater,value,round\n1,A,2,1", "round"],
  ])("names %s", (_, text, column) => {
    expect(faultsOf(text)).toMatchObject([{ line: 1, column }]);
  });
});
