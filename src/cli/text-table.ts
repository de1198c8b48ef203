/** Columns of a table for a terminal: a head in one or two lines, cells right-aligned but for the last. */
export function textTable(heads: readonly (readonly [string, string])[], rows: readonly (readonly string[])[]): string {
  const last = heads.length - 1;
  const widths = heads.map(([title, unit], c) =>
    Math.max(title.length, unit.length, ...rows.map((row) => row[c]!.length)),
  );
  const line = (cells: readonly string[]): string =>
    `  ${cells.map((cell, c) => (c === last ? cell : cell.padStart(widths[c]!))).join("  ")}`.trimEnd();
  const hasUnits = heads.some(([, unit]) => unit !== "");
  const head = [line(heads.map(([title]) => title)), ...(hasUnits ? [line(heads.map(([, unit]) => unit))] : [])];
  return [...head, ...rows.map(line)].join("\n");
}
