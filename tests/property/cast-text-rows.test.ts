import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DELIMITERS, parseTable } from "../../src/cast/read/parse-table.ts";
import { TextRows } from "../../src/cast/read/text-rows.ts";

const listed = (rows: TextRows) =>
  Array.from({ length: rows.length }, (_, i) => ({ lineIndex: rows.lineIndexAt(i), cells: rows.cellsAt(i) }));

/** Text that is rich in what makes rows hard: delimiters, quotes, comments, blanks and line ends. */
const anyText = fc
  .array(
    fc.constantFrom("a", "1.5", "", " ", ",", ";", "\t", "|", '"', '""', "\n", "\n", "# c", "x y", '"p,q"', '"l\nm"'),
    { maxLength: 60 },
  )
  .map((parts) => parts.join(""));

describe("rows kept as places in the text", () => {
  it("are those that Papa Parse finds in the whole text, line by line", () => {
    fc.assert(
      fc.property(anyText, fc.constantFrom(...DELIMITERS), (text, delimiter) => {
        const whole = parseTable(text.split("\n"), delimiter);
        const rows = new TextRows(text, delimiter);
        expect(listed(rows)).toEqual(whole.rows);
        expect(rows.hasOpenQuote).toBe(whole.hasOpenQuote);
      }),
      { seed: 17, numRuns: 3000 },
    );
  });

  it("give single cells as they give whole rows", () => {
    fc.assert(
      fc.property(anyText, fc.constantFrom(...DELIMITERS), (text, delimiter) => {
        const rows = new TextRows(text, delimiter);
        for (let row = 0; row < rows.length; row++) {
          const cells = rows.cellsAt(row);
          for (let column = 0; column <= cells.length; column++) expect(rows.cellAt(row, column)).toBe(cells[column]);
        }
      }),
      { seed: 18, numRuns: 1000 },
    );
  });
});
