/** Finds the delimiter, the header row and a row of units below it: whichever delimiter makes most sense of a header. */
import { unitByName } from "../../units/index.ts";
import {
  DELIMITERS,
  type Delimiter,
  isCommentLine,
  parseTable,
  type Row,
  widthOf,
  withoutCommentSign,
} from "./parse-table.ts";
import { readHeaderCell } from "./read-header-cell.ts";
import { isMeasured, MEASURED } from "./roles.ts";
import { chosenRows, rowsBetween } from "./rows.ts";
import type { OnShare } from "./share.ts";
import type { Table } from "./table.ts";
import { TextRows } from "./text-rows.ts";

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

/** The lines of a text, a stretch at a time; each overlaps the next by the rows between a header and its numbers. */
function* stretchesOf(text: string): Generator<{ readonly lines: readonly string[]; readonly firstLine: number }> {
  let start = 0;
  for (let firstLine = 0; start <= text.length; firstLine += SEARCHED_LINES) {
    const lines: string[] = [];
    let next = start;
    let at = start;
    while (lines.length < SEARCHED_LINES + ROWS_TO_NUMBERS && at <= text.length) {
      const end = text.indexOf("\n", at);
      lines.push(text.slice(at, end < 0 ? text.length : end));
      at = end < 0 ? text.length + 1 : end + 1;
      if (lines.length === SEARCHED_LINES) next = at;
    }
    yield { lines, firstLine };
    start = lines.length < SEARCHED_LINES ? text.length + 1 : next;
  }
}

/** The best header among all lines; the search ends with the first stretch of lines that has one above numbers. */
function bestByNames(text: string): Candidate | null {
  let best: Candidate | null = null;
  for (const { lines, firstLine } of stretchesOf(text)) {
    for (const delimiter of DELIMITERS) {
      const found = bestRow(lines, firstLine, delimiter);
      if (found.score > (best?.score ?? 0)) best = found;
    }
    if (best !== null && best.score > HAS_NUMBERS) return best;
  }
  return best;
}

/** Some files put a comment sign before the header itself, as the last line of the comments at the top. */
function withHeaderUncommented(text: string): string {
  let start = 0;
  let comment: { readonly start: number; readonly end: number } | null = null;
  while (start <= text.length) {
    const end = text.indexOf("\n", start) < 0 ? text.length : text.indexOf("\n", start);
    const line = text.slice(start, end);
    if (isCommentLine(line)) comment = { start, end };
    else if (line.trim() !== "") break;
    start = end + 1;
  }
  if (comment === null) return text;
  const { start: from, end: to } = comment;
  return text.slice(0, from) + withoutCommentSign(text.slice(from, to)) + text.slice(to);
}

/** A pure number as a unit: practical salinity has it in the CF conventions. */
const PURE_NUMBER = /^(1|1e-0?3|0\.001)$/i;

/** One text a column when the row below the header is a row of units, else null. */
function unitsIn(header: readonly string[], below: Row | undefined): readonly string[] | null {
  if (below === undefined || below.cells.some((cell) => looksNumeric(cell) && !PURE_NUMBER.test(cell))) return null;
  const texts = header.map((_, i) => (below.cells[i] ?? "").replace(/^[([{]|[)\]}]$/g, "").trim());
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

const isSameRow = (a: readonly string[], b: readonly string[]): boolean =>
  a.length === b.length && a.every((cell, i) => cell === b[i]);

/** Rows of numbers and nothing above them: the columns are called by their place, #1 and on. */
function withoutHeader(text: string): Table | null {
  for (const delimiter of DELIMITERS) {
    const rows = new TextRows(text, delimiter);
    const width = rows.length === 0 ? 0 : rows.cellsAt(0).length;
    const isOdd = (row: number): boolean => {
      const cells = rows.cellsAt(row);
      return cells.length !== width || cells.filter(looksNumeric).length < 2;
    };
    if (rows.length < 2 || chosenRows(rows, isOdd).length > 0) continue;
    const cells = rows.cellsAt(0).map((_, i) => `#${i + 1}`);
    return {
      delimiter,
      header: { lineIndex: 0, cells },
      unitTexts: cells.map(() => ""),
      rows,
      preface: [],
      hasOpenQuote: rows.hasOpenQuote,
    };
  }
  return null;
}

function candidateIn(text: string): Candidate | null {
  const byNames = bestByNames(text);
  if (byNames !== null) return byNames;
  const [head] = stretchesOf(text);
  return DELIMITERS.map((delimiter) => headerByShape(head!.lines, delimiter)).find((found) => found !== null) ?? null;
}

/**
 * The table in a text, or null when there is none. A header repeated further down, as in joined files, is taken out.
 * @param onShare told now and then which share of the text has been gone through
 */
export function findTable(text: string, onShare?: OnShare): Table | null {
  const named = bestByNames(text);
  const read = named === null ? withHeaderUncommented(text) : text;
  const candidate = named ?? candidateIn(read);
  if (candidate === null) return withoutHeader(read);
  const all = new TextRows(read, candidate.delimiter, onShare);
  let at = 0;
  while (at < all.length && all.lineIndexAt(at) < candidate.headerLineIndex) at += 1;
  // A stretch of lines can begin within a quotation, and what looks like a header there is none.
  if (at === all.length) return null;
  // A second line of names stands just above or below, and the units below that.
  const near = rowsBetween(all, 0, at + ROWS_TO_NUMBERS);
  const names = namesAt(near, at, candidate.delimiter);
  const units = unitsIn(names.cells, near[names.lastAt + 1]);
  const header = { lineIndex: near[names.lastAt]!.lineIndex, cells: names.cells };
  const bodyAt = names.lastAt + (units === null ? 1 : 2);
  const first = near[at]!.cells;
  return {
    delimiter: candidate.delimiter,
    header,
    unitTexts: header.cells.map((_, i) => units?.[i] ?? ""),
    rows: chosenRows(
      all,
      (row) => row >= bodyAt && !(all.cellAt(row, 0) === first[0] && isSameRow(all.cellsAt(row), first)),
    ),
    preface: near.slice(0, names.firstAt),
    hasOpenQuote: all.hasOpenQuote,
  };
}
