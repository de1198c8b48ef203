/** Finds the delimiter, the header row and a row of units below it: whichever delimiter makes most sense of a header. */
import { unitByName } from "../../units/index.ts";
import type { ColumnRole } from "../reading.ts";
import { ROLE_KIND } from "./column-names.ts";
import { DELIMITERS, type Delimiter, isCommentLine, parseTable, type Row } from "./parse-table.ts";
import { readHeaderCell } from "./read-header-cell.ts";

export interface FoundTable {
  readonly delimiter: Delimiter;
  readonly header: Row;
  /** One text a column; empty texts where there is no units row. */
  readonly unitTexts: readonly string[];
  readonly rows: readonly Row[];
}

const SEARCHED_ROWS = 200;

interface Candidate {
  readonly delimiter: Delimiter;
  readonly rows: readonly Row[];
  readonly headerIndex: number;
  readonly roleCount: number;
}

const looksNumeric = (cell: string): boolean => /^[-+−]?[\d.,]+(e[-+]?\d+)?$/i.test(cell);

function rolesIn(row: Row): ReadonlySet<ColumnRole> {
  return new Set(row.cells.flatMap((cell) => readHeaderCell(cell)?.role ?? []));
}

function bestHeader(lines: readonly string[], delimiter: Delimiter): Candidate {
  const rows = parseTable(lines, delimiter);
  let headerIndex = -1;
  let roleCount = 0;
  for (let i = 0; i < Math.min(rows.length, SEARCHED_ROWS); i++) {
    const row = rows[i]!;
    const count = row.cells.length < 2 ? 0 : rolesIn(row).size;
    if (count > roleCount) {
      headerIndex = i;
      roleCount = count;
    }
  }
  return { delimiter, rows, headerIndex, roleCount };
}

/** A table without one known name still has a header if texts stand above a body of numbers. */
function unknownHeader(candidate: Candidate): Candidate {
  const { rows } = candidate;
  const headerIndex = rows.findIndex((row, i) => {
    const next = rows[i + 1];
    return (
      row.cells.length >= 2 &&
      next?.cells.length === row.cells.length &&
      !row.cells.some(looksNumeric) &&
      next.cells.filter(looksNumeric).length >= 2
    );
  });
  return { ...candidate, headerIndex };
}

/** Some files put a comment sign before the header itself: the last line of the leading comment block. */
function withHeaderUncommented(lines: readonly string[]): readonly string[] | null {
  const first = lines.findIndex((line) => line.trim() !== "" && !isCommentLine(line));
  const last = (first < 0 ? lines : lines.slice(0, first)).findLastIndex((line) => isCommentLine(line));
  if (last < 0) return null;
  return lines.map((line, i) => (i === last ? line.replace(/^\s*"?(#|%|\/\/|\*|!)+\s*/, "") : line));
}

function bestOf(candidates: readonly Candidate[]): Candidate | undefined {
  return candidates
    .filter((candidate) => candidate.headerIndex >= 0)
    .reduce<Candidate | undefined>(
      (best, c) => (best === undefined || c.roleCount > best.roleCount ? c : best),
      undefined,
    );
}

function unitsBelow(header: Row, next: Row | undefined): readonly string[] {
  const none = header.cells.map(() => "");
  if (next === undefined || next.cells.some(looksNumeric)) return none;
  const unwrapped = next.cells.map((cell) => cell.replace(/^[([{]\s*|\s*[)\]}]$/g, ""));
  const isUnits = header.cells.some((cell, i) => {
    const role = readHeaderCell(cell)?.role;
    const kind = role === undefined ? undefined : ROLE_KIND[role];
    return kind !== undefined && unitByName(unwrapped[i] ?? "", kind) !== null;
  });
  return isUnits ? header.cells.map((_, i) => unwrapped[i] ?? "") : none;
}

/** The table in a text, or null when there is none. */
export function findTable(text: string): FoundTable | null {
  const lines = text.split("\n");
  const candidatesIn = (some: readonly string[]) => DELIMITERS.map((delimiter) => bestHeader(some, delimiter));
  const plain = candidatesIn(lines);
  const uncommented = bestOf(plain) === undefined ? withHeaderUncommented(lines) : null;
  const candidate =
    bestOf(plain) ?? (uncommented && bestOf(candidatesIn(uncommented))) ?? bestOf(plain.map(unknownHeader));
  if (candidate === undefined) return null;
  const header = candidate.rows[candidate.headerIndex]!;
  const below = candidate.rows.slice(candidate.headerIndex + 1);
  const unitTexts = unitsBelow(header, below[0]);
  const hasUnitsRow = unitTexts.some((unitText) => unitText !== "");
  return { delimiter: candidate.delimiter, header, unitTexts, rows: hasUnitsRow ? below.slice(1) : below };
}
