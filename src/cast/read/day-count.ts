/**
 * Times written as one number: seconds since 1970, days since the zero of a spreadsheet, Julian days, and whatever
 * "hours since 2020-01-01" names (the form of the CF conventions).
 */

export interface DayCount {
  /** As it is shown and may be given by the user. */
  readonly name: string;
  readonly stepMs: number;
  /** Of the count's zero, in milliseconds since 1970. */
  readonly originMs: number;
}

const DAY_MS = 86_400_000;

const SECONDS: DayCount = { name: "seconds since 1970-01-01", stepMs: 1000, originMs: 0 };
const MILLISECONDS: DayCount = { name: "milliseconds since 1970-01-01", stepMs: 1, originMs: 0 };
const SHEET_DAYS: DayCount = { name: "days since 1899-12-30", stepMs: DAY_MS, originMs: -25_569 * DAY_MS };
const YEAR_ZERO_DAYS: DayCount = { name: "days since year 0", stepMs: DAY_MS, originMs: -719_529 * DAY_MS };
const JULIAN_DAYS: DayCount = { name: "Julian days", stepMs: DAY_MS, originMs: -2_440_587.5 * DAY_MS };

/** Which numbers count what, for times between about 1950 and 2100; the ranges do not touch. */
const BY_RANGE: readonly (readonly [least: number, most: number, count: DayCount])[] = [
  [18_000, 74_000, SHEET_DAYS],
  [712_000, 768_000, YEAR_ZERO_DAYS],
  [2_433_000, 2_489_000, JULIAN_DAYS],
  [2e8, 4.2e9, SECONDS],
  [2e11, 4.2e12, MILLISECONDS],
];

const STEP_MS: ReadonlyMap<string, number> = new Map([
  ["ms", 1],
  ["msec", 1],
  ["millisecond", 1],
  ["s", 1000],
  ["sec", 1000],
  ["second", 1000],
  ["min", 60_000],
  ["minute", 60_000],
  ["h", 3_600_000],
  ["hr", 3_600_000],
  ["hour", 3_600_000],
  ["d", DAY_MS],
  ["day", DAY_MS],
]);

export const KNOWN_COUNTS: readonly DayCount[] = BY_RANGE.map(([, , count]) => count);

/** The count that a text names, or null. */
export function dayCountByName(text: string): DayCount | null {
  const plain = text.trim().toLowerCase();
  const known = KNOWN_COUNTS.find((count) => count.name.toLowerCase() === plain);
  if (known) return known;
  const match =
    /^([a-z]+?)s? since (\d{4}-\d{1,2}-\d{1,2})(?:[t ](\d{1,2}:\d{2}(?::\d{2})?)(?:\.0*)?)?(?: ?(?:z|utc|\+?0?0:?00))?$/.exec(
      plain,
    );
  const stepMs = STEP_MS.get(match?.[1] ?? "") ?? (match?.[1] === "" ? 1000 : undefined);
  if (match === null || stepMs === undefined) return null;
  const [year, month, day] = match[2]!.split("-").map(Number);
  const [hours, minutes, seconds] = (match[3] ?? "0:0:0").split(":").map(Number);
  const originMs = Date.UTC(year!, month! - 1, day!, hours, minutes, seconds ?? 0);
  return Number.isNaN(originMs) ? null : { name: text.trim(), stepMs, originMs };
}

const FIGURES = /^\d+(\.\d+)?$/;

/** The count that all of the cells could be, and only that one; null where they are no such numbers. */
export function dayCountOf(cells: readonly string[]): DayCount | null {
  if (cells.length === 0 || !cells.every((cell) => FIGURES.test(cell))) return null;
  const values = cells.map(Number);
  const found = BY_RANGE.find(([least, most]) => values.every((value) => value >= least && value <= most));
  return found?.[2] ?? null;
}

/** The time of a counted number, in milliseconds since 1970; NaN where the text is no number. */
export const countedMs = (text: string, count: DayCount): number =>
  /^[-+]?[\d.]+(e[-+]?\d+)?$/i.test(text) ? count.originMs + Number(text) * count.stepMs : Number.NaN;
