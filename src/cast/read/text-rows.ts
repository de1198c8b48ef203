/**
 * The rows of a delimited text without a copy of their cells: where each row starts in the text, and the cells only when
 * they are asked for, so that a record of millions of rows takes little more memory than its text. What has quotation
 * marks in it is parsed at once by Papa Parse.
 */
import Papa from "papaparse";
import { type Delimiter, isCommentLine, keptText } from "./parse-table.ts";
import type { Rows } from "./rows.ts";
import { type OnShare, untold } from "./share.ts";

/** A list of whole numbers that grows. */
class Places {
  #values = new Uint32Array(1024);
  length = 0;

  push(value: number): void {
    if (this.length === this.#values.length) {
      const larger = new Uint32Array(2 * this.length);
      larger.set(this.#values);
      this.#values = larger;
    }
    this.#values[this.length++] = value;
  }

  at(i: number): number {
    return this.#values[i]!;
  }
}

/** A row that starts here is not in the text but among the quoted rows. */
const QUOTED = 0xffff_ffff;

export class TextRows implements Rows {
  readonly hasOpenQuote: boolean;
  readonly #text: string;
  readonly #delimiter: Delimiter;
  readonly #starts = new Places();
  readonly #lines = new Places();
  /** By row. */
  readonly #quoted = new Map<number, readonly string[]>();

  /**
   * @param text line ends all "\n"
   * @param onShare told now and then which share of the text is done
   */
  constructor(text: string, delimiter: Delimiter, onShare: OnShare = untold) {
    this.#text = text;
    this.#delimiter = delimiter;
    this.hasOpenQuote = this.#findRows(onShare);
  }

  get length(): number {
    return this.#starts.length;
  }

  lineIndexAt(row: number): number {
    return this.#lines.at(row);
  }

  cellsAt(row: number): readonly string[] {
    return this.#quoted.get(row) ?? this.#cellsOf(this.#lineAt(row));
  }

  cellAt(row: number, column: number): string | undefined {
    if (this.#delimiter.blanks !== undefined || this.#starts.at(row) === QUOTED) return this.cellsAt(row)[column];
    const { character } = this.#delimiter;
    const end = this.#endOf(this.#starts.at(row));
    let start = this.#starts.at(row);
    for (let before = 0; before < column; before++) {
      const at = this.#text.indexOf(character, start);
      if (at < 0 || at >= end) return undefined;
      start = at + 1;
    }
    const next = this.#text.indexOf(character, start);
    return this.#text.slice(start, next < 0 || next > end ? end : next).trim();
  }

  #endOf(start: number): number {
    const end = this.#text.indexOf("\n", start);
    return end < 0 ? this.#text.length : end;
  }

  #lineAt(row: number): string {
    const start = this.#starts.at(row);
    return this.#text.slice(start, this.#endOf(start));
  }

  #cellsOf(line: string): readonly string[] {
    return keptText(line, this.#delimiter)
      .split(this.#delimiter.character)
      .map((cell) => cell.trim());
  }

  #isBlank(line: string): boolean {
    for (let i = 0; i < line.length; i++)
      if (line[i] !== this.#delimiter.character && line[i]!.trim() !== "") return false;
    return true;
  }

  /** Whether a quotation is left open. */
  #findRows(onShare: OnShare): boolean {
    const text = this.#text;
    let start = 0;
    let lineIndex = 1;
    while (start <= text.length) {
      if (lineIndex % 65_536 === 0) onShare(start / text.length);
      const end = this.#endOf(start);
      const line = text.slice(start, end);
      if (isCommentLine(line)) {
        // It may hold a quotation mark that means nothing.
      } else if (line.includes('"')) {
        const quoted = this.#parseQuoted(start, lineIndex);
        if (quoted.isOpen) return true;
        start = quoted.end + 1;
        lineIndex = quoted.nextLineIndex;
        continue;
      } else if (!this.#isBlank(line)) {
        this.#starts.push(start);
        this.#lines.push(lineIndex);
      }
      start = end + 1;
      lineIndex += 1;
    }
    return false;
  }

  /** The end of a run of neighbouring lines with quotation marks, and of at least so many characters. */
  #endOfQuoted(start: number, leastLength: number): number {
    let end = start - 1;
    while (end < this.#text.length) {
      const lineEnd = this.#endOf(end + 1);
      if (end - start >= leastLength && !this.#text.slice(end + 1, lineEnd).includes('"')) break;
      end = lineEnd;
    }
    return end;
  }

  /** Parses the lines from here on until every quotation has closed; the longer one stays open, the further it looks. */
  #parseQuoted(start: number, firstLineIndex: number): { end: number; nextLineIndex: number; isOpen: boolean } {
    let end = this.#endOfQuoted(start, 0);
    let parsed = this.#parse(start, end);
    while (isOpen(parsed) && end < this.#text.length) {
      end = this.#endOfQuoted(start, 2 * (end - start));
      parsed = this.#parse(start, end);
    }
    let lineIndex = firstLineIndex;
    for (const raw of parsed.data) {
      const cells = raw.map((cell) => cell.trim());
      if (cells.some((cell) => cell !== "")) {
        this.#quoted.set(this.#starts.length, cells);
        this.#starts.push(QUOTED);
        this.#lines.push(lineIndex);
      }
      lineIndex += 1;
      for (const cell of raw) if (cell.includes("\n")) lineIndex += cell.split("\n").length - 1;
    }
    return { end, nextLineIndex: lineIndex, isOpen: isOpen(parsed) };
  }

  #parse(start: number, end: number): Papa.ParseResult<string[]> {
    const kept = this.#text
      .slice(start, end)
      .split("\n")
      .map((line) => keptText(line, this.#delimiter));
    return Papa.parse<string[]>(kept.join("\n"), { delimiter: this.#delimiter.character, newline: "\n" });
  }
}

const isOpen = ({ errors }: Papa.ParseResult<string[]>): boolean => errors.some(({ code }) => code === "MissingQuotes");
