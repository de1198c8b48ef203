/** Finds the delimiter, the header row and a row of units below it: whichever delimiter makes most sense of a header. */
import { unitByName } from "../../units/index.ts";
import { DELIMITERS, type Delimiter, isCommentLine, parseTable, type Row, withoutCommentSign } from "./parse-table.ts";
import { readHeaderCell } from "./read-header-cell.ts";
import { isMeasured, MEASURED } from "./roles.ts";
import type { Table } from "./table.ts";

/** A header further down than this is not looked for. */
const SEARCHED_LINES = 1000;

interface Candidate {
  readonly delimiter: Delimiter;
  readonly headerLineIndex: number;
  readonly roleCount: number;
}

const looksNumeric = (cell: string): boolean => /^[-+−]?[\d.,]+(e[-+]?\d+)?$/i.test(cell);

/** How many names a row holds that we know; none if it has only been torn apart at the blanks within its names. */
function roleCountOf(row: Row, delimiter: Delimiter): number {
  const isTorn = delimiter.character === " " && row.cells.some((cell) => /[,;|\t]/.test(cell));
  if (isTorn || row.cells.length < 2) return 0;
  return new Set(row.cells.flatMap((cell) => readHeaderCell(cell)?.role ?? [])).size;
}

/** The first of the rows with most known names. */
function headerByNames(lines: readonly string[], delimiter: Delimiter): Candidate {
  let best: Candidate = { delimiter, headerLineIndex: 0, roleCount: 0 };
  for (const row of parseTable(lines, delimiter).rows) {
    const roleCount = roleCountOf(row, delimiter);
    if (roleCount > best.roleCount) best = { delimiter, headerLineIndex: row.lineIndex, roleCount };
  }
  return best;
}

/** A table without one known name still has a header if texts stand above a body of numbers. */
function headerByShape(lines: readonly string[], delimiter: Delimiter): Candidate | null {
  const { rows } = parseTable(lines, delimiter);
  const header = rows.find((row, i) => {
    const next = rows[i + 1];
    const isHeading = row.cells.length >= 2 && !row.cells.some(looksNumeric);
    return isHeading && next?.cells.length === row.cells.length && next.cells.filter(looksNumeric).length >= 2;
  });
  return header ? { delimiter, headerLineIndex: header.lineIndex, roleCount: 0 } : null;
}

function bestByNames(lines: readonly string[]): Candidate | null {
  const candidates = DELIMITERS.map((delimiter) => headerByNames(lines, delimiter));
  const best = candidates.reduce((a, b) => (b.roleCount > a.roleCount ? b : a));
  return best.roleCount > 0 ? best : null;
}

/** Some files put a comment sign before the header itself, as the last line of the comments at the top. */
function withHeaderUncommented(lines: readonly string[]): readonly string[] {
  const first = lines.findIndex((line) => line.trim() !== "" && !isCommentLine(line));
  const last = lines.slice(0, Math.max(first, 0)).findLastIndex(isCommentLine);
  return lines.map((line, i) => (i === last ? withoutCommentSign(line) : line));
}

/** One text a column when the row below the header is a row of units, else null. */
function unitsIn(header: Row, below: Row | undefined): readonly string[] | null {
  if (below === undefined || below.cells.some(looksNumeric)) return null;
  const texts = header.cells.map((_, i) => (below.cells[i] ?? "").replace(/^[([{]\s*|\s*[)\]}]$/g, ""));
  const isUnits = header.cells.some((cell, i) => {
    const role = readHeaderCell(cell)?.role;
    return role !== undefined && isMeasured(role) && unitByName(texts[i]!, MEASURED[role].kind) !== null;
  });
  return isUnits ? texts : null;
}

const isSameRow = (a: Row, b: Row): boolean =>
  a.cells.length === b.cells.length && a.cells.every((cell, i) => cell === b.cells[i]);

/** The table in a text, or null when there is none. A header repeated further down, as in joined files, is taken out. */
export function findTable(text: string): Table | null {
  const plain = text.split("\n");
  const byNames = bestByNames(plain.slice(0, SEARCHED_LINES));
  const lines = byNames === null ? withHeaderUncommented(plain) : plain;
  const searched = lines.slice(0, SEARCHED_LINES);
  const candidate =
    byNames ?? bestByNames(searched) ?? DELIMITERS.map((d) => headerByShape(searched, d)).find((c) => c !== null);
  if (!candidate) return null;
  const { rows, hasOpenQuote } = parseTable(lines, candidate.delimiter);
  const headerAt = rows.findIndex((row) => row.lineIndex === candidate.headerLineIndex);
  const header = rows[headerAt]!;
  const units = unitsIn(header, rows[headerAt + 1]);
  return {
    delimiter: candidate.delimiter,
    header,
    unitTexts: units ?? header.cells.map(() => ""),
    rows: rows.slice(headerAt + (units === null ? 1 : 2)).filter((row) => !isSameRow(row, header)),
    preface: rows.slice(0, headerAt),
    hasOpenQuote,
  };
}
