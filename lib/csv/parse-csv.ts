/** One field with the place of its first character, both from 1. A field in quotes may go over several lines. */
export type CsvField = { text: string; line: number; column: number };
export type CsvRecord = CsvField[];

/** A file that is not CSV at the place named. */
export class CsvError extends Error {
  override readonly name = "CsvError";

  constructor(
    readonly line: number,
    readonly column: number,
    message: string,
  ) {
    super(message);
  }
}

const QUOTE_RULE = "Quotes enclose a whole field; a quote within is written twice, in a field in quotes.";

/**
 * Reads comma-separated text strictly: every record has as many fields as the first, quotes enclose whole fields, and a
 * quote within is written twice. Lines end with CR LF or LF, the last one or not; empty lines at the end do not count.
 * Nothing is trimmed or guessed: what breaks a rule throws CsvError with its line and column.
 * Source: RFC 4180.
 */
export function parseCsv(text: string): CsvRecord[] {
  const reader = new CsvReader(text.replace(/^\uFEFF/, "").replace(/(\r?\n)+$/, ""));
  const records: CsvRecord[] = [];
  while (!reader.isAtEnd()) {
    const record = reader.readRecord();
    const [first = record] = records;
    const [start] = record;
    if (record.length !== first.length && start) {
      const surplus = record[first.length] ?? start;
      const fields = `${record.length} ${record.length === 1 ? "field" : "fields"}`;
      throw new CsvError(surplus.line, surplus.column, `This record has ${fields}, the first one ${first.length}.`);
    }
    records.push(record);
  }
  return records;
}

class CsvReader {
  private at = 0;
  private line = 1;
  private lineStart = 0;

  constructor(private readonly text: string) {}

  isAtEnd(): boolean {
    return this.at >= this.text.length;
  }

  readRecord(): CsvRecord {
    const record: CsvRecord = [];
    for (;;) {
      record.push(this.readField());
      if (this.skip(",")) continue;
      if (this.isAtEnd() || this.skipLineEnd()) return record;
      throw this.error(this.text[this.at] === "\r" ? "A line ends with CR LF or LF, not with CR alone." : QUOTE_RULE);
    }
  }

  private readField(): CsvField {
    const [line, column] = [this.line, this.at - this.lineStart + 1];
    const text = this.skip('"') ? this.readQuoted(line, column) : this.readPlain();
    return { text, line, column };
  }

  private readPlain(): string {
    const start = this.at;
    while (!this.isAtEnd() && !',"\r\n'.includes(this.text[this.at] ?? "")) this.at += 1;
    return this.text.slice(start, this.at);
  }

  private readQuoted(line: number, column: number): string {
    let value = "";
    for (;;) {
      if (this.isAtEnd()) throw new CsvError(line, column, "The quote that opens here is never closed.");
      if (this.skip('"')) {
        if (!this.skip('"')) return value;
        value += '"';
        continue;
      }
      const start = this.at;
      if (!this.skipLineEnd()) this.at += 1;
      value += this.text.slice(start, this.at);
    }
  }

  private skip(mark: string): boolean {
    if (!this.text.startsWith(mark, this.at)) return false;
    this.at += mark.length;
    return true;
  }

  private skipLineEnd(): boolean {
    if (!this.skip("\n") && !this.skip("\r\n")) return false;
    this.line += 1;
    this.lineStart = this.at;
    return true;
  }

  private error(message: string): CsvError {
    return new CsvError(this.line, this.at - this.lineStart + 1, message);
  }
}
