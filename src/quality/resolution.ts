/** A number in the unit of the quantity it belongs to: degC for temperature, 1 for practical salinity, m for depth. */
export type InOwnUnit = number;

const MOST_DECIMALS_COUNT = 4;

/** Two values closer than this are one value that went through a change of unit. */
const SAME: InOwnUnit = 1e-9;

/**
 * The step in which values were recorded: the last decimal place that any of them needs, or, after a change of unit or
 * with many decimals, the smallest difference between any two. 0 where nothing can be told.
 */
export function resolutionOf(values: Float64Array): InOwnUnit {
  const known = values.filter(Number.isFinite);
  for (let decimals = 0; decimals <= MOST_DECIMALS_COUNT; decimals++) {
    const perUnit = 10 ** decimals;
    const isWhole = (value: InOwnUnit): boolean =>
      Math.abs(value * perUnit - Math.round(value * perUnit)) < SAME * perUnit;
    if (known.every(isWhole)) return 1 / perUnit;
  }
  known.sort();
  let smallest = Number.POSITIVE_INFINITY;
  for (let k = 1; k < known.length; k++) {
    const step = known[k]! - known[k - 1]!;
    if (step > SAME && step < smallest) smallest = step;
  }
  return Number.isFinite(smallest) ? smallest : 0;
}
