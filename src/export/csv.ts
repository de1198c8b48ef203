/** A cell of a table: text, a number at full double precision, or nothing. */
export type Cell = string | number | null;

/** What a spreadsheet would run as a formula if a cell began with it and were no plain number. */
const FORMULA_START = /^[=+\-@\t\r]/;

function cellText(cell: Cell): string {
  if (cell === null || (typeof cell === "number" && !Number.isFinite(cell))) return "";
  if (typeof cell === "number") return String(cell);
  const isFormula = FORMULA_START.test(cell) && !Number.isFinite(Number(cell));
  const harmless = isFormula ? `'${cell}` : cell;
  return /[",\r\n]/.test(harmless) ? `"${harmless.replaceAll('"', '""')}"` : harmless;
}

/**
 * Comma-separated text (RFC 4180 quoting, period as decimal mark, line feed ends). Missing values are empty; text that
 * a spreadsheet would take for a formula gets an apostrophe in front.
 */
export const csvText = (columns: readonly { readonly name: string }[], rows: Iterable<readonly Cell[]>): string => {
  const lines = [columns.map(({ name }) => cellText(name)).join(",")];
  for (const row of rows) lines.push(row.map(cellText).join(","));
  return `${lines.join("\n")}\n`;
};
