/**
 * Polynomials of degree seven or less, stored as eight coefficients from the lowest power up, starting anywhere in an
 * array. Written out, because a loop over the coefficients is slower.
 */

type Coefficients = readonly number[];

/** Value at x of the polynomial whose coefficients start at index i of c. */
export function valueAt(c: Coefficients, x: number, i = 0): number {
  const top = c[i + 4]! + x * (c[i + 5]! + x * (c[i + 6]! + x * c[i + 7]!));
  return c[i]! + x * (c[i + 1]! + x * (c[i + 2]! + x * (c[i + 3]! + x * top)));
}

/** First derivative at x. */
export function slopeAt(c: Coefficients, x: number, i = 0): number {
  const top = 4 * c[i + 4]! + x * (5 * c[i + 5]! + x * (6 * c[i + 6]! + x * (7 * c[i + 7]!)));
  return c[i + 1]! + x * (2 * c[i + 2]! + x * (3 * c[i + 3]! + x * top));
}

/** Second derivative at x. */
export function curvatureAt(c: Coefficients, x: number, i = 0): number {
  const top = 20 * c[i + 5]! + x * (30 * c[i + 6]! + x * (42 * c[i + 7]!));
  return 2 * c[i + 2]! + x * (6 * c[i + 3]! + x * (12 * c[i + 4]! + x * top));
}
