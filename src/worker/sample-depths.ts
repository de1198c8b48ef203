import type { Cast } from "../cast/index.ts";
import type { Column, SolvedCast } from "../survey/index.ts";

const coordinateOf = ({ samples }: Cast, coordinate: Column["coordinate"]): Float64Array =>
  (coordinate === "pressure" ? samples.seaPressureDbar : samples.depthM) ??
  samples.depthM ??
  samples.seaPressureDbar ??
  new Float64Array(samples.n).fill(Number.NaN);

/**
 * Depth below the water surface of every sample as read, m, on the column's own depth axis: between the samples that the
 * column stands on it follows them, beyond their ends it keeps their ratio. Without a column the record is taken as it is.
 */
export function sampleDepthsM({ cast, prepared, solution }: SolvedCast): Float64Array {
  const coordinate = coordinateOf(cast, solution?.column.coordinate ?? "depth");
  if (!solution) return coordinate.slice();
  const { sampleIndex, depthM, n } = solution.column;
  const preparedCoordinate = coordinateOf(prepared.cast, solution.column.coordinate);
  const knots = Float64Array.from(sampleIndex, (sample) => preparedCoordinate[sample]!);
  const along = (value: number): number => {
    if (value <= knots[0]!) return knots[0]! === 0 ? depthM[0]! : (value * depthM[0]!) / knots[0]!;
    if (value >= knots[n - 1]!) return (value * depthM[n - 1]!) / knots[n - 1]!;
    let low = 0;
    let high = n - 1;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (knots[middle]! <= value) low = middle;
      else high = middle;
    }
    const share = (value - knots[low]!) / (knots[high]! - knots[low]!);
    return depthM[low]! + share * (depthM[high]! - depthM[low]!);
  };
  return coordinate.map(along);
}
