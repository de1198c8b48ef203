import { FIRST, file, LAST, SC, type Understood, waiting } from "./expected.ts";

/** Delimiters, marks, encodings, headers and what stands around a table. */
export const DELIMITED_TEXT: readonly Understood[] = [
  file("comma.csv", "comma"),
  file("semicolon-decimal-comma.csv", "semicolons, decimal commas, names in German"),
  file("tab.txt", "tab"),
  file("pipe.txt", "vertical bar"),
  file("blanks.txt", "runs of blanks, lined up by eye"),
  file("runs-of-blanks.txt", "runs of blanks between names with blanks in them"),
  file("exponents-minus.csv", "exponents, plus signs, true minus signs", [0.5, -1.25, 31], [1, -1.5, 31.5]),
  file(
    "thousands-comma.csv",
    "commas part thousands",
    { depthM: 0.5, specificConductanceMsCm: 0.9805 },
    { depthM: 5, specificConductanceMsCm: 19.87525 },
    { reads: SC, samples: 5 },
  ),
  file(
    "thousands-point.csv",
    "points part thousands, commas are decimal",
    { depthM: 0.5, specificConductanceMsCm: 0.9805 },
    { depthM: 5, specificConductanceMsCm: 19.87525 },
    { reads: SC, samples: 5 },
  ),
  file(
    "thousands-blank.csv",
    "blanks part thousands",
    { depthM: 0.5, specificConductanceMsCm: 0.9805 },
    { depthM: 5, specificConductanceMsCm: 19.87525 },
    { reads: SC, samples: 5 },
  ),
  file(
    "thousands-by-water.csv",
    "1,234 uS/cm can only be thousands: no water is so pure",
    { specificConductanceMsCm: 1.234 },
    { specificConductanceMsCm: 1.31 },
    { reads: SC, samples: 3, says: ["assumed-thousands"] },
  ),
  waiting(
    "decimal-or-thousands.csv",
    "depth 1,250 could be either",
    "temperature degC, practicalSalinity 1",
    "decimal-or-thousands",
  ),

  file("utf8-mark.csv", "UTF-8 with byte-order mark"),
  file("utf16le-mark.csv", "UTF-16, little end first, with mark"),
  file("utf16be-no-mark.csv", "UTF-16, big end first, without mark"),
  file("latin1.csv", "Latin-1 degree sign"),
  file("cr.csv", "lines end in CR"),
  file("mixed-line-ends.csv", "CR, LF and CRLF in one file"),

  file("comments.csv", "comment lines of three signs, also among the rows"),
  file("long-preamble.txt", "1100 lines of text above the table", FIRST, LAST, { says: ["preface"] }),
  file("preamble-table.csv", "a small table of its own above the table", FIRST, LAST, { says: ["preface"] }),
  file("preamble-names.txt", "text above that holds the same names", FIRST, LAST, { says: ["preface"] }),
  file(
    "two-line-names.csv",
    "names on two lines: Specific over cond",
    { depthM: 0.5, specificConductanceMsCm: 0.98 },
    { depthM: 5, specificConductanceMsCm: 19.875 },
    { reads: SC, samples: 5 },
  ),
  file("names-over-units.csv", "units on a line of their own, in brackets", [3.048, 10, 2], [6.096, 5, 24], {
    reads: "depth ft, temperature degF, practicalSalinity 1",
  }),
  file("two-lines-and-units.csv", "names on two lines and units on a third"),
  file("header-in-comment.csv", "the header stands behind a comment sign"),
  {
    ...waiting("no-header.csv", "no header at all", "", "no-depth-column", "no-temperature-column"),
    says: ["no-header", "no-depth-column", "no-temperature-column"],
  },
  file("trailing-delimiter.csv", "every line ends in a delimiter"),
  file("trailing-delimiter-rows-only.csv", "every row ends in a delimiter, the header does not"),
  file("short-rows.csv", "rows shorter than the header", FIRST, LAST, { says: ["rows-too-short"] }),
  file("wide-row.csv", "a row longer than the header", FIRST, LAST, { says: ["rows-too-wide"] }),
  file("blanks-with-a-hole.txt", "blanks as delimiter and a cell that is not there", FIRST, [3, 12.75, 21.35], {
    samples: 3,
    says: ["rows-too-short"],
  }),
  file("header-repeated.csv", "files joined, header and all"),
  file("cell-over-lines.csv", "a quoted cell over two lines", FIRST, [1, 18.1, 2.4]),
  file("open-quote.csv", "a quotation that never closes", FIRST, [2, 16.4, 9.8], { samples: 3, says: ["open-quote"] }),
  file("footer.csv", "means and words below the table", FIRST, LAST, {
    says: ["rows-too-short", "not-a-number", "no-depth"],
  }),
];
