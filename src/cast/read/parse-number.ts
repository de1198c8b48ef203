/** One cell to one number, in the style that its column is written in. */

export type DecimalMark = "." | ",";

/** How the numbers of a column are written. */
export interface NumberStyle {
  readonly decimalMark: DecimalMark;
  /** The mark that parts thousands; blanks and apostrophes always may. */
  readonly groupMark: "." | "," | null;
}

const MISSING = /^(|n\.?[ad]\.?|#?n\/a|nan|null|none|missing|-{1,3}|–|—|\.|\*+|\?)$/i;
const NUMBER = {
  ".": /^[-+]?(\d+(\.\d*)?|\.\d+)(e[-+]?\d+)?$/i,
  ",": /^[-+]?(\d+(,\d*)?|,\d+)(e[-+]?\d+)?$/i,
} as const;
const GROUPED = {
  ".": /^[-+]?\d{1,3}(\.\d{3})+(,\d*)?$/,
  ",": /^[-+]?\d{1,3}(,\d{3})+(\.\d*)?$/,
} as const;
/** Blanks of every width, and apostrophes, between groups of three. */
const SPACED = /^[-+]?\d{1,3}([ \u00a0\u2009\u202f'’]\d{3})+([.,]\d*)?$/;

const ZERO = 48;
const NINE = 57;

/** Whether a cell says that nothing was measured. */
export function isMissing(text: string): boolean {
  const first = text.charCodeAt(0);
  return first >= ZERO && first <= NINE ? false : MISSING.test(text);
}

/** The number; NaN where the cell says that there is none; null where the cell is some other text. */
export function parseNumber(text: string, style: NumberStyle): number | null {
  const { decimalMark, groupMark } = style;
  if (NUMBER[decimalMark].test(text)) return Number(decimalMark === "." ? text : text.replace(",", "."));
  if (isMissing(text)) return Number.NaN;
  if (text.includes("−")) return parseNumber(text.replace("−", "-"), style);
  if (groupMark !== null && GROUPED[groupMark].test(text)) {
    return Number(text.replaceAll(groupMark, "").replace(",", "."));
  }
  return SPACED.test(text) ? parseNumber(text.replace(/[ \u00a0\u2009\u202f'’]/g, ""), style) : null;
}
