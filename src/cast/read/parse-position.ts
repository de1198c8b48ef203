/** Latitude and longitude as people write them, to signed decimal degrees: north and east are positive. */
import { type NumberStyle, parseNumber } from "./parse-number.ts";

/** Degrees, minutes and seconds as groups of figures, with a letter of the hemisphere before or behind them. */
const PARTS =
  /^([NSEW])?\s*([-+−]?)(\d{1,3}(?:[.,]\d+)?)(?:[\s°º:d-]+(\d{1,2}(?:[.,]\d+)?)(?:[\s'’′:m-]+(\d{1,2}(?:[.,]\d+)?))?)?[\s°º'’′"”″]*([NSEW])?$/i;

const figure = (text: string | undefined): number => Number((text ?? "0").replace(",", "."));

/**
 * "38 02.5 N", "N 38° 2' 30\"", "121-52.3W", "38.0417" -> degrees. NaN where the cell says that there is none; null where
 * it is some other text or its minutes are 60 or more.
 */
export function parsePosition(text: string, style: NumberStyle): number | null {
  const plain = parseNumber(text, style);
  if (plain !== null) return plain;
  const match = PARTS.exec(text);
  if (match === null) return null;
  const [, before, sign, degrees, minutes, seconds, behind] = match;
  const minuteCount = figure(minutes);
  const secondCount = figure(seconds);
  if (minuteCount >= 60 || secondCount >= 60) return null;
  const value = figure(degrees) + minuteCount / 60 + secondCount / 3600;
  const letter = (before ?? behind ?? "").toUpperCase();
  const isNegative = sign === "-" || sign === "−" || letter === "S" || letter === "W";
  return isNegative ? -value : value;
}
