/*
 * One scalar differential equation dy/dx = slope(x, y) from x0 to x1 by the three-stage Gauss-Legendre method (order 6;
 * Butcher 1964, Kuntzmann 1961), its stages solved by fixed-point iteration. Meant for slopes that depend weakly on y,
 * as density does on pressure: the iteration then gains four or more digits a round.
 */

const ROOT15 = Math.sqrt(15);
const C1 = 0.5 - ROOT15 / 10;
const C3 = 0.5 + ROOT15 / 10;
const A12 = 2 / 9 - ROOT15 / 15;
const A13 = 5 / 36 - ROOT15 / 30;
const A21 = 5 / 36 + ROOT15 / 24;
const A23 = 5 / 36 - ROOT15 / 24;
const A31 = 5 / 36 + ROOT15 / 30;
const A32 = 2 / 9 + ROOT15 / 15;

const MOST_ROUNDS_COUNT = 30;
const MOST_HALVINGS_COUNT = 20;

type Slope = (x: number, y: number) => number;

/** The increase of y over one step; NaN as soon as the slope is NaN. */
function gaussIncrease(slope: Slope, x0: number, y0: number, step: number): number {
  let k1 = slope(x0, y0);
  let k2 = k1;
  let k3 = k1;
  for (let round = 0; round < MOST_ROUNDS_COUNT; round++) {
    const next1 = slope(x0 + C1 * step, y0 + step * ((5 / 36) * k1 + A12 * k2 + A13 * k3));
    const next2 = slope(x0 + 0.5 * step, y0 + step * (A21 * k1 + (2 / 9) * k2 + A23 * k3));
    const next3 = slope(x0 + C3 * step, y0 + step * (A31 * k1 + A32 * k2 + (5 / 36) * k3));
    const change = Math.abs(next1 - k1) + Math.abs(next2 - k2) + Math.abs(next3 - k3);
    k1 = next1;
    k2 = next2;
    k3 = next3;
    if (!(change > 1e-14 * Math.abs(k2))) break;
  }
  return (step * (5 * k1 + 8 * k2 + 5 * k3)) / 18;
}

function refine(
  slope: Slope,
  x0: number,
  y0: number,
  step: number,
  whole: number,
  halvings: number,
  tolerance: number,
): number {
  const half = step / 2;
  const first = gaussIncrease(slope, x0, y0, half);
  const second = gaussIncrease(slope, x0 + half, y0 + first, half);
  const sum = first + second;
  if (!(Math.abs(sum - whole) > tolerance * Math.abs(sum)) || halvings >= MOST_HALVINGS_COUNT) return sum;
  return (
    refine(slope, x0, y0, half, first, halvings + 1, tolerance) +
    refine(slope, x0 + half, y0 + first, half, second, halvings + 1, tolerance)
  );
}

/**
 * y(x1), given y(x0) = y0. Steps are halved until a step and its two halves agree to `tolerance` of the increase; the
 * halves, which are kept, are then some sixty times closer to the truth. NaN in, NaN out.
 */
export function integrateOde(slope: Slope, x0: number, y0: number, x1: number, tolerance = 1e-9): number {
  const step = x1 - x0;
  if (step === 0) return y0;
  return y0 + refine(slope, x0, y0, step, gaussIncrease(slope, x0, y0, step), 0, tolerance);
}
