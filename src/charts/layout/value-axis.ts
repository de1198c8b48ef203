import { scaleLinear, scaleLog } from "d3-scale";
import { labelWidthPx } from "./text-width.ts";

export interface ValueTick {
  readonly xPx: number;
  readonly label: string;
  readonly anchor: "start" | "middle" | "end";
}

/** A horizontal axis of one panel, in whatever unit is shown. */
export interface ValueAxis {
  readonly kind: "linear" | "log";
  readonly from: number;
  readonly to: number;
  readonly leftPx: number;
  readonly rightPx: number;
  readonly ticks: readonly ValueTick[];
}

type Frame = Pick<ValueAxis, "leftPx" | "rightPx">;

const LEAST_SPACE_PX = 10;
const MOST_DECADES = 5;
const PX_PER_TICK = 38;
/** Ends are rounded to eighths of the range or so, however few ticks there is room for. */
const ROUNDING_COUNT = 8;

/** Where a value stands on an axis; NaN where it has no place, as a negative number on a log axis. */
export function valuePx(axis: ValueAxis, value: number): number {
  const along =
    axis.kind === "log"
      ? Math.log(value / axis.from) / Math.log(axis.to / axis.from)
      : (value - axis.from) / (axis.to - axis.from);
  return axis.leftPx + along * (axis.rightPx - axis.leftPx);
}

function extentOf(arrays: Iterable<ArrayLike<number>>, keep: (value: number) => boolean): [number, number] | null {
  let least = Number.POSITIVE_INFINITY;
  let most = Number.NEGATIVE_INFINITY;
  for (const values of arrays)
    for (let i = 0; i < values.length; i++) {
      const value = values[i]!;
      if (!keep(value)) continue;
      if (value < least) least = value;
      if (value > most) most = value;
    }
  return least <= most ? [least, most] : null;
}

/** The most ticks that fit without touching; the two at the ends stay inside the frame. */
function fittingTicks(
  axis: Omit<ValueAxis, "ticks">,
  candidates: readonly (readonly [number, string])[][],
): ValueTick[] {
  for (const candidate of candidates) {
    const ticks = candidate.map(([value, label]) => placed(axis, value, label));
    if (ticks.length > 1 && !ticks.some((tick, i) => i > 0 && touches(ticks[i - 1]!, tick))) return ticks;
  }
  return (candidates.at(-1) ?? []).slice(0, 1).map(([value, label]) => placed(axis, value, label));
}

function placed(axis: Omit<ValueAxis, "ticks">, value: number, label: string): ValueTick {
  const xPx = valuePx({ ...axis, ticks: [] }, value);
  const half = labelWidthPx(label) / 2;
  const anchor = xPx - half < axis.leftPx ? "start" : xPx + half > axis.rightPx ? "end" : "middle";
  return { xPx, label, anchor };
}

function touches(left: ValueTick, right: ValueTick): boolean {
  const reach = { start: 1, middle: 0.5, end: 0 } as const;
  const leftEndPx = left.xPx + labelWidthPx(left.label) * reach[left.anchor];
  const rightStartPx = right.xPx - labelWidthPx(right.label) * (1 - reach[right.anchor]);
  return leftEndPx + LEAST_SPACE_PX > rightStartPx;
}

/** An axis from the least to the most of the values, widened to whole ticks. */
export function linearAxis(arrays: Iterable<ArrayLike<number>>, frame: Frame, withZero = false): ValueAxis {
  const found = extentOf(arrays, Number.isFinite) ?? [0, 1];
  let [least, most] = withZero ? [Math.min(0, found[0]), Math.max(0, found[1])] : found;
  if (least === most) [least, most] = least === 0 ? [0, 1] : [least - 0.5, most + 0.5];
  const mostTicksCount = Math.max(2, Math.floor((frame.rightPx - frame.leftPx) / PX_PER_TICK));
  const scale = scaleLinear().domain([least, most]).nice(ROUNDING_COUNT);
  const [from, to] = scale.domain() as [number, number];
  const axis = { kind: "linear" as const, from, to, ...frame };
  const candidates = Array.from({ length: mostTicksCount }, (_, k) => mostTicksCount - k).map((count) => {
    const format = scale.tickFormat(count, "f");
    return scale.ticks(count).map((value) => [value, format(value)] as const);
  });
  return {
    ...axis,
    ticks: fittingTicks(axis, [
      ...candidates,
      [from, to].map((v) => [v, scale.tickFormat(ROUNDING_COUNT, "f")(v)] as const),
    ]),
  };
}

const SUPERSCRIPT: Readonly<Record<string, string>> = {
  "-": "⁻",
  "0": "⁰",
  "1": "¹",
  "2": "²",
  "3": "³",
  "4": "⁴",
  "5": "⁵",
  "6": "⁶",
  "7": "⁷",
  "8": "⁸",
  "9": "⁹",
};

/** @example powerOfTen(-4) // "10⁻⁴" */
export const powerOfTen = (exponent: number): string =>
  `10${[...String(exponent)].map((character) => SUPERSCRIPT[character]).join("")}`;

/** A log axis of whole decades, at most five below the largest value: what lies lower is marked at the edge. */
export function logAxis(arrays: Iterable<ArrayLike<number>>, frame: Frame): ValueAxis {
  const [least, most] = extentOf(arrays, (value) => value > 0 && Number.isFinite(value)) ?? [1e-5, 1e-1];
  const top = Math.max(Math.ceil(Math.log10(most)), Math.floor(Math.log10(least)) + 1);
  const bottom = Math.max(Math.floor(Math.log10(least)), top - MOST_DECADES);
  const axis = { kind: "log" as const, from: 10 ** bottom, to: 10 ** top, ...frame };
  const decades = scaleLog()
    .domain([axis.from, axis.to])
    .ticks(top - bottom)
    .filter(isDecade);
  const candidates = [1, 2, 3, 5].map((step) =>
    decades
      .filter((_, k) => k % step === 0)
      .map((value) => [value, powerOfTen(Math.round(Math.log10(value)))] as const),
  );
  return { ...axis, ticks: fittingTicks(axis, candidates) };
}

const isDecade = (value: number): boolean => Math.abs(Math.log10(value) - Math.round(Math.log10(value))) < 1e-9;
