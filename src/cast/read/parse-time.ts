/**
 * Dates and clock times as people write them, to ISO 8601. A date of figures and slashes can be month first or day first:
 * that is told from the whole column, never from one cell.
 */

export type SlashOrder = "month-first" | "day-first";

export interface DateOrder {
  readonly order: SlashOrder;
  /** No cell of the column has a figure above 12 that would tell, and the two orders give different days. */
  readonly assumed: boolean;
}

const MONTHS = ["jan", "feb", "mar", "apr", "may", "jun", "jul", "aug", "sep", "oct", "nov", "dec"];
const SLASHED = /^(\d{1,2})([/.-])(\d{1,2})\2(\d{4}|\d{2})$/;

const two = (n: number): string => String(n).padStart(2, "0");

/** Two figures of a year are 1969 to 2068, the rule of POSIX. */
const fullYear = (text: string): number =>
  text.length > 2 ? Number(text) : Number(text) + (Number(text) < 69 ? 2000 : 1900);

/** No water was measured before; "0016" is a year cut short. */
const FIRST_YEAR = 1700;

function isoDate(year: number, month: number, day: number): string | null {
  if (year < FIRST_YEAR) return null;
  const lastDay = new Date(Date.UTC(year, month, 0)).getUTCDate();
  return month >= 1 && month <= 12 && day >= 1 && day <= lastDay ? `${year}-${two(month)}-${two(day)}` : null;
}

/** The order that a header such as "Date (MM/DD/YYYY)" spells out. */
export function orderInName(text: string): SlashOrder | null {
  if (/\bm{1,3}[/.-]d{1,2}[/.-]y{2,4}\b/i.test(text)) return "month-first";
  return /\bd{1,2}[/.-]m{1,3}[/.-]y{2,4}\b/i.test(text) ? "day-first" : null;
}

/** Day first or month first, for a whole column; points between the figures always mean day first. */
export function dateOrderOf(texts: Iterable<string>): DateOrder {
  let order: SlashOrder | null = null;
  let matters = false;
  for (const text of texts) {
    const match = SLASHED.exec(text);
    if (match === null) continue;
    if (match[2] === ".") return { order: "day-first", assumed: false };
    matters ||= match[1] !== match[3];
    if (Number(match[1]) > 12) order ??= "day-first";
    else if (Number(match[3]) > 12) order ??= "month-first";
  }
  return { order: order ?? "month-first", assumed: matters && order === null };
}

/** A date as YYYY-MM-DD, or null when the text is none. */
export function parseDate(text: string, order: SlashOrder): string | null {
  const iso = /^(\d{4})[-/.](\d{1,2})[-/.](\d{1,2})$/.exec(text) ?? /^((?:19|20)\d{2})(\d{2})(\d{2})$/.exec(text);
  if (iso !== null) return isoDate(Number(iso[1]), Number(iso[2]), Number(iso[3]));
  const slashed = SLASHED.exec(text);
  if (slashed !== null) {
    const [first, second] = [Number(slashed[1]), Number(slashed[3])];
    const [month, day] = order === "month-first" ? [first, second] : [second, first];
    return isoDate(fullYear(slashed[4]!), month, day);
  }
  return parseNamedMonth(text);
}

/** 13-Jan-2020, 13 January 2020, Jan 13, 2020 */
function parseNamedMonth(text: string): string | null {
  const dayFirst = /^(\d{1,2})[\s/.-]+([a-z]{3})[a-z]*\.?[\s/,.-]+(\d{4}|\d{2})$/i.exec(text);
  const monthFirst = /^([a-z]{3})[a-z]*\.?\s+(\d{1,2}),?\s+(\d{4})$/i.exec(text);
  const match = dayFirst ?? monthFirst;
  if (match === null) return null;
  const [day, name] = dayFirst === null ? [match[2], match[1]] : [match[1], match[2]];
  return isoDate(fullYear(match[3]!), MONTHS.indexOf(name!.toLowerCase()) + 1, Number(day));
}

/** A time of day as HH:MM or HH:MM:SS, or null. Figures alone are hours and minutes: 629 is 06:29. */
export function parseClock(text: string): string | null {
  const colon = /^(\d{1,2}):(\d{2})(?::(\d{2})(?:[.,]\d+)?)?\s*([ap]m)?$/i.exec(text);
  const figures = /^(\d{1,2})(\d{2})$/.exec(text);
  const match = colon ?? figures;
  if (match === null) return null;
  const half = colon?.[4]?.toLowerCase();
  const hour = half === undefined ? Number(match[1]) : (Number(match[1]) % 12) + (half === "pm" ? 12 : 0);
  const seconds = colon?.[3];
  if (hour > 23 || Number(match[2]) > 59 || Number(seconds ?? 0) > 59) return null;
  return `${two(hour)}:${match[2]}${seconds === undefined ? "" : `:${seconds}`}`;
}

/** Seconds since midnight of a clock time, with their fraction; NaN where the text is none. */
export function secondsOfDay(text: string): number {
  const clock = parseClock(text);
  if (clock === null) return Number.NaN;
  const fraction = /:\d{2}[.,](\d{1,9})/.exec(text);
  const wholeS = Number(clock.slice(0, 2)) * 3600 + Number(clock.slice(3, 5)) * 60 + Number(clock.slice(6));
  return fraction === null ? wholeS : wholeS + Number(`0.${fraction[1]}`);
}

/** Longer texts are no time; so much also bounds the work on them. */
const LONGEST_TEXT = 60;
const ZONE = /\s*(Z|UTC|GMT|[-+]\d{2}:?\d{2})$/i;
const DATE_AND_CLOCK = /^(.+?)(?:T|\s+)(\d{1,2}:\d{2}.*|\d{4})$/i;

/** A date and a clock time with a blank or a T between, or fourteen figures in a row. */
function splitMoment(text: string): { readonly date: string; readonly clock: string } | null {
  if (text.length > LONGEST_TEXT) return null;
  const match = DATE_AND_CLOCK.exec(text.replace(ZONE, ""));
  if (match !== null) return { date: match[1]!.trim(), clock: match[2]!.trim() };
  const figures = /^(\d{8})(\d{2})(\d{2})(\d{2})$/.exec(text);
  return figures && { date: figures[1]!, clock: `${figures[2]}:${figures[3]}:${figures[4]}` };
}

export interface TimedMoment {
  readonly date: string;
  /** HH:MM or HH:MM:SS; empty where the text is a date alone. */
  readonly clock: string;
  readonly inDayS: number;
}

/** A date, alone or with a time of day behind it; a zone at the end is not converted. */
export function parseMoment(text: string, dateOf: (text: string) => string | null): TimedMoment | null {
  const whole = text.includes(":") ? null : dateOf(text);
  if (whole !== null) return { date: whole, clock: "", inDayS: 0 };
  const parts = splitMoment(text);
  const date = parts && dateOf(parts.date);
  const clock = parts && parseClock(parts.clock);
  return date && clock ? { date, clock, inDayS: secondsOfDay(parts.clock) } : null;
}

export interface Moment {
  readonly date: string;
  /** HH:MM or HH:MM:SS */
  readonly clock: string | null;
}

/** As `parseMoment`, for telling what a column holds. */
export function parseDateTime(text: string, order: SlashOrder): Moment | null {
  const found = parseMoment(text, (date) => parseDate(date, order));
  return found && { date: found.date, clock: found.clock || null };
}

/** The part of a date-time text that is a date, for telling the order of its figures. */
export const datePart = (text: string): string => text.split(/[T\s]/)[0] ?? text;
