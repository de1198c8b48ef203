/**
 * Numbers that stand for "not measured": told from the column they stand in, never from a list alone. A number that
 * could be one (nines, a usual fill) is one when it lies far outside the rest of its column or of all water; any other
 * number is one when no water shows it and it comes again and again.
 */
import { MEASURED, type MeasuredRole } from "./roles.ts";

export interface Sentinels {
  /** Values as written in the file, before any conversion. */
  readonly found: ReadonlySet<number>;
  /** Negative nines that the rest of the column makes likely to be measured. */
  readonly kept: ReadonlySet<number>;
}

/** -9, 99, -999.99, 9999.9 ...: all nines, at least two of them unless negative. */
const NINES: ReadonlySet<number> = new Set(
  [1, 2, 3, 4, 5, 6].flatMap((wholeCount) =>
    [0, 1, 2, 3, 4, 5, 6].flatMap((decimalCount) => {
      const digits = "9".repeat(wholeCount);
      const value = Number(decimalCount === 0 ? digits : `${digits}.${"9".repeat(decimalCount)}`);
      return wholeCount === 1 ? [-value] : [value, -value];
    }),
  ),
);

/** The least 16-bit integer, and its mirror. */
const OTHER_FILLS: ReadonlySet<number> = new Set([-32768, 32767, -8888, -7777]);

/** 1e35, 9.96921e36, -9.99e-29: no instrument resolves such numbers. */
const isBeyondAll = (value: number): boolean => {
  const size = Math.abs(value);
  return size >= 1e20 || (size > 0 && size < 1e-20);
};

const couldBeFill = (value: number): boolean => NINES.has(value) || OTHER_FILLS.has(value) || isBeyondAll(value);

/** A number that is no water is believed to be a fill from this many on. */
const REPEATED = 3;
/** How far outside the rest of the column, in spans of that rest, a fill has to lie that could be water. */
const FAR_SPANS = 3;

interface Rest {
  least: number;
  most: number;
}

function isFarOutside(value: number, rest: Rest, role: MeasuredRole): boolean {
  const { kind, possible } = MEASURED[role];
  const [leastPossible, mostPossible] = possible;
  if (isBeyondAll(value) || value < leastPossible || value > mostPossible) return true;
  const { least, most } = rest;
  if (least > most) return false;
  if (value < 0 && least > value / 2) return true;
  const gap = Math.max(least - value, value - most);
  const usualSpan = kind === "angle" ? 1 : Math.abs(most) / 10;
  return gap > FAR_SPANS * Math.max(most - least, usualSpan);
}

const NONE: Sentinels = { found: new Set(), kept: new Set() };

/** @param values a column as written, NaN where nothing stands */
export function findSentinels(values: ArrayLike<number>, role: MeasuredRole): Sentinels {
  const { possible } = MEASURED[role];
  const counts = new Map<number, number>();
  const rest: Rest = { least: Number.POSITIVE_INFINITY, most: Number.NEGATIVE_INFINITY };
  for (let i = 0; i < values.length; i++) {
    const value = values[i]!;
    if (value < possible[0] || value > possible[1] || couldBeFill(value)) {
      counts.set(value, (counts.get(value) ?? 0) + 1);
    } else if (!Number.isNaN(value)) {
      if (value < rest.least) rest.least = value;
      if (value > rest.most) rest.most = value;
    }
  }
  if (counts.size === 0) return NONE;
  const found = new Set<number>();
  const kept = new Set<number>();
  for (const [value, count] of counts) {
    if (couldBeFill(value) ? isFarOutside(value, rest, role) : count >= REPEATED) found.add(value);
    else if (value < 0 && NINES.has(value)) kept.add(value);
  }
  return { found, kept };
}
