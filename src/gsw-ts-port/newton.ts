const MOST_STEPS = 12;

/**
 * Newton's method. Each step doubles the digits, so that the root is as good as rounding allows once a step falls to
 * the square root of that.
 *
 * @param start first guess
 * @param lastStep size of a step after which the next would change nothing
 * @param step function value over slope at a guess
 * @returns the root; NaN when a step is NaN
 */
export function newton(start: number, lastStep: number, step: (guess: number) => number): number {
  let root = start;
  for (let count = 0; count < MOST_STEPS; count++) {
    const change = step(root);
    root -= change;
    if (!(Math.abs(change) > lastStep)) break;
  }
  return root;
}
