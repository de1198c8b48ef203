export { convert, convertArray, unitOf } from "./convert.ts";
export type { QuantityKind } from "./unit.ts";
export { unitByName } from "./unit-by-name.ts";
export type { Unit, UnitSymbol } from "./unit-table.ts";
