/** Which column is what, in which unit, and why: at most one column for each role. */
import type { Issue } from "../../base/index.ts";
import { type UnitSymbol, unitByName } from "../../units/index.ts";
import type { ColumnReading, ColumnRole } from "../reading.ts";
import { chooseUnit } from "./choose-unit.ts";
import { COLUMN_NAMES, ROLE_KIND, ROLE_WORDS } from "./column-names.ts";
import type { FoundTable } from "./find-header.ts";
import { type DecimalMark, decimalMarkOf, isMissing, isSentinel, parseNumber } from "./parse-number.ts";
import { dateOrderOf, datePart, parseDateTime } from "./parse-time.ts";
import { readHeaderCell } from "./read-header-cell.ts";

export interface UsedColumn {
  readonly columnIndex: number;
  readonly header: string;
  /** null for text and times. */
  readonly unit: UnitSymbol | null;
}

export interface RecognisedColumns {
  readonly used: Readonly<Partial<Record<ColumnRole, UsedColumn>>>;
  readonly readings: readonly ColumnReading[];
  readonly decimalMark: DecimalMark;
  readonly issues: readonly Issue[];
}

/** A column that could have a role, before it is compared with others of the same role. */
interface Contender {
  readonly columnIndex: number;
  readonly header: string;
  readonly role: ColumnRole;
  readonly rankIndex: number;
  readonly unit: UnitSymbol | null;
  readonly unitSource: string;
  readonly filledCount: number;
}

const cellsOf = (table: FoundTable, columnIndex: number): readonly string[] =>
  table.rows.map((row) => row.cells[columnIndex] ?? "");

/** A column named for a date may hold times too, and the other way about: its cells decide. */
function roleByContent(role: ColumnRole, cells: readonly string[]): ColumnRole {
  if (role !== "date" && role !== "clock" && role !== "dateTime") return role;
  const filled = cells.filter((cell) => !isMissing(cell));
  const { order } = dateOrderOf(filled.map(datePart));
  const moments = filled.slice(0, 50).map((cell) => parseDateTime(cell, order));
  if (moments.some((moment) => moment !== null && moment.clock !== null)) return "dateTime";
  if (role === "dateTime" && moments.some((moment) => moment !== null)) return "date";
  return role;
}

function contenderOf(table: FoundTable, columnIndex: number): Contender | null {
  const header = table.header.cells[columnIndex]!;
  const meaning = readHeaderCell(header);
  if (meaning === null) return null;
  const cells = cellsOf(table, columnIndex);
  const role = roleByContent(meaning.role, cells);
  const kind = ROLE_KIND[role];
  const fromRow = kind === undefined ? null : unitByName(table.unitTexts[columnIndex] ?? "", kind);
  return {
    columnIndex,
    header,
    role,
    rankIndex: meaning.rankIndex,
    unit: (meaning.unit ?? fromRow)?.symbol ?? null,
    unitSource: meaning.unit !== null ? "its header" : "the units row",
    filledCount: cells.filter((cell) => !isMissing(cell)).length,
  };
}

/** Better first: one with values, the better name, a stated unit, the place in the file. */
const byMerit = (a: Contender, b: Contender): number =>
  Number(b.filledCount > 0) - Number(a.filledCount > 0) ||
  a.rankIndex - b.rankIndex ||
  Number(b.unit !== null) - Number(a.unit !== null) ||
  a.columnIndex - b.columnIndex;

function whyUnused(header: string): string {
  if (header === "") return "not used: it has no name";
  if (/flag|\bqc\b|_qc|qc_|quality|\bqf\b/i.test(header)) return "not used: a flag about another column";
  if (/discrete|bottle/i.test(header)) return "not used: single water samples, not the probe";
  if (/absolute.?pressure/i.test(header)) return "not used: absolute pressure holds the air's, sea pressure is needed";
  if (/absolute.?salinity/i.test(header)) return "not used: absolute salinity, practical salinity is needed";
  return "not used: its name is none known here";
}

interface Decision {
  readonly reading: ColumnReading;
  readonly used: UsedColumn | null;
  readonly issues: readonly Issue[];
}

function decide(contender: Contender, numbers: readonly number[]): Decision {
  const { columnIndex, header, role } = contender;
  const words = ROLE_WORDS[role];
  const finished = (unit: UnitSymbol | null, isUsed: boolean, reason: string, issues: readonly Issue[]): Decision => ({
    reading: { columnIndex, header, role: isUsed ? role : null, unit: isUsed ? unit : null, reason },
    used: isUsed ? { columnIndex, header, unit } : null,
    issues,
  });
  if (contender.filledCount === 0) return finished(null, false, `not used: ${words} by its name, but empty`, []);
  if (ROLE_KIND[role] === undefined) return finished(null, true, `${words} by its name and its values`, []);
  if (contender.unit !== null) {
    return finished(contender.unit, true, `${words} by its name, ${contender.unit} by ${contender.unitSource}`, []);
  }
  const choice = chooseUnit({ role, header, values: numbers });
  const issues = choice.issue === null ? [] : [choice.issue];
  return finished(choice.unit, choice.unit !== null, `${words} by its name; ${choice.reason}`, issues);
}

const passedOver = (loser: Contender, winner: Contender): Decision => {
  const words = ROLE_WORDS[loser.role];
  return {
    reading: {
      columnIndex: loser.columnIndex,
      header: loser.header,
      role: null,
      unit: null,
      reason: `not used: could be ${words} too, but "${winner.header}" is the better match`,
    },
    used: null,
    issues: [
      {
        severity: "note",
        code: "two-columns-for-one-role",
        message: `"${winner.header}" and "${loser.header}" could both be ${words}; "${winner.header}" is used as the better match`,
      },
    ],
  };
};

function numbersOf(table: FoundTable, columnIndex: number, decimalMark: DecimalMark): readonly number[] {
  return cellsOf(table, columnIndex)
    .filter((cell) => !isSentinel(cell))
    .map((cell) => parseNumber(cell, decimalMark))
    .filter((value): value is number => value !== null && !Number.isNaN(value));
}

/** Reads every header of a table; the issues hold errors where a unit must be asked for. */
export function recogniseColumns(table: FoundTable): RecognisedColumns {
  const contenders = table.header.cells.map((_, columnIndex) => contenderOf(table, columnIndex));
  const measured = contenders.filter((c) => c !== null && ROLE_KIND[c.role] !== undefined);
  const decimalMark = decimalMarkOf(measured.flatMap((c) => cellsOf(table, c!.columnIndex)));
  const winners = new Map<ColumnRole, Contender>();
  for (const role of Object.keys(COLUMN_NAMES) as ColumnRole[]) {
    const best = contenders.filter((c) => c !== null && c.role === role).sort((a, b) => byMerit(a!, b!))[0];
    if (best) winners.set(role, best);
  }
  const decisions = contenders.map((contender, columnIndex): Decision => {
    if (contender === null) {
      const header = table.header.cells[columnIndex]!;
      const reading = { columnIndex, header, role: null, unit: null, reason: whyUnused(header) };
      return { reading, used: null, issues: [] };
    }
    const winner = winners.get(contender.role)!;
    if (winner !== contender) return passedOver(contender, winner);
    return decide(contender, ROLE_KIND[contender.role] ? numbersOf(table, columnIndex, decimalMark) : []);
  });
  const used: Partial<Record<ColumnRole, UsedColumn>> = {};
  for (const { reading, used: column } of decisions) if (reading.role && column) used[reading.role] = column;
  return {
    used,
    readings: decisions.map((decision) => decision.reading),
    decimalMark,
    issues: decisions.flatMap((decision) => decision.issues),
  };
}
