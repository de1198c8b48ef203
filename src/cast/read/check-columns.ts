/** What a table must have before casts can be made of it. */
import type { Issue } from "../../base/index.ts";
import type { ColumnRole, Question } from "../reading.ts";
import { answerNames } from "./answers.ts";
import { type Choice, choose } from "./ask.ts";
import { isMissing, parseNumber } from "./parse-number.ts";
import type { RecognisedColumns } from "./recognise-columns.ts";
import { rowsBetween } from "./rows.ts";
import { VERTICAL_ROLES } from "./settle-columns.ts";
import type { Table } from "./table.ts";

const TEMPERATURE_ROLES: readonly ColumnRole[] = ["temperature"];

const hasOneOf = (columns: RecognisedColumns, roles: readonly ColumnRole[]): boolean =>
  roles.some((role) => columns.used[role] !== undefined);

const isAskedAbout = (columns: RecognisedColumns, roles: readonly ColumnRole[]): boolean =>
  columns.questions.some(({ choices }) => choices.some(({ answer }) => roles.includes(answer.role as ColumnRole)));

/** Places with coordinates and nothing measured there. */
export const isStationList = ({ used }: RecognisedColumns): boolean =>
  used.latitude !== undefined && used.longitude !== undefined && used.temperature === undefined;

const LISTED_HEADERS = 12;

function listed(headers: readonly string[]): string {
  const names = headers.slice(0, LISTED_HEADERS).map((header) => `"${header}"`);
  const more = headers.length - names.length;
  return names.join(", ") + (more > 0 ? ` and ${more} more` : "");
}

export interface ColumnCheck {
  /** They keep the table from being read. */
  readonly errors: readonly Issue[];
  /** Which column is depth, which is temperature, where no name tells. */
  readonly questions: readonly Question[];
  /** No casts can be made before a question is answered. */
  readonly isWaiting: boolean;
}

const SEARCHED_ROWS = 50;

/** Columns of numbers that have no role yet; a depth of the water may be that of the samples after all. */
function openColumns(table: Table, columns: RecognisedColumns): readonly number[] {
  const style = { decimalMark: columns.decimalMark, groupMark: null };
  return columns.readings
    .filter(({ role, confidence }) => (role === null && confidence !== "doubtful") || role === "waterDepth")
    .map(({ columnIndex }) => columnIndex)
    .filter((columnIndex) => {
      const cells = rowsBetween(table.rows, 0, SEARCHED_ROWS).map((row) => row.cells[columnIndex] ?? "");
      const filled = cells.filter((cell) => !isMissing(cell));
      return filled.length > 1 && filled.every((cell) => parseNumber(cell, style) !== null);
    });
}

interface Need {
  readonly roles: readonly ColumnRole[];
  readonly code: string;
  readonly missing: string;
  readonly choicesFor: (name: string) => readonly Choice[];
}

const NEEDS: readonly Need[] = [
  {
    roles: VERTICAL_ROLES,
    code: "no-depth-column",
    missing: 'no depth or pressure column among HEADERS; expected a header such as "Depth (m)" or "Pressure (dbar)"',
    choicesFor: (name) => [
      choose(name, "depth", "m", `"${name}" is depth in m`),
      choose(name, "depth", "ft", `"${name}" is depth in ft`),
      choose(name, "seaPressure", "dbar", `"${name}" is sea pressure in dbar`),
    ],
  },
  {
    roles: TEMPERATURE_ROLES,
    code: "no-temperature-column",
    missing: 'no temperature column among HEADERS; expected a header such as "Temperature (degC)"',
    choicesFor: (name) => [
      choose(name, "temperature", "degC", `"${name}" is temperature in degC`),
      choose(name, "temperature", "degF", `"${name}" is temperature in degF`),
    ],
  },
];

/** Whether a table can be read; where only a name is missing, which of its columns of numbers could be meant. */
export function checkColumns(table: Table, columns: RecognisedColumns): ColumnCheck {
  const headers = table.header.cells;
  const line = table.header.lineIndex;
  const error = (code: string, message: string): Issue => ({ severity: "error", code, message, line });
  if (isStationList(columns) && !isAskedAbout(columns, TEMPERATURE_ROLES)) {
    const message = `this looks like a list of stations, not casts: coordinates but no temperature among ${listed(headers)}; add the file that holds the samples`;
    return { errors: [error("station-list", message)], questions: [], isWaiting: false };
  }
  const lacking = NEEDS.filter(({ roles }) => !hasOneOf(columns, roles));
  const unasked = lacking.filter(({ roles }) => !isAskedAbout(columns, roles));
  const open = unasked.length === 0 ? [] : openColumns(table, columns);
  const names = answerNames(headers);
  const isHopeless = open.length < unasked.length;
  const messageOf = ({ missing }: Need): string => missing.replace("HEADERS", listed(headers));
  return {
    errors: isHopeless ? unasked.map((need) => error(need.code, messageOf(need))) : [],
    questions: unasked.map((need) => ({
      code: need.code,
      columnIndex: open[0] ?? 0,
      message: messageOf(need),
      choices: open.flatMap((columnIndex) => need.choicesFor(names[columnIndex]!)),
    })),
    isWaiting: lacking.length > 0,
  };
}
