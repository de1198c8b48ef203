/** Conversion between two units of one kind. */
import { ToolError } from "../base/index.ts";
import { UNITS, type Unit, type UnitSymbol } from "./unit-table.ts";

const BY_SYMBOL: ReadonlyMap<string, Unit> = new Map(UNITS.map((unit) => [unit.symbol, unit]));

/** The table entry of a symbol. */
export const unitOf = (symbol: UnitSymbol): Unit => BY_SYMBOL.get(symbol)!;

function bothUnits(fromSymbol: UnitSymbol, toSymbol: UnitSymbol): readonly [from: Unit, to: Unit] {
  const [from, to] = [unitOf(fromSymbol), unitOf(toSymbol)];
  if (from.kind === to.kind) return [from, to];
  throw new ToolError("DomainError", `${from.symbol} is a unit of ${from.kind}, ${to.symbol} one of ${to.kind}`);
}

// Multiplied first and divided after, decimal multiples come out as they are written: 518 uS/cm is 0.518 mS/cm.
const moved = (value: number, from: Unit, to: Unit): number =>
  from === to ? value : ((value - from.offset) * from.factor) / to.factor + to.offset;

/**
 * A value in another unit of the same kind; NaN in, NaN out. Throws a DomainError when the kinds differ.
 * @example convert(100, "ft", "m") // 30.48
 */
export function convert(value: number, from: UnitSymbol, to: UnitSymbol): number {
  return moved(value, ...bothUnits(from, to));
}

/** As `convert`, for each value of an array, into a new array. */
export function convertArray(values: ArrayLike<number>, from: UnitSymbol, to: UnitSymbol): Float64Array {
  const units = bothUnits(from, to);
  return Float64Array.from(values, (value) => moved(value, ...units));
}
