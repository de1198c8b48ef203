export { convert, convertArray, unitOf } from "./convert.ts";
export {
  type DisplaySystem,
  type DisplayUnit,
  displayUnit,
  formatQuantity,
  type ShownQuantity,
} from "./display-system.ts";
export { formatNumber, type NumberFormat } from "./format-number.ts";
export type { QuantityKind } from "./unit.ts";
export { unitByName } from "./unit-by-name.ts";
export { UNITS, type Unit, type UnitSymbol } from "./unit-table.ts";
