/** Numbers as people read them: fixed digits, a true minus sign, a dash where there is no number. */

export interface NumberFormat {
  /** Digits behind the decimal mark. */
  readonly digitsCount: number;
  /** Thin spaces between groups of three digits before the decimal mark; none by default. */
  readonly grouping?: "none" | "thin-space";
}

const TRUE_MINUS = "\u2212";
const THIN_SPACE = "\u2009";
const NO_VALUE = "\u2013";

/** ISO 80000-1 leaves four digits together and groups five or more. */
function grouped(digits: string): string {
  return digits.length < 5 ? digits : digits.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE);
}

/**
 * A number for the screen and for reports; never for files that programs read. NaN becomes an en dash. A value that
 * rounds to zero carries no sign.
 * @example formatNumber(-0.456, { digitsCount: 2 }) // "−0.46"
 */
export function formatNumber(value: number, format: NumberFormat): string {
  if (Number.isNaN(value)) return NO_VALUE;
  const sign = value < 0 ? TRUE_MINUS : "";
  if (!Number.isFinite(value)) return `${sign}∞`;
  const plain = Math.abs(value).toFixed(format.digitsCount);
  const [whole, decimals] = plain.split(".") as [string, string?];
  const before = format.grouping === "thin-space" ? grouped(whole) : whole;
  const text = decimals === undefined ? before : `${before}.${decimals}`;
  return /[1-9]/.test(plain) ? `${sign}${text}` : text;
}
