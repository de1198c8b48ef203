/** Whether a table writes its decimals with a point or a comma. */
import type { DecimalMark } from "./parse-number.ts";

export interface DecimalMarkChoice {
  readonly mark: DecimalMark;
  /** Every comma stands before three digits, where it could part thousands as well. */
  readonly assumed: boolean;
}

const WITH_COMMA = /^[-+−]?\d*,\d+$/;
const WITH_POINT = /^[-+−]?\d*\.\d+$/;
const COULD_BE_THOUSANDS = /^[-+−]?[1-9]\d{0,2},\d{3}$/;

/**
 * The decimal mark of a table, told from the cells that show one. Where commas also part the cells, a quoted "1,234" is
 * never taken for a decimal.
 */
export function decimalMarkOf(cells: Iterable<string>, delimiter: string): DecimalMarkChoice {
  let sureCommas = 0;
  let unsureCommas = 0;
  let points = 0;
  for (const cell of cells) {
    if (COULD_BE_THOUSANDS.test(cell)) unsureCommas += 1;
    else if (WITH_COMMA.test(cell)) sureCommas += 1;
    else if (WITH_POINT.test(cell)) points += 1;
  }
  if (sureCommas > points) return { mark: ",", assumed: false };
  const assumed = unsureCommas > 0 && sureCommas + points === 0 && delimiter !== ",";
  return { mark: assumed ? "," : ".", assumed };
}
