import { extent } from "d3-array";
import { scaleLinear } from "d3-scale";
import { powerOfTen } from "./power-of-ten.ts";
import { labelWidthPx } from "./text-width.ts";

interface ValueTick {
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

/** Between two labels; the second only where one label would be left otherwise. */
const SPACES_PX = [12, 5];
const MOST_DECADES = 5;
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

/** Least and most of the values in some arrays that `keep` lets through; null where there are none. */
function extentOf(arrays: Iterable<Float64Array>, keep: (value: number) => boolean): readonly [number, number] | null {
  const ends = Array.from(arrays, (values) => extent(values, (value) => (keep(value) ? value : Number.NaN)));
  const [least, most] = extent(ends.flat(), (end) => end);
  return least === undefined ? null : [least, most];
}

/** The most ticks that fit without touching; the two at the ends stay inside the frame. */
function fittingTicks(
  axis: Omit<ValueAxis, "ticks">,
  candidates: readonly (readonly [number, string])[][],
): ValueTick[] {
  for (const spacePx of SPACES_PX)
    for (const candidate of candidates) {
      const ticks = candidate.map(([value, label]) => placed(axis, value, label));
      if (ticks.length > 1 && ticks.every((tick, i) => i === 0 || isClear(ticks[i - 1]!, tick, spacePx))) return ticks;
    }
  return (candidates.at(-1) ?? []).slice(0, 1).map(([value, label]) => placed(axis, value, label));
}

function placed(axis: Omit<ValueAxis, "ticks">, value: number, label: string): ValueTick {
  const xPx = valuePx({ ...axis, ticks: [] }, value);
  const half = labelWidthPx(label) / 2;
  const anchor = xPx - half < axis.leftPx ? "start" : xPx + half > axis.rightPx ? "end" : "middle";
  return { xPx, label, anchor };
}

function isClear(left: ValueTick, right: ValueTick, spacePx: number): boolean {
  const reach = { start: 1, middle: 0.5, end: 0 } as const;
  const leftEndPx = left.xPx + labelWidthPx(left.label) * reach[left.anchor];
  const rightStartPx = right.xPx - labelWidthPx(right.label) * (1 - reach[right.anchor]);
  return leftEndPx + spacePx <= rightStartPx;
}

/** An axis from the least to the most of the values, widened to whole ticks. */
export function linearAxis(arrays: Iterable<Float64Array>, frame: Frame, withZero = false): ValueAxis {
  const found = extentOf(arrays, Number.isFinite) ?? [0, 1];
  let [least, most] = withZero ? [Math.min(0, found[0]), Math.max(0, found[1])] : found;
  if (least === most) [least, most] = least === 0 ? [0, 1] : [least - 0.5, most + 0.5];
  const scale = scaleLinear().domain([least, most]).nice(ROUNDING_COUNT);
  const [from, to] = scale.domain() as [number, number];
  const axis = { kind: "linear" as const, from, to, ...frame };
  const candidates = Array.from({ length: ROUNDING_COUNT }, (_, k) => ROUNDING_COUNT - k).map((count) => {
    const format = scale.tickFormat(count, "f");
    return scale.ticks(count).map((value) => [value, format(value)] as const);
  });
  return { ...axis, ticks: fittingTicks(axis, candidates) };
}

/** A log axis of whole decades, at most five below the largest value: what lies lower is marked at the edge. */
export function logAxis(arrays: Iterable<Float64Array>, frame: Frame): ValueAxis {
  const [least, most] = extentOf(arrays, (value) => value > 0 && Number.isFinite(value)) ?? [1e-5, 1e-1];
  const top = Math.max(Math.ceil(Math.log10(most)), Math.floor(Math.log10(least)) + 1);
  const bottom = Math.max(Math.floor(Math.log10(least)), top - MOST_DECADES);
  const axis = { kind: "log" as const, from: 10 ** bottom, to: 10 ** top, ...frame };
  const exponents = Array.from({ length: top - bottom + 1 }, (_, k) => bottom + k);
  const candidates = [1, 2, 3, 5].map((step) =>
    exponents.filter((_, k) => k % step === 0).map((exponent) => [10 ** exponent, powerOfTen(exponent)] as const),
  );
  return { ...axis, ticks: fittingTicks(axis, candidates) };
}
