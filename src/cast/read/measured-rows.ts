/** The rows of a table as arrays in the program's own units, before they are split into casts. */
import { convert, type UnitSymbol } from "../../units/index.ts";
import type { ColumnRole } from "../reading.ts";
import { ROLE_WORDS } from "./column-names.ts";
import type { FoundTable } from "./find-header.ts";
import { isMissing, isSentinel, parseNumber } from "./parse-number.ts";
import { type DateOrder, dateOrderOf, datePart, parseClock, parseDateTime } from "./parse-time.ts";
import type { RecognisedColumns } from "./recognise-columns.ts";

/** A cell that should have held a number or a time and holds some other text. */
export interface BadCell {
  readonly rowIndex: number;
  readonly message: string;
}

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
  /** HH:MM or HH:MM:SS; empty where unreadable. */
  readonly clock: readonly string[] | null;
  readonly dateOrder: DateOrder;
  readonly badCells: readonly BadCell[];
}

const EXPECTED_UNIT = {
  depth: "m",
  seaPressure: "dbar",
  temperature: "degC",
  practicalSalinity: "1",
  conductivity: "mS/cm",
  specificConductance: "mS/cm",
  densityAnomaly: "kg/m3",
  latitude: "deg",
  longitude: "deg",
  distance: "km",
} as const satisfies Partial<Record<ColumnRole, UnitSymbol>>;

type NumberRole = keyof typeof EXPECTED_UNIT;

/** Reads table cells by role and keeps what it could not read. */
class CellReader {
  readonly badCells: BadCell[] = [];
  readonly #table: FoundTable;
  readonly #columns: RecognisedColumns;

  constructor(table: FoundTable, columns: RecognisedColumns) {
    this.#table = table;
    this.#columns = columns;
  }

  texts(role: ColumnRole): readonly string[] | null {
    const column = this.#columns.used[role];
    return column ? this.#table.rows.map((row) => row.cells[column.columnIndex] ?? "") : null;
  }

  numbers(role: NumberRole): Float64Array | null {
    const column = this.#columns.used[role];
    const texts = this.texts(role);
    if (!column || texts === null) return null;
    const from = column.unit ?? EXPECTED_UNIT[role];
    const isPlace = role === "latitude" || role === "longitude";
    return Float64Array.from(texts, (text, rowIndex) => {
      if (!isPlace && isSentinel(text)) return Number.NaN;
      const value = parseNumber(text, this.#columns.decimalMark);
      if (value !== null) return convert(value, from, EXPECTED_UNIT[role]);
      this.reject(rowIndex, `${ROLE_WORDS[role]} "${text}" is not a number; expected a number or a blank`);
      return Number.NaN;
    });
  }

  /** Blank where the text is missing or `read` cannot make sense of it. */
  times(texts: readonly string[], words: string, read: (text: string) => string | null): readonly string[] {
    return texts.map((text, rowIndex) => {
      if (isMissing(text)) return "";
      const time = read(text);
      if (time === null) this.reject(rowIndex, `${words} "${text}" is not understood; expected YYYY-MM-DD or HH:MM`);
      return time ?? "";
    });
  }

  private reject(rowIndex: number, message: string): void {
    this.badCells.push({ rowIndex, message });
  }
}

function readTimes(reader: CellReader): Pick<MeasuredRows, "date" | "clock" | "dateOrder"> {
  const dateTexts = reader.texts("date");
  const momentTexts = reader.texts("dateTime");
  const clockTexts = reader.texts("clock");
  const dateOrder = dateOrderOf([...(dateTexts ?? []), ...(momentTexts ?? []).map(datePart)]);
  const moment = (text: string) => parseDateTime(text, dateOrder.order);
  const ownDate = dateTexts && reader.times(dateTexts, "date", (text) => moment(text)?.date ?? null);
  const ownClock = clockTexts && reader.times(clockTexts, "time", parseClock);
  const fromMoment = momentTexts && reader.times(momentTexts, "date and time", (text) => moment(text)?.date ?? null);
  const clockOfMoment = momentTexts?.map((text) => moment(text)?.clock ?? "") ?? null;
  return { date: ownDate ?? fromMoment, clock: ownClock ?? clockOfMoment, dateOrder };
}

/** Needs a temperature column among the used ones. */
export function readMeasuredRows(table: FoundTable, columns: RecognisedColumns): MeasuredRows {
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
    station: reader.texts("station"),
    castName: reader.texts("castName"),
    ...readTimes(reader),
    badCells: reader.badCells,
  };
}
