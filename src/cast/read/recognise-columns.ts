/** Which column is what, in which unit, and why: at most one column for each role. */
import type { Issue } from "../../base/index.ts";
import type { UnitSymbol } from "../../units/index.ts";
import type { ColumnReading, ColumnRole } from "../reading.ts";
import { COLUMN_NAMES } from "./column-names.ts";
import { type Contender, contenderOf } from "./contender.ts";
import { type Decision, decide, passOver, whyUnused } from "./decide-column.ts";
import { decimalMarkOf } from "./decimal-mark.ts";
import type { DecimalMark } from "./parse-number.ts";
import { isMeasured } from "./roles.ts";
import type { Table } from "./table.ts";

interface UsedColumn {
  readonly columnIndex: number;
  /** null for text and times. */
  readonly unit: UnitSymbol | null;
}

export interface RecognisedColumns {
  readonly used: Readonly<Partial<Record<ColumnRole, UsedColumn>>>;
  readonly readings: readonly ColumnReading[];
  readonly decimalMark: DecimalMark;
  readonly issues: readonly Issue[];
}

const ASSUMED_COMMA: Issue = {
  severity: "warning",
  code: "assumed-decimal-comma",
  message: "every comma stands before three digits; it is read as the decimal mark; if it parts thousands, take it out",
};

/** Better first: one with values, the better name, a stated unit, the place in the file. */
const byMerit = (a: Contender, b: Contender): number =>
  Number(b.filled.length > 0) - Number(a.filled.length > 0) ||
  a.rankIndex - b.rankIndex ||
  Number(b.written !== null) - Number(a.written !== null) ||
  a.columnIndex - b.columnIndex;

function winnersOf(contenders: readonly Contender[]): ReadonlyMap<ColumnRole, Contender> {
  const winners = new Map<ColumnRole, Contender>();
  for (const role of Object.keys(COLUMN_NAMES) as ColumnRole[]) {
    const best = contenders.filter((contender) => contender.role === role).sort(byMerit)[0];
    if (best) winners.set(role, best);
  }
  return winners;
}

/** Reads every header of a table. A unit that must be asked for leaves its column unused, with an issue. */
export function recogniseColumns(table: Table): RecognisedColumns {
  const all = table.header.cells.map((_, columnIndex) => contenderOf(table, columnIndex));
  const contenders = all.filter((contender) => contender !== null);
  const measured = contenders.filter((contender) => isMeasured(contender.role));
  const cells = measured.flatMap((contender) => contender.filled);
  const { mark: decimalMark, assumed } = decimalMarkOf(cells, table.delimiter.character);
  const winners = winnersOf(contenders);
  const decisions = all.map((contender, columnIndex): Decision => {
    if (contender === null) return whyUnused(columnIndex, table.header.cells[columnIndex]!);
    const winner = winners.get(contender.role)!;
    return winner === contender ? decide(contender, decimalMark) : passOver(contender, winner);
  });
  const used: Partial<Record<ColumnRole, UsedColumn>> = {};
  for (const { reading } of decisions) {
    if (reading.role !== null)
      used[reading.role] = { columnIndex: reading.columnIndex, unit: reading.unit as UnitSymbol };
  }
  return {
    used,
    readings: decisions.map((decision) => decision.reading),
    decimalMark,
    issues: [...(assumed ? [ASSUMED_COMMA] : []), ...decisions.flatMap((decision) => decision.issues)],
  };
}
