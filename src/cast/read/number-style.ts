/**
 * Whether numbers are written with a decimal point or a decimal comma, and whether the other mark parts thousands. Some
 * cells tell for sure ("12,5", "1.234,5"); "1,234" alone does not, and then the column, the table and at last what water
 * can be have to tell. Where none of them does, the user is asked.
 */
import { median } from "simple-statistics";
import { convert, type UnitSymbol } from "../../units/index.ts";
import type { DecimalMark, NumberStyle } from "./parse-number.ts";
import type { MeasuredRole } from "./roles.ts";

/** How many cells of a column, or of a table, point each way. */
export interface MarkEvidence {
  /** Cells whose decimal mark can only be a comma. */
  readonly commaCount: number;
  /** Cells whose decimal mark can only be a point. */
  readonly pointCount: number;
  /** Cells such as "1,234", as written. */
  readonly unsureCommas: readonly string[];
  /** Cells such as "1.234", as written. */
  readonly unsurePoints: readonly string[];
}

export interface StyleChoice {
  readonly style: NumberStyle;
  /** What told, where neither the column nor the table did: "possible" means that the other reading is no water. */
  readonly toldBy: "cells" | "possible" | "table" | "nothing";
}

const COULD_BE_GROUPS = { ",": /^[-+−]?[1-9]\d{0,2},\d{3}$/, ".": /^[-+−]?[1-9]\d{0,2}\.\d{3}$/ } as const;
const COMMA_IS_DECIMAL = /^[-+−]?(\d*,\d+(e[-+]?\d+)?|\d{1,3}(\.\d{3})+,\d*|\d{1,3}(\.\d{3}){2,})$/i;
const POINT_IS_DECIMAL = /^[-+−]?(\d*\.\d+(e[-+]?\d+)?|\d{1,3}(,\d{3})+\.\d*|\d{1,3}(,\d{3}){2,})$/i;

/** So many cells tell how a column is written; if they do not, the rest is looked at too. */
const TELLING_CELLS = 2000;

function evidenceIn(cells: readonly string[]): MarkEvidence {
  let commaCount = 0;
  let pointCount = 0;
  const unsureCommas: string[] = [];
  const unsurePoints: string[] = [];
  for (const cell of cells) {
    if (!cell.includes(".") && !cell.includes(",")) continue;
    if (COULD_BE_GROUPS[","].test(cell)) unsureCommas.push(cell);
    else if (COULD_BE_GROUPS["."].test(cell)) unsurePoints.push(cell);
    else if (POINT_IS_DECIMAL.test(cell)) pointCount += 1;
    else if (COMMA_IS_DECIMAL.test(cell)) commaCount += 1;
  }
  return { commaCount, pointCount, unsureCommas, unsurePoints };
}

export function markEvidence(cells: readonly string[]): MarkEvidence {
  const first = evidenceIn(cells.slice(0, TELLING_CELLS));
  const isTold = first.commaCount !== first.pointCount;
  return isTold || cells.length <= TELLING_CELLS ? first : evidenceIn(cells);
}

function sureMark({ commaCount, pointCount }: Pick<MarkEvidence, "commaCount" | "pointCount">): DecimalMark | null {
  if (commaCount === pointCount) return null;
  return commaCount > pointCount ? "," : ".";
}

/** The mark that the columns of a table agree on; null where no cell shows one for sure. */
export const tableMark = (columns: readonly MarkEvidence[]): DecimalMark | null =>
  sureMark({
    commaCount: columns.reduce((sum, column) => sum + column.commaCount, 0),
    pointCount: columns.reduce((sum, column) => sum + column.pointCount, 0),
  });

/** What a natural water shows, in the unit of the program; for telling 1.234 from 1234 only. */
const NATURAL: Readonly<Partial<Record<MeasuredRole, readonly [number, number]>>> = {
  temperature: [-3, 60],
  practicalSalinity: [0, 300],
  absoluteSalinity: [0, 300],
  conductivity: [0.005, 200],
  specificConductance: [0.005, 200],
  densityAnomaly: [-10, 250],
  latitude: [-90, 90],
  longitude: [-180, 360],
};

const OWN_UNIT: Readonly<Partial<Record<MeasuredRole, UnitSymbol>>> = {
  temperature: "degC",
  conductivity: "mS/cm",
  specificConductance: "mS/cm",
};

/** Whether the middle of the cells can be natural water in the unit of the column; without a unit, anything can. */
function isNatural(role: MeasuredRole, unit: UnitSymbol | null, values: readonly number[]): boolean {
  const range = NATURAL[role];
  const own = OWN_UNIT[role];
  if (range === undefined || (unit === null && own !== undefined && role !== "temperature")) return true;
  const middle = median([...values]);
  const value = unit !== null && own !== undefined ? convert(middle, unit, own) : middle;
  return value >= range[0] && value <= range[1];
}

const decimal = (decimalMark: DecimalMark): NumberStyle => ({ decimalMark, groupMark: null });
const grouped = (groupMark: DecimalMark): NumberStyle => ({ decimalMark: groupMark === "," ? "." : ",", groupMark });

/** A mark that stands in a column only before three digits: does it part thousands there? */
function judge(
  cells: readonly string[],
  mark: DecimalMark,
  isTold: boolean,
  column: { readonly role: MeasuredRole; readonly unit: UnitSymbol | null },
): StyleChoice {
  const asThousands = cells.map((cell) => Number(cell.replace("−", "-").replace(mark, "")));
  const canBeThousands = isNatural(column.role, column.unit, asThousands);
  const canBeDecimal = isNatural(
    column.role,
    column.unit,
    asThousands.map((value) => value / 1000),
  );
  if (canBeDecimal && !canBeThousands) return { style: decimal(mark), toldBy: "possible" };
  if (canBeThousands && !canBeDecimal) return { style: grouped(mark), toldBy: "possible" };
  return { style: grouped(mark), toldBy: isTold ? "table" : "nothing" };
}

/** How one column is written. */
export function chooseStyle(
  evidence: MarkEvidence,
  ofTable: DecimalMark | null,
  column: { readonly role: MeasuredRole; readonly unit: UnitSymbol | null },
): StyleChoice {
  const { unsureCommas, unsurePoints } = evidence;
  const own = sureMark(evidence);
  if (own !== null) {
    const other = own === "," ? "." : ",";
    return { style: { decimalMark: own, groupMark: other }, toldBy: "cells" };
  }
  if (unsureCommas.length > 0 && ofTable !== ",") return judge(unsureCommas, ",", ofTable === ".", column);
  if (unsurePoints.length > 0 && ofTable === ",") return judge(unsurePoints, ".", true, column);
  return { style: decimal(ofTable ?? "."), toldBy: "cells" };
}
