import { area, line } from "d3-shape";
import { decimateLine, type Point } from "./decimate-line.ts";
import { type DepthAxis, depthPx } from "./depth-axis.ts";
import type { CurveInput, CurveLayout } from "./sheet.ts";
import { type ValueAxis, valuePx } from "./value-axis.ts";

const asPath = line<Point>().digits(1);
const pathOf = (pieces: readonly (readonly Point[])[]): string => pieces.map((piece) => asPath(piece) ?? "").join("");

interface CurveFrame {
  readonly axis: ValueAxis;
  readonly depth: DepthAxis;
  readonly isStepped: boolean;
  /** Height of the rows that a long curve is thinned to. */
  readonly rowPx: number;
}

/** A curve as paths. A log axis shows no value below its lower end: such stretches become marks along the left edge. */
export function layOutCurve(curve: CurveInput, frame: CurveFrame): CurveLayout {
  const { firstSampleIndex: first, lastSampleIndex: last } = curve;
  const { castId, colourIndex, isInHand } = curve;
  const lay = frame.isStepped ? steppedPieces : joinedPieces;
  const solid = lay(curve, frame, first, last);
  const dotted = [
    ...(first > 0 ? lay(curve, frame, 0, first) : []),
    ...(last < curve.depths.length - 1 ? lay(curve, frame, last, curve.depths.length - 1) : []),
  ];
  const thinned = solid.map((piece) => decimateLine(piece, frame.rowPx));
  const edge = (belongs: (value: number) => boolean): string =>
    frame.axis.kind === "log" ? edgePath(curve, frame, belongs) : "";
  return {
    castId,
    colourIndex,
    isInHand,
    bandPath: bandPath(curve, frame),
    solidPath: pathOf(thinned),
    dottedPath: pathOf(dotted),
    lowPath: edge((value) => value >= 0 && value < frame.axis.from),
    negativePath: edge((value) => value < 0),
    points: thinned.flat(),
  };
}

/** A row of a band: its depth, and the two values it lies between. */
type Span = readonly [yPx: number, fromPx: number, toPx: number];

const asBand = area<Span>()
  .y(([yPx]) => yPx)
  .x0(([, fromPx]) => fromPx)
  .x1(([, , toPx]) => toPx)
  .digits(1);

/** Rows closer than this cannot be told apart at the edge of a band. */
const BAND_ROW_PX = 1;

function bandPath({ depths, values, halfWidths }: CurveInput, { axis, depth }: CurveFrame): string {
  if (halfWidths === null) return "";
  const spans: Span[] = [];
  for (let i = 0; i < depths.length; i++) {
    const yPx = depthPx(depth, depths[i]!);
    const [fromPx, toPx] = [valuePx(axis, values[i]! - halfWidths[i]!), valuePx(axis, values[i]! + halfWidths[i]!)];
    const isLast = i === depths.length - 1;
    const isFar = spans.length === 0 || yPx - spans.at(-1)![0] >= BAND_ROW_PX;
    if (Number.isFinite(fromPx + toPx) && (isFar || isLast)) spans.push([yPx, fromPx, toPx]);
  }
  return asBand(spans) ?? "";
}

/** Straight lines from row to row, broken where a value is missing. */
function joinedPieces(curve: CurveInput, frame: CurveFrame, from: number, to: number): Point[][] {
  const pieces: Point[][] = [[]];
  for (let i = from; i <= to; i++) {
    const xPx = valuePx(frame.axis, curve.values[i]!);
    if (Number.isFinite(xPx)) pieces.at(-1)!.push([xPx, depthPx(frame.depth, curve.depths[i]!)]);
    else if (pieces.at(-1)!.length > 0) pieces.push([]);
  }
  return pieces.filter((piece) => piece.length > 0);
}

/** Each value from its row down to the next. */
function steppedPieces(curve: CurveInput, frame: CurveFrame, from: number, to: number): Point[][] {
  const pieces: Point[][] = [[]];
  for (let i = from; i < to; i++) {
    const value = curve.values[i]!;
    const shown = Number.isFinite(value) && (frame.axis.kind === "linear" || value >= frame.axis.from);
    if (shown) {
      const xPx = valuePx(frame.axis, value);
      pieces
        .at(-1)!
        .push([xPx, depthPx(frame.depth, curve.depths[i]!)], [xPx, depthPx(frame.depth, curve.depths[i + 1]!)]);
    } else if (pieces.at(-1)!.length > 0) pieces.push([]);
  }
  return pieces.filter((piece) => piece.length > 0);
}

function edgePath(curve: CurveInput, { axis, depth }: CurveFrame, belongs: (value: number) => boolean): string {
  const runs: Point[][] = [];
  let below = false;
  for (let i = curve.firstSampleIndex; i < curve.lastSampleIndex; i++) {
    const here = belongs(curve.values[i]!);
    if (here && !below) runs.push([[axis.leftPx, depthPx(depth, curve.depths[i]!)]]);
    if (!here && below) runs.at(-1)!.push([axis.leftPx, depthPx(depth, curve.depths[i]!)]);
    below = here;
  }
  if (below) runs.at(-1)!.push([axis.leftPx, depthPx(depth, curve.depths[curve.lastSampleIndex]!)]);
  return pathOf(runs);
}
