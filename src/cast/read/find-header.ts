/** Finds the delimiter, the header row and a row of units below it: whichever delimiter makes most sense of a header. */
import { unitByName } from "../../units/index.ts";
import { DELIMITERS, type Delimiter, isCommentLine, parseTable, type Row, withoutCommentSign } from "./parse-table.ts";
import { readHeaderCell } from "./read-header-cell.ts";
import { isMeasured, MEASURED } from "./roles.ts";
import type { Table } from "./table.ts";

/** So many lines are searched at a time; text above a table may be longer. */
const SEARCHED_LINES = 1000;
/** Between headers and the first numbers may stand units and a second line of names. */
const ROWS_TO_NUMBERS = 4;

/** A row that could be the header, in one reading of the lines. */
interface Candidate {
  readonly delimiter: Delimiter;
  readonly headerLineIndex: number;
  /** Names that we know, numbers below, as many of them as names: the more the better. */
  readonly score: number;
}

/** A row of numbers of the same width below weighs more than any number of names. */
const HAS_NUMBERS = 100;
const HAS_WIDTH = 50;
const HAS_TEMPERATURE = 10;

const looksNumeric = (cell: string): boolean => /^[-+−]?[\d.,]+(e[-+]?\d+)?$/i.test(cell);

/** The roles that the names of a row have; none if it has only been torn apart at the blanks within its names. */
function rolesIn(cells: readonly string[], delimiter: Delimiter): ReadonlySet<string> {
  const isTorn = delimiter.blanks !== undefined && cells.some((cell) => /[,;|\t]/.test(cell));
  if (isTorn || cells.length < 2) return new Set();
  return new Set(cells.flatMap((cell) => readHeaderCell(cell)?.role ?? []));
}

/** Cells up to the last that holds something: a delimiter at the end of a line opens no column. */
const widthOf = (cells: readonly string[]): number => cells.findLastIndex((cell) => cell !== "") + 1;

function scoreOf(rows: readonly Row[], at: number, delimiter: Delimiter): number {
  const header = rows[at]!.cells;
  const roles = rolesIn(header, delimiter);
  if (roles.size === 0) return 0;
  const below = rows.slice(at + 1, at + 1 + ROWS_TO_NUMBERS);
  const numbers = below.find((row) => row.cells.filter(looksNumeric).length >= Math.min(2, header.length));
  const isOfWidth = numbers && widthOf(numbers.cells) <= header.length && numbers.cells.length >= widthOf(header);
  return (
    roles.size +
    (numbers ? HAS_NUMBERS : 0) +
    (isOfWidth ? HAS_WIDTH : 0) +
    (roles.has("temperature") ? HAS_TEMPERATURE : 0)
  );
}

/** The first of the rows with the best score. */
function bestRow(lines: readonly string[], firstLine: number, delimiter: Delimiter): Candidate {
  let best: Candidate = { delimiter, headerLineIndex: 0, score: 0 };
  const { rows } = parseTable(lines, delimiter);
  for (const [at, row] of rows.entries()) {
    const score = scoreOf(rows, at, delimiter);
    if (score > best.score) best = { delimiter, headerLineIndex: firstLine + row.lineIndex, score };
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
  return header ? { delimiter, headerLineIndex: header.lineIndex, score: 0 } : null;
}

/** The best header among all lines; the search ends with the first stretch of lines that has one above numbers. */
function bestByNames(lines: readonly string[]): Candidate | null {
  let best: Candidate | null = null;
  for (let start = 0; start < lines.length; start += SEARCHED_LINES) {
    const searched = lines.slice(start, start + SEARCHED_LINES + ROWS_TO_NUMBERS);
    for (const delimiter of DELIMITERS) {
      const found = bestRow(searched, start, delimiter);
      if (found.score > (best?.score ?? 0)) best = found;
    }
    if (best !== null && best.score > HAS_NUMBERS) return best;
  }
  return best;
}

/** Some files put a comment sign before the header itself, as the last line of the comments at the top. */
function withHeaderUncommented(lines: readonly string[]): readonly string[] {
  const first = lines.findIndex((line) => line.trim() !== "" && !isCommentLine(line));
  const last = lines.slice(0, Math.max(first, 0)).findLastIndex(isCommentLine);
  return lines.map((line, i) => (i === last ? withoutCommentSign(line) : line));
}

/** A pure number as a unit: practical salinity has it in the CF conventions. */
const PURE_NUMBER = /^(1|1e-0?3|0\.001)$/i;

/** One text a column when the row below the header is a row of units, else null. */
function unitsIn(header: readonly string[], below: Row | undefined): readonly string[] | null {
  if (below === undefined || below.cells.some((cell) => looksNumeric(cell) && !PURE_NUMBER.test(cell))) return null;
  const texts = header.map((_, i) => (below.cells[i] ?? "").replace(/^[([{]\s*|\s*[)\]}]$/g, ""));
  const isUnits = header.some((cell, i) => {
    const role = readHeaderCell(cell)?.role;
    const isWord = role !== undefined && !PURE_NUMBER.test(texts[i]!);
    return isWord && isMeasured(role) && unitByName(texts[i]!, MEASURED[role].kind) !== null;
  });
  return isUnits ? texts : null;
}

/** The names in a table, on one line or two, and the rows that they stand in. */
interface Names {
  readonly cells: readonly string[];
  readonly firstAt: number;
  readonly lastAt: number;
}

/** Names of two lines, "Specific" over "cond", where together they say at least as much as the one line alone. */
function namesAt(rows: readonly Row[], at: number, delimiter: Delimiter): Names {
  const alone: Names = { cells: rows[at]!.cells, firstAt: at, lastAt: at };
  for (const firstAt of [at - 1, at]) {
    const [upper, lower] = [rows[firstAt], rows[firstAt + 1]];
    if (!upper || !lower || upper.cells.length !== lower.cells.length) continue;
    if (lower.lineIndex !== upper.lineIndex + 1 || [...upper.cells, ...lower.cells].some(looksNumeric)) continue;
    if (unitsIn(upper.cells, lower) !== null) continue;
    const cells = upper.cells.map((cell, i) => `${cell} ${lower.cells[i]}`.trim());
    const losesName = alone.cells.some(
      (cell, i) => readHeaderCell(cell) !== null && readHeaderCell(cells[i]!) === null,
    );
    if (!losesName && rolesIn(cells, delimiter).size >= rolesIn(alone.cells, delimiter).size) {
      return { cells, firstAt, lastAt: firstAt + 1 };
    }
  }
  return alone;
}

const isSameRow = (row: Row, cells: readonly string[]): boolean =>
  row.cells.length === cells.length && row.cells.every((cell, i) => cell === cells[i]);

/** Rows of numbers and nothing above them: the columns are called by their place, #1 and on. */
function withoutHeader(lines: readonly string[]): Table | null {
  for (const delimiter of DELIMITERS) {
    const { rows, hasOpenQuote } = parseTable(lines, delimiter);
    const width = rows[0]?.cells.length ?? 0;
    const isTable = rows.every((row) => row.cells.length === width && row.cells.filter(looksNumeric).length >= 2);
    if (!isTable || rows.length < 2) continue;
    const cells = rows[0]!.cells.map((_, i) => `#${i + 1}`);
    return {
      delimiter,
      header: { lineIndex: 0, cells },
      unitTexts: cells.map(() => ""),
      rows,
      preface: [],
      hasOpenQuote,
    };
  }
  return null;
}

/** The table in a text, or null when there is none. A header repeated further down, as in joined files, is taken out. */
export function findTable(text: string): Table | null {
  const plain = text.split("\n");
  const byNames = bestByNames(plain);
  const lines = byNames === null ? withHeaderUncommented(plain) : plain;
  const searched = lines.slice(0, SEARCHED_LINES);
  const candidate =
    byNames ?? bestByNames(lines) ?? DELIMITERS.map((d) => headerByShape(searched, d)).find((c) => c !== null);
  if (!candidate) return withoutHeader(lines);
  const { rows, hasOpenQuote } = parseTable(lines, candidate.delimiter);
  const at = rows.findIndex((row) => row.lineIndex === candidate.headerLineIndex);
  const names = namesAt(rows, at, candidate.delimiter);
  const units = unitsIn(names.cells, rows[names.lastAt + 1]);
  const header = {
    lineIndex: rows[names.lastAt]!.lineIndex,
    cells: names.cells.slice(0, Math.max(2, widthOf(names.cells))),
  };
  return {
    delimiter: candidate.delimiter,
    header,
    unitTexts: header.cells.map((_, i) => units?.[i] ?? ""),
    rows: rows.slice(names.lastAt + (units === null ? 1 : 2)).filter((row) => !isSameRow(row, rows[at]!.cells)),
    preface: rows.slice(0, names.firstAt),
    hasOpenQuote,
  };
}
