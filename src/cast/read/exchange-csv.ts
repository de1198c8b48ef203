/**
 * The exchange CSV of the world hydrographic programme (WHP-Exchange): a stamp on the first line, comments, for a CTD
 * file a block of KEY = value lines, then names, units, rows, END_DATA. What a key says holds for every row, so that it
 * becomes a column of its own.
 */
import type { ColumnRole } from "../reading.ts";
import { isCommentLine, parseTable, type Row } from "./parse-table.ts";
import { readHeaderCell } from "./read-header-cell.ts";
import { listedRows } from "./rows.ts";
import type { Table } from "./table.ts";

const STAMP = /^(CTD|BOTTLE),/;
const KEY_COUNT = /^NUMBER_HEADERS\s*=\s*(\d+)/;
const KEY_LINE = /^([A-Z0-9_ ]+?)\s*=\s*(.*?)\s*$/;
const END = "END_DATA";

/** The format has names of its own for what is a word of many meanings elsewhere. */
const OWN_ROLES: ReadonlyMap<string, ColumnRole> = new Map([["DEPTH", "waterDepth"]]);

/** The standard fixes the units of its keys. */
const KEY_UNITS: ReadonlyMap<string, string> = new Map([
  ["DEPTH", "m"],
  ["LATITUDE", "degrees_north"],
  ["LONGITUDE", "degrees_east"],
]);

const COMMA = { character: ",", name: "comma" } as const;

/** Keys that are of use to us, with their values. */
function keysIn(lines: readonly string[], firstAt: number, count: number): readonly (readonly [string, string])[] {
  return lines.slice(firstAt, firstAt + count).flatMap((line) => {
    const match = KEY_LINE.exec(line);
    const [key, value] = [match?.[1] ?? "", match?.[2] ?? ""];
    const isUseful = OWN_ROLES.has(key) || readHeaderCell(key) !== null;
    return isUseful && value !== "" ? [[key, value] as const] : [];
  });
}

/** The table of an exchange file; null when the text is none, or has no table in it. */
export function exchangeTable(text: string): Table | null {
  if (!STAMP.test(text)) return null;
  const lines = text.split("\n");
  const countAt = lines.findIndex((line) => KEY_COUNT.test(line));
  const isKeyed = countAt >= 0 && lines.slice(1, countAt).every((line) => line === "" || isCommentLine(line));
  // The count is a key itself, and counts itself.
  const keyCount = isKeyed ? Number(KEY_COUNT.exec(lines[countAt]!)![1]) : 0;
  const keys = isKeyed ? keysIn(lines, countAt, keyCount) : [];
  const firstAt = isKeyed ? countAt + keyCount : 1;
  const end = lines.findIndex((line, i) => i >= firstAt && line.trim() === END);
  const kept = lines.map((line, i) => (i < firstAt || (end >= 0 && i >= end) ? "" : line));
  const { rows, hasOpenQuote } = parseTable(kept, COMMA);
  const [names, units] = rows;
  if (!names || !units || names.cells.length < 2) return null;
  const added = keys.filter(([key]) => !names.cells.includes(key));
  const values = added.map(([, value]) => value);
  const width = names.cells.length;
  const widened = (row: Row): Row => ({
    lineIndex: row.lineIndex,
    cells: [
      ...names.cells.map((_, i) => row.cells[i] ?? ""),
      ...values,
      ...row.cells.slice(width).filter((cell) => cell !== ""),
    ],
  });
  return {
    delimiter: COMMA,
    header: { lineIndex: names.lineIndex, cells: [...names.cells, ...added.map(([key]) => key)] },
    unitTexts: [...names.cells.map((_, i) => units.cells[i] ?? ""), ...added.map(([key]) => KEY_UNITS.get(key) ?? "")],
    rows: listedRows(rows.slice(2).map(widened)),
    preface: [],
    hasOpenQuote,
    ownRoles: OWN_ROLES,
  };
}
