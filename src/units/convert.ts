/** Conversion between two units of one kind. */
import { ToolError } from "../base/index.ts";
import { UNITS, type Unit, type UnitSymbol } from "./unit-table.ts";

const BY_SYMBOL: ReadonlyMap<string, Unit> = new Map(UNITS.map((unit) => [unit.symbol, unit]));

/** The table entry of a symbol. */
export const unitOf = (symbol: UnitSymbol): Unit => BY_SYMBOL.get(symbol)!;

interface Line {
  readonly from: Unit;
  readonly to: Unit;
  readonly ratio: number;
}

function lineBetween(fromSymbol: UnitSymbol, toSymbol: UnitSymbol): Line {
  const from = unitOf(fromSymbol);
  const to = unitOf(toSymbol);
  if (from.kind !== to.kind) {
    throw new ToolError("DomainError", `${from.symbol} is a unit of ${from.kind}, ${to.symbol} one of ${to.kind}`);
  }
  return { from, to, ratio: from.factor / to.factor };
}

// Dividing by the inverse keeps decimal multiples exact: 518 uS/cm is 0.518 mS/cm, not 0.5180000000000001.
const along = (line: Line, value: number): number =>
  line.from === line.to
    ? value
    : (line.ratio >= 1
        ? (value - line.from.offset) * line.ratio
        : (value - line.from.offset) / (line.to.factor / line.from.factor)) + line.to.offset;

/**
 * A value in another unit of the same kind; NaN in, NaN out. Throws a DomainError when the kinds differ.
 * @example convert(100, "ft", "m") // 30.48
 */
export function convert(value: number, from: UnitSymbol, to: UnitSymbol): number {
  return along(lineBetween(from, to), value);
}

/** As `convert`, for each value of an array, into a new array. */
export function convertArray(values: ArrayLike<number>, from: UnitSymbol, to: UnitSymbol): Float64Array {
  const line = lineBetween(from, to);
  return Float64Array.from(values, (value) => along(line, value));
}
