/** Rows of cells as texts, blank rows left out, however they are kept. */
import type { Row } from "./parse-table.ts";

export interface Rows {
  readonly length: number;
  /** 1-based line in the file. */
  lineIndexAt(row: number): number;
  /** Trimmed. */
  cellsAt(row: number): readonly string[];
  /** Trimmed; undefined beyond the end of the row. */
  cellAt(row: number, column: number): string | undefined;
}

/** Rows that are at hand as cells. */
export const listedRows = (rows: readonly Row[]): Rows => ({
  length: rows.length,
  lineIndexAt: (row) => rows[row]!.lineIndex,
  cellsAt: (row) => rows[row]!.cells,
  cellAt: (row, column) => rows[row]!.cells[column],
});

/** The rows for which `isChosen` holds, in their order; the very rows where it holds for all. */
export function chosenRows(rows: Rows, isChosen: (row: number) => boolean): Rows {
  const chosen = new Uint32Array(rows.length);
  let length = 0;
  for (let row = 0; row < rows.length; row++) if (isChosen(row)) chosen[length++] = row;
  if (length === rows.length) return rows;
  return {
    length,
    lineIndexAt: (row) => rows.lineIndexAt(chosen[row]!),
    cellsAt: (row) => rows.cellsAt(chosen[row]!),
    cellAt: (row, column) => rows.cellAt(chosen[row]!, column),
  };
}

export const rowAt = (rows: Rows, row: number): Row => ({ lineIndex: rows.lineIndexAt(row), cells: rows.cellsAt(row) });

export const rowsBetween = (rows: Rows, from: number, to: number): readonly Row[] =>
  Array.from({ length: Math.max(0, Math.min(to, rows.length) - from) }, (_, i) => rowAt(rows, from + i));

/** Every cell of a column; a cell that is not there is blank. */
export const columnTexts = (rows: Rows, column: number): readonly string[] =>
  Array.from({ length: rows.length }, (_, row) => rows.cellAt(row, column) ?? "");
