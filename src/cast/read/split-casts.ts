/**
 * Which rows belong to one lowering. Station, cast and date tell casts apart where the file has them. A depth that starts
 * over makes a new cast only with a gap in time beside it, or where the file has nothing else to go by; times that run
 * on from sample to sample never do.
 */
import { median } from "simple-statistics";
import type { MeasuredRows } from "./measured-rows.ts";

export interface RowGroup {
  /** Rows of the table, in file order. */
  readonly rowIndices: readonly number[];
  readonly station: string | null;
  readonly castName: string | null;
  readonly date: string | null;
  /** Rows where the depth starts over although nothing else says that a new cast begins. */
  readonly restartRows: readonly number[];
}

export interface SplitRows {
  readonly groups: readonly RowGroup[];
  readonly splitBy: string;
}

const SHORTEST_GAP_S = 60;
const LONGEST_PAUSE_S = 600;
const DAY_S = 86_400;

/** The day of each row, by which days are told apart; a lowering that runs past midnight keeps the day it began on. */
function daysOf(rows: MeasuredRows): readonly string[] | null {
  const { date, clock, dateKey } = rows;
  if (dateKey === null || date === null || clock === null) return dateKey;
  const days = [...dateKey];
  for (let i = 1; i < rows.n; i++) {
    const isSamePlace = rows.station?.[i] === rows.station?.[i - 1] && rows.castName?.[i] === rows.castName?.[i - 1];
    const isNextDay = Date.parse(date[i]!) - Date.parse(date[i - 1]!) === DAY_S * 1000;
    const pauseS = DAY_S + secondsOf(clock[i]!) - secondsOf(clock[i - 1]!);
    const isSameDay = date[i] === date[i - 1] || (isNextDay && pauseS < LONGEST_PAUSE_S);
    if (isSamePlace && isSameDay) days[i] = days[i - 1]!;
  }
  return days;
}

function groupByKeys(rows: MeasuredRows): readonly (readonly number[])[] {
  const days = daysOf(rows);
  const groups = new Map<string, number[]>();
  for (let i = 0; i < rows.n; i++) {
    const key = JSON.stringify([rows.station?.[i], rows.castName?.[i], days?.[i]]);
    const group = groups.get(key);
    if (group) group.push(i);
    else groups.set(key, [i]);
  }
  return [...groups.values()];
}

/**
 * Rows at which depth jumps back by more than half its whole range and stays back: from two rows far on to two rows near
 * the start, so that neither a spike nor a soak is taken for it; or back to the very depth that the lowering began with.
 */
function restartsIn(rowIndices: readonly number[], depths: Float64Array): readonly number[] {
  const measured = rowIndices.filter((i) => !Number.isNaN(depths[i]!));
  const values = measured.map((i) => depths[i]!);
  if (values.length < 4) return [];
  const half = (values.reduce((a, b) => Math.max(a, b)) - values.reduce((a, b) => Math.min(a, b))) / 2;
  const towards = values.reduce((sum, value, k) => sum + Math.sign(value - (values[k - 1] ?? value)), 0) < 0 ? -1 : 1;
  let first = values[0]!;
  return measured.filter((_, k) => {
    if (k < 2) return false;
    const jump = (values[k - 1]! - values[k]!) * towards;
    const before = (values[k - 2]! - values[k]!) * towards;
    const after = (values[k - 1]! - (values[k + 1] ?? values[k]!)) * towards;
    const isRestart = half > 0 && jump > half && (Math.min(before, after) > half || values[k] === first);
    if (isRestart) first = values[k]!;
    return isRestart;
  });
}

const secondsOf = (clock: string): number => {
  const [hours, minutes, seconds] = clock.split(":").map(Number);
  return clock === "" ? Number.NaN : hours! * 3600 + minutes! * 60 + (seconds ?? 0);
};

/** The rows at which time leaps, compared with its usual step from sample to sample within the group. */
function timeGaps(rowIndices: readonly number[], clock: readonly string[] | null): ReadonlySet<number> {
  if (clock === null) return new Set();
  const times = rowIndices.map((i) => secondsOf(clock[i]!));
  const steps = times.slice(1).map((time, k) => Math.abs(time - times[k]!));
  const usual = steps.filter((step) => step > 0 && step < SHORTEST_GAP_S * 10);
  const usualStep = usual.length === 0 ? 0 : median(usual);
  const isGap = (step: number): boolean => step >= SHORTEST_GAP_S && step > 3 * usualStep;
  return new Set(rowIndices.filter((_, k) => k > 0 && isGap(steps[k - 1]!)));
}

function cutAt(rowIndices: readonly number[], cuts: ReadonlySet<number>): readonly (readonly number[])[] {
  const parts: number[][] = [[]];
  for (const i of rowIndices) {
    if (cuts.has(i)) parts.push([]);
    parts.at(-1)!.push(i);
  }
  return parts;
}

/** Splits the rows of a table into casts. */
export function splitCasts(rows: MeasuredRows): SplitRows {
  const keys = [rows.station && "station", rows.castName && "cast", rows.date && "date"].filter((key) => key !== null);
  const depths = rows.depthM ?? rows.seaPressureDbar ?? new Float64Array(rows.n);
  let hasNewLowering = false;
  const groups = groupByKeys(rows).flatMap((rowIndices) => {
    const restarts = restartsIn(rowIndices, depths);
    const gaps = restarts.length === 0 ? new Set<number>() : timeGaps(rowIndices, rows.clock);
    const cuts = new Set(restarts.filter((row) => keys.length === 0 || gaps.has(row)));
    const uncut = restarts.filter((row) => !cuts.has(row));
    hasNewLowering ||= cuts.size > 0;
    return cutAt(rowIndices, cuts).map((part): RowGroup => {
      const [first, last] = [part[0]!, part.at(-1)!];
      return {
        rowIndices: part,
        station: rows.station?.[first] || null,
        castName: rows.castName?.[first] || null,
        date: rows.date?.[first] || null,
        restartRows: uncut.filter((row) => row >= first && row <= last),
      };
    });
  });
  const parts = hasNewLowering ? [...keys, "depth starting over"] : keys;
  return { groups, splitBy: parts.length === 0 ? "nothing: the file is one cast" : listed(parts) };
}

const listed = (parts: readonly string[]): string =>
  parts.length < 2 ? parts.join("") : `${parts.slice(0, -1).join(", ")} and ${parts.at(-1)}`;
