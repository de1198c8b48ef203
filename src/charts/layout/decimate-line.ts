export type Point = readonly [xPx: number, yPx: number];

/**
 * A line drawn with no more points than the screen can tell apart: of the points that fall into one row of pixels the
 * first, the leftmost, the rightmost and the last, in their own order. The drawn line covers the same pixels.
 * @param rowPx height of a row; larger is coarser
 */
export function decimateLine(points: readonly Point[], rowPx = 1): readonly Point[] {
  const kept: Point[] = [];
  let start = 0;
  while (start < points.length) {
    const row = Math.floor(points[start]![1] / rowPx);
    let end = start + 1;
    let left = start;
    let right = start;
    while (end < points.length && Math.floor(points[end]![1] / rowPx) === row) {
      if (points[end]![0] < points[left]![0]) left = end;
      if (points[end]![0] > points[right]![0]) right = end;
      end++;
    }
    const ends = [start, Math.min(left, right), Math.max(left, right), end - 1];
    ends.forEach((index, k) => {
      if (k === 0 || index !== ends[k - 1]) kept.push(points[index]!);
    });
    start = end;
  }
  return kept;
}
