/** The rows of a table as arrays in the program's own units, before they are split into casts. */
import type { Issue } from "../../base/index.ts";
import { type BadCell, CellReader } from "./cell-reader.ts";
import { dateOrderOf, datePart, orderInName, parseClock, parseDateTime } from "./parse-time.ts";
import type { RecognisedColumns } from "./recognise-columns.ts";
import type { Table } from "./table.ts";

export interface MeasuredRows {
  readonly n: number;
  readonly lineIndex: Int32Array;
  readonly depthM: Float64Array | null;
  readonly seaPressureDbar: Float64Array | null;
  readonly inSituTempC: Float64Array;
  readonly practicalSalinity: Float64Array | null;
  readonly conductivityMsCm: Float64Array | null;
  readonly specificConductanceMsCm: Float64Array | null;
  readonly statedSigmaKgM3: Float64Array | null;
  readonly latitudeDeg: Float64Array | null;
  readonly longitudeDeg: Float64Array | null;
  readonly distanceKm: Float64Array | null;
  readonly station: readonly string[] | null;
  readonly castName: readonly string[] | null;
  /** YYYY-MM-DD; empty where unreadable. */
  readonly date: readonly string[] | null;
  /** What tells days apart: the date, or the text as written where it cannot be read. */
  readonly dateKey: readonly string[] | null;
  /** HH:MM or HH:MM:SS; empty where unreadable. */
  readonly clock: readonly string[] | null;
  /** By row. */
  readonly badCells: ReadonlyMap<number, readonly BadCell[]>;
  /** About the file as a whole. */
  readonly issues: readonly Issue[];
}

const ASSUMED_ORDER: Issue = {
  severity: "warning",
  code: "assumed-date-order",
  message:
    "no date in the file tells whether day or month stands first; month is assumed; dates such as 2020-03-04 would tell",
};

/** Long tables repeat their dates and times row after row. */
function remembered<T>(parse: (text: string) => T): (text: string) => T {
  const known = new Map<string, T>();
  return (text) => {
    const value = known.has(text) ? (known.get(text) as T) : parse(text);
    known.set(text, value);
    return value;
  };
}

type Times = Pick<MeasuredRows, "date" | "dateKey" | "clock">;

function readTimes(reader: CellReader): Times {
  const dateTexts = reader.textsFilledDown("date");
  const momentTexts = reader.texts("dateTime");
  const clockTexts = reader.texts("clock");
  const told = orderInName(`${reader.nameOf("date")} ${reader.nameOf("dateTime")}`);
  const found = dateOrderOf([...(dateTexts ?? []), ...(momentTexts ?? []).map(datePart)]);
  if (found.assumed && told === null) reader.issues.push(ASSUMED_ORDER);
  const order = found.assumed ? (told ?? found.order) : found.order;
  const momentOf = remembered((text) => parseDateTime(text, order));
  const dateOf = (text: string) => momentOf(text)?.date ?? null;
  const clockOf = (text: string) => momentOf(text)?.clock ?? "";
  const ownDate = dateTexts && reader.times("date", dateTexts, dateOf);
  const momentDate = momentTexts && reader.times("dateTime", momentTexts, dateOf);
  const date = ownDate ?? momentDate;
  return {
    date,
    dateKey: date?.map((day, i) => day || dateTexts?.[i] || "") ?? null,
    clock:
      (clockTexts && reader.times("clock", clockTexts, remembered(parseClock))) ?? momentTexts?.map(clockOf) ?? null,
  };
}

/** Needs a temperature column among the used ones; without it temperature is missing throughout. */
export function readMeasuredRows(table: Table, columns: RecognisedColumns): MeasuredRows {
  const reader = new CellReader(table, columns);
  const { rows } = table;
  return {
    n: rows.length,
    lineIndex: Int32Array.from(rows, (row) => row.lineIndex),
    depthM: reader.numbers("depth"),
    seaPressureDbar: reader.numbers("seaPressure"),
    inSituTempC: reader.numbers("temperature") ?? new Float64Array(rows.length).fill(Number.NaN),
    practicalSalinity: reader.numbers("practicalSalinity"),
    conductivityMsCm: reader.numbers("conductivity"),
    specificConductanceMsCm: reader.numbers("specificConductance"),
    statedSigmaKgM3: reader.numbers("densityAnomaly"),
    latitudeDeg: reader.numbers("latitude"),
    longitudeDeg: reader.numbers("longitude"),
    distanceKm: reader.numbers("distance"),
    station: reader.textsFilledDown("station"),
    castName: reader.textsFilledDown("castName"),
    ...readTimes(reader),
    badCells: reader.badCells,
    issues: reader.issues,
  };
}
