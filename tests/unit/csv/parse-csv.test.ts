import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { CsvError, parseCsv } from "@/lib/csv/parse-csv";

const texts = (source: string) => parseCsv(source).map((record) => record.map(({ text }) => text));

function errorOf(source: string): { line: number; column: number; message: string } {
  try {
    parseCsv(source);
  } catch (error) {
    if (error instanceof CsvError) return { line: error.line, column: error.column, message: error.message };
  }
  throw new Error("no CsvError");
}

// The rules and examples of RFC 4180, section 2.
describe("parseCsv", () => {
  it("reads records with and without a last line end, and lines that end with CR LF or LF", () => {
    const expected = [
      ["aaa", "bbb", "ccc"],
      ["zzz", "yyy", "xxx"],
    ];
    expect(texts("aaa,bbb,ccc\r\nzzz,yyy,xxx\r\n")).toEqual(expected);
    expect(texts("aaa,bbb,ccc\nzzz,yyy,xxx")).toEqual(expected);
    expect(texts('"aaa","bbb","ccc"\r\nzzz,yyy,xxx')).toEqual(expected);
  });

  it("keeps commas, line ends and doubled quotes within quotes, and spaces everywhere", () => {
    expect(texts('"aaa","b \r\nb,b","c""c"')).toEqual([["aaa", "b \r\nb,b", 'c"c']]);
    expect(texts(" a ,b\n,\n")).toEqual([
      [" a ", "b"],
      ["", ""],
    ]);
  });

  it("reads nothing from nothing, and takes no notice of a byte order mark and of empty lines at the end", () => {
    expect(parseCsv("")).toEqual([]);
    expect(parseCsv("\uFEFF")).toEqual([]);
    expect(texts("\uFEFFa,b\n1,2\n\n\r\n")).toEqual([
      ["a", "b"],
      ["1", "2"],
    ]);
  });

  it("knows where each field starts, after quoted line ends too", () => {
    expect(parseCsv('a,b\n"1\n2",x\n3,"y"').map((record) => record.map(({ line, column }) => [line, column]))).toEqual([
      [
        [1, 1],
        [1, 3],
      ],
      [
        [2, 1],
        [3, 4],
      ],
      [
        [4, 1],
        [4, 3],
      ],
    ]);
  });

  it("gives back whatever was written by the rules", () => {
    const field = fc.string({ unit: fc.constantFrom("a", "ß", " ", ",", '"', "\n", "\r", "\r\n", ";") });
    const rows = fc
      .integer({ min: 1, max: 4 })
      .chain((width) =>
        fc.array(fc.array(field, { minLength: width, maxLength: width }), { minLength: 1, maxLength: 5 }),
      );
    fc.assert(
      fc.property(rows, fc.constantFrom("\n", "\r\n"), (table, lineEnd) => {
        const quoted = table.map((row) => row.map((text) => `"${text.replaceAll('"', '""')}"`).join(","));
        expect(texts(quoted.join(lineEnd))).toEqual(table);
      }),
    );
  });

  it.each([
    ["a quote that never closes", 'a,b\n1,"2\n3', 2, 3],
    ["text after a closing quote", 'a,b\n"1"x,2', 2, 4],
    ["a quote within a plain field", 'a,b\n1,2"3', 2, 4],
    ["a line that ends with CR alone", "a,b\r1,2", 1, 4],
    ["a record with too many fields", "a,b\n1,2,3", 2, 5],
    ["a record with too few fields", "a,b\n1,2\n3", 3, 1],
    ["an empty line between records", "a,b\n\n1,2", 2, 1],
  ])("says where it finds %s", (_, source, line, column) => {
    expect(errorOf(source)).toMatchObject({ line, column });
  });

  it("says how many fields there should be", () => {
    expect(errorOf("a,b\n1").message).toBe("This record has 1 field, the first one 2.");
  });
});
