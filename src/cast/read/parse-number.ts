/** One cell to one number. */
import type { ColumnRole } from "../reading.ts";

const MISSING = /^(|na|n\/a|nan|null|none|-{1,3}|–|—|\.)$/i;
/** -99, -999, -9999.0, -99.99: no water is measured there, so agencies write it for "not measured". */
const SENTINEL = /^-9{2,5}([.,]([09]+))?$/;
const NUMBER = { ".": /^[-+]?(\d+\.?\d*|\.\d+)(e[-+]?\d+)?$/i, ",": /^[-+]?(\d+,?\d*|,\d+)(e[-+]?\d+)?$/i } as const;

export type DecimalMark = "." | ",";

export const isMissing = (text: string): boolean => MISSING.test(text);

/** A longitude of -99 is one. */
export const isSentinel = (role: ColumnRole, text: string): boolean =>
  role !== "latitude" && role !== "longitude" && SENTINEL.test(text.replace("−", "-"));

/** The number; NaN where the cell says that there is none; null where the cell is some other text. */
export function parseNumber(text: string, decimalMark: DecimalMark): number | null {
  if (isMissing(text)) return Number.NaN;
  const plain = text.replace("−", "-");
  if (!NUMBER[decimalMark].test(plain)) return null;
  return Number(plain.replace(",", "."));
}
