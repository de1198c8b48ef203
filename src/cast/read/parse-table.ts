/** Text to rows of cells, for one delimiter. Papa Parse does the parsing; here it gets clean lines and gives line numbers. */
import Papa from "papaparse";

export interface Row {
  /** 1-based line in the file. */
  readonly lineIndex: number;
  readonly cells: readonly string[];
}

/** Cells up to the last that holds something: a delimiter at the end of a line opens no column. */
export const widthOf = (cells: readonly string[]): number => cells.findLastIndex((cell) => cell !== "") + 1;

export interface ParsedRows {
  /** The rows that have anything in them, cells trimmed. */
  readonly rows: readonly Row[];
  /** A quotation that is opened and not closed swallows what follows it. */
  readonly hasOpenQuote: boolean;
}

export interface Delimiter {
  readonly character: string;
  /** Runs of these part the cells, and are made into one `character` before parsing. */
  readonly blanks?: RegExp;
  /** In words, for the user. */
  readonly name: string;
}

/** Where two make as much sense of a header, the earlier one is taken. */
export const DELIMITERS: readonly Delimiter[] = [
  { character: ",", name: "comma" },
  { character: ";", name: "semicolon" },
  { character: "\t", name: "tab" },
  { character: "|", name: "vertical bar" },
  { character: " ", name: "blanks", blanks: /[ \t]+/g },
  { character: "\t", name: "runs of blanks", blanks: / {2,}|\t/g },
];

const COMMENT_SIGN = /^(\s*"?)(#|%|\/\/)+\s*/;

export const isCommentLine = (line: string): boolean => COMMENT_SIGN.test(line);

export const withoutCommentSign = (line: string): string => line.replace(COMMENT_SIGN, "$1");

/** A line as it goes to the parser: comments emptied, runs of blanks made into one delimiter. */
export function keptText(line: string, { character, blanks }: Delimiter): string {
  if (isCommentLine(line)) return "";
  return blanks === undefined ? line : line.trim().replace(blanks, character);
}

/**
 * Comment lines are emptied and not taken out, so that lines keep their numbers; a quoted cell that spans lines counts
 * each of them.
 */
export function parseTable(lines: readonly string[], delimiter: Delimiter): ParsedRows {
  const text = lines.map((line) => keptText(line, delimiter)).join("\n");
  const parsed = Papa.parse<string[]>(text, { delimiter: delimiter.character, newline: "\n" });
  const rows: Row[] = [];
  let lineIndex = 1;
  for (const cells of parsed.data) {
    const firstLine = lineIndex;
    let isBlank = true;
    lineIndex += 1;
    for (let i = 0; i < cells.length; i++) {
      const raw = cells[i]!;
      if (raw.includes("\n")) lineIndex += raw.split("\n").length - 1;
      const cell = raw.trim();
      cells[i] = cell;
      isBlank &&= cell === "";
    }
    if (!isBlank) rows.push({ lineIndex: firstLine, cells });
  }
  return { rows, hasOpenQuote: parsed.errors.some((error) => error.code === "MissingQuotes") };
}
