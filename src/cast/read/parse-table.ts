/** Text to rows of cells, for one delimiter. Papa Parse does the parsing; here it gets clean lines and gives line numbers. */
import Papa from "papaparse";

export interface Row {
  /** 1-based line in the file. */
  readonly lineIndex: number;
  readonly cells: readonly string[];
}

export interface Delimiter {
  readonly character: string;
  /** In words, for the user. */
  readonly name: string;
}

export const DELIMITERS: readonly Delimiter[] = [
  { character: ",", name: "comma" },
  { character: ";", name: "semicolon" },
  { character: "\t", name: "tab" },
  { character: "|", name: "vertical bar" },
  { character: " ", name: "blanks" },
];

const COMMENT = /^\s*"?(#|%|\/\/|\*|!)/;

export const isCommentLine = (line: string): boolean => COMMENT.test(line);

const isBlank = (cells: readonly string[]): boolean => cells.every((cell) => cell === "");

/**
 * The rows that have anything in them, cells trimmed. Comment lines are emptied and not taken out, so that lines keep
 * their numbers; a quoted cell that spans lines counts each of them.
 */
export function parseTable(lines: readonly string[], delimiter: Delimiter): readonly Row[] {
  const kept = lines.map((line) => (isCommentLine(line) ? "" : delimiter.character === " " ? squeezed(line) : line));
  const parsed = Papa.parse<string[]>(kept.join("\n"), { delimiter: delimiter.character, newline: "\n" });
  const rows: Row[] = [];
  let lineIndex = 1;
  for (const raw of parsed.data) {
    const cells = raw.map((cell) => cell.trim());
    if (!isBlank(cells)) rows.push({ lineIndex, cells });
    lineIndex += 1 + raw.reduce((count, cell) => count + (cell.match(/\n/g)?.length ?? 0), 0);
  }
  return rows;
}

const squeezed = (line: string): string => line.trim().replace(/[ \t]+/g, " ");
