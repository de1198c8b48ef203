/**
 * Samples in order of depth, gathered in bins centred on whole multiples of the thickness; empty bins do not appear. The
 * depth of a bin is later the mean depth of its samples and not its centre, because that is where the mean water was.
 */
export function depthBins(
  depthM: Float64Array,
  order: readonly number[],
  binM: number,
): readonly (readonly number[])[] {
  const bins = new Map<number, number[]>();
  for (const i of order) {
    const binIndex = Math.round(depthM[i]! / binM);
    const bin = bins.get(binIndex);
    if (bin) bin.push(i);
    else bins.set(binIndex, [i]);
  }
  return [...bins.values()];
}
