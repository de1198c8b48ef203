import { powerOfTen } from "../../charts/layout/index.ts";
import {
  type DisplaySystem,
  displayUnit,
  formatNumber,
  formatQuantity,
  type ShownQuantity,
  type UnitSymbol,
  unitOf,
} from "../../units/index.ts";

/** The program's own unit of each quantity the page shows. */
const OWN_UNIT = {
  depth: "m",
  elevation: "m",
  head: "m",
  distance: "km",
  temperature: "degC",
  practicalSalinity: "1",
  density: "kg/m3",
  gaugePressure: "kPa",
  absolutePressure: "kPa",
  airPressure: "kPa",
  departure: "kPa",
  buoyancyFrequencySquared: "s-2",
} as const satisfies Partial<Record<ShownQuantity, UnitSymbol>>;

export type PageQuantity = keyof typeof OWN_UNIT;

export const ownUnit = (quantity: PageQuantity): UnitSymbol => OWN_UNIT[quantity];

/** "kg/m³" or "lb/ft³"; empty for salinity. */
export const unitLabel = (quantity: PageQuantity, system: DisplaySystem): string =>
  unitOf(displayUnit(quantity, system).unit).label;

/** A value in the program's own unit as the page writes it, without its unit. */
export const shownNumber = (value: number, quantity: PageQuantity, system: DisplaySystem): string =>
  quantity === "buoyancyFrequencySquared"
    ? scientific(value)
    : formatQuantity(value, OWN_UNIT[quantity], quantity, system);

const NO_BREAK_SPACE = "\u00a0";

/** As `shownNumber`, with the unit. */
export function shownValue(value: number, quantity: PageQuantity, system: DisplaySystem): string {
  const number = shownNumber(value, quantity, system);
  const unit = unitLabel(quantity, system);
  return Number.isNaN(value) || unit === "" ? number : `${number}${NO_BREAK_SPACE}${unit}`;
}

/** @example shownPercent(-0.0123) // "−1.230" */
export const shownPercent = (fraction: number): string => formatNumber(fraction * 100, { digitsCount: 3 });

/** @example scientific(0.00245) // "2.45×10⁻³" */
export function scientific(value: number): string {
  if (!Number.isFinite(value) || value === 0) return formatNumber(value, { digitsCount: 0 });
  const [mantissa, exponent] = value.toExponential(2).split("e") as [string, string];
  return `${formatNumber(Number(mantissa), { digitsCount: 2 })}×${powerOfTen(Number(exponent))}`;
}
