/** A peak of the buoyancy frequency squared. */
export interface Peak {
  /** Of the first of its highest values. */
  readonly peakIndex: number;
  readonly prominencePerS2: number;
}

/**
 * The peaks of a profile, from the surface, with how far each stands above the higher of the two troughs that part it
 * from higher ground; above the surface and below the bottom the ground is at zero. Of equally high ones the uppermost
 * counts as the highest.
 * @param squaredPerS2 not negative
 */
export function peaksOf(squaredPerS2: Float64Array): readonly Peak[] {
  const peaks: Peak[] = [];
  squaredPerS2.forEach((height, peakIndex) => {
    const rises = height > (squaredPerS2[peakIndex - 1] ?? 0);
    const falls = height >= (squaredPerS2[peakIndex + 1] ?? 0);
    if (!rises || !falls) return;
    const trough = Math.max(troughTowards(squaredPerS2, peakIndex, -1), troughTowards(squaredPerS2, peakIndex, 1));
    peaks.push({ peakIndex, prominencePerS2: height - trough });
  });
  return peaks;
}

/** The lowest value between a peak and higher ground in one direction. */
function troughTowards(values: Float64Array, peakIndex: number, direction: 1 | -1): number {
  const height = values[peakIndex]!;
  let lowest = height;
  for (let i = peakIndex + direction; i >= 0 && i < values.length; i += direction) {
    const ground = values[i]!;
    if (ground > height || (direction < 0 && ground === height)) return lowest;
    lowest = Math.min(lowest, ground);
  }
  return 0;
}
