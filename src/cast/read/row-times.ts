/** When each row was measured, from whatever columns say so: date, clock, both in one, year-month-day, or a count. */
import type { CellReader } from "./cell-reader.ts";
import { countedMs, type DayCount } from "./day-count.ts";
import { parseClock, parseDate, parseMoment, secondsOfDay } from "./parse-time.ts";
import type { TimeForm } from "./time-form.ts";

export interface RowTimes {
  /** YYYY-MM-DD; empty where unreadable. */
  readonly date: readonly string[] | null;
  /** What tells days apart: the date, or the text as written where it cannot be read. */
  readonly dateKey: readonly string[] | null;
  /** HH:MM or HH:MM:SS; empty where unreadable. */
  readonly clock: readonly string[] | null;
  /** From any zero that all rows share: since 1970 in the file's own zone, since midnight, or since the start. */
  readonly timeS: Float64Array | null;
}

/** One text with its meaning. */
interface Moment {
  readonly date: string;
  readonly clock: string;
  readonly timeS: number;
}

/** What a column that has dates in it says, row by row. */
interface Moments {
  readonly texts: readonly string[];
  readonly dates: readonly string[];
  readonly clocks: readonly string[];
  readonly timeS: Float64Array;
}

const REMEMBERED = 20_000;

/** Long tables repeat their dates and times row after row; those that do not must not fill the memory. */
function remembered<T>(parse: (text: string) => T): (text: string) => T {
  const known = new Map<string, T>();
  return (text) => {
    if (known.has(text)) return known.get(text) as T;
    const value = parse(text);
    if (known.size >= REMEMBERED) known.clear();
    known.set(text, value);
    return value;
  };
}

/** Seconds from 1970 to the midnight that a day begins with. */
const dayS = (date: string): number => (date === "" ? Number.NaN : Date.parse(date) / 1000);

/** Beyond this no date is written, in milliseconds from 1970. */
const LONGEST_MS = 6e13;

/** Day numbers are cut to a few decimals: a time that is 13:46:00 must not come out as 13:45:59. */
const ROUNDED_MS = 100;

function countedMoment(text: string, count: DayCount): Moment | null {
  const ms = countedMs(text, count);
  if (!(Math.abs(ms) < LONGEST_MS)) return null;
  const iso = new Date(Math.floor((ms + ROUNDED_MS) / 1000) * 1000).toISOString();
  return { date: iso.slice(0, 10), clock: iso.slice(11, 19), timeS: ms / 1000 };
}

function momentIn({ order, count }: TimeForm): (text: string) => Moment | null {
  if (count !== null) return (text) => countedMoment(text, count);
  if (order === null) return () => null;
  const dateOf = remembered((text) => parseDate(text, order));
  const startS = remembered(dayS);
  return (text) => {
    const found = parseMoment(text, dateOf);
    return found && { ...found, timeS: startS(found.date) + (found.clock === "" ? 0 : found.inDayS) };
  };
}

/** One date text a row from three columns; null unless the file has all of them. */
function yearMonthDay(reader: CellReader): readonly string[] | null {
  const [years, months, days] = [reader.texts("year"), reader.texts("month"), reader.texts("day")];
  if (years === null || months === null || days === null) return null;
  const whole = (text: string): string => text.replace(/\.0+$/, "");
  return years.map((year, i) => {
    const [month, day] = [whole(months[i]!), whole(days[i]!)];
    if (year === "" && month === "" && day === "") return "";
    return /^\d+$/.test(month) ? `${month}/${day}/${whole(year)}` : `${day}-${month}-${whole(year)}`;
  });
}

function dateMoments(reader: CellReader): Moments | null {
  const parts = yearMonthDay(reader);
  const form: TimeForm = parts === null ? reader.timeForm("date") : { order: "month-first", count: null };
  const texts = parts ?? reader.textsFilledDown("date");
  return texts && momentsOf(reader, parts === null ? "date" : "day", texts, form);
}

function dateTimeMoments(reader: CellReader): Moments | null {
  const texts = reader.texts("dateTime");
  return texts && momentsOf(reader, "dateTime", texts, reader.timeForm("dateTime"));
}

function momentsOf(
  reader: CellReader,
  role: "date" | "day" | "dateTime",
  texts: readonly string[],
  form: TimeForm,
): Moments {
  const momentOf = remembered(momentIn(form));
  const clocks: string[] = [];
  const timeS = new Float64Array(texts.length).fill(Number.NaN);
  const isOpen = form.order === null && form.count === null;
  const dates = reader.times(role, isOpen ? texts.map(() => "") : texts, (text, i) => {
    const moment = momentOf(text);
    clocks[i] = moment?.clock ?? "";
    timeS[i] = moment?.timeS ?? Number.NaN;
    return moment?.date ?? null;
  });
  return { texts, dates, clocks: texts.map((_, i) => clocks[i] ?? ""), timeS };
}

/** Clock times of a lowering that runs past midnight go on counting. */
function unwrapped(inDayS: Float64Array): Float64Array {
  let addedS = 0;
  return inDayS.map((value, i) => {
    if (i > 0 && value + 43_200 < inDayS[i - 1]!) addedS += 86_400;
    return value + addedS;
  });
}

function clockTimes(clockTexts: readonly string[], date: readonly string[] | null): Float64Array {
  const inDayS = Float64Array.from(clockTexts, remembered(secondsOfDay));
  const startS = remembered(dayS);
  return date === null ? unwrapped(inDayS) : inDayS.map((value, i) => value + startS(date[i]!));
}

export function readRowTimes(reader: CellReader): RowTimes {
  const days = dateMoments(reader);
  const moments = dateTimeMoments(reader);
  const clockTexts = reader.texts("clock");
  const main = days ?? moments;
  const date = main?.dates ?? null;
  return {
    date,
    dateKey: date?.map((day, i) => day || main?.texts[i] || "") ?? null,
    clock: (clockTexts && reader.times("clock", clockTexts, remembered(parseClock))) ?? moments?.clocks ?? null,
    timeS: reader.numbers("elapsedTime") ?? moments?.timeS ?? (clockTexts && clockTimes(clockTexts, date)),
  };
}
