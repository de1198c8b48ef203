/** The value a share of the way along a pair: between them to the last digit, and exactly either at 0 and 1. */
export function partWay([first, second]: readonly [number, number], shareFrac: number): number {
  const step = second - first;
  return shareFrac < 0.5 ? first + shareFrac * step : second - (1 - shareFrac) * step;
}
