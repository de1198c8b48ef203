/** Text to rows of cells, for one delimiter. Papa Parse does the parsing; here it gets clean lines and gives line numbers. */
import Papa from "papaparse";

export interface Row {
  /** 1-based line in the file. */
  readonly lineIndex: number;
  readonly cells: readonly string[];
}

export interface ParsedRows {
  /** The rows that have anything in them, cells trimmed. */
  readonly rows: readonly Row[];
  /** A quotation that is opened and not closed swallows what follows it. */
  readonly hasOpenQuote: boolean;
}

export interface Delimiter {
  readonly character: string;
  /** In words, for the user. */
  readonly name: string;
}

/** Where two make as much sense of a header, the earlier one is taken. */
export const DELIMITERS: readonly Delimiter[] = [
  { character: ",", name: "comma" },
  { character: ";", name: "semicolon" },
  { character: "\t", name: "tab" },
  { character: "|", name: "vertical bar" },
  { character: " ", name: "blanks" },
];

const COMMENT_SIGN = /^(\s*"?)(#|%|\/\/)+\s*/;

export const isCommentLine = (line: string): boolean => COMMENT_SIGN.test(line);

export const withoutCommentSign = (line: string): string => line.replace(COMMENT_SIGN, "$1");

const squeezed = (line: string): string => line.trim().replace(/ +/g, " ");

/**
 * Comment lines are emptied and not taken out, so that lines keep their numbers; a quoted cell that spans lines counts
 * each of them.
 */
export function parseTable(lines: readonly string[], delimiter: Delimiter): ParsedRows {
  const kept = lines.map((line) => (isCommentLine(line) ? "" : delimiter.character === " " ? squeezed(line) : line));
  const parsed = Papa.parse<string[]>(kept.join("\n"), { delimiter: delimiter.character, newline: "\n" });
  const rows: Row[] = [];
  let lineIndex = 1;
  for (const raw of parsed.data) {
    const cells = raw.map((cell) => cell.trim());
    if (cells.some((cell) => cell !== "")) rows.push({ lineIndex, cells });
    lineIndex += 1;
    for (const cell of raw) if (cell.includes("\n")) lineIndex += cell.split("\n").length - 1;
  }
  return { rows, hasOpenQuote: parsed.errors.some((error) => error.code === "MissingQuotes") };
}
