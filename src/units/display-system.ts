/** In which unit, and to how many digits, each quantity is shown under the SI | US switch. Inside the program nothing changes. */
import { convert } from "./convert.ts";
import { formatNumber, type NumberFormat } from "./format-number.ts";
import type { UnitSymbol } from "./unit-table.ts";

export type DisplaySystem = "SI" | "US";

export interface DisplayUnit {
  readonly unit: UnitSymbol;
  readonly digitsCount: number;
}

const shown = (unit: UnitSymbol, digitsCount: number): DisplayUnit => ({ unit, digitsCount });

/**
 * Digits by what a good probe resolves: a centimetre of depth is 0.1 kPa and 0.03 ft. The US column keeps about the same
 * resolution, never less. Head is of the water named beside it, so it is a length.
 */
const DISPLAY = {
  depth: { SI: shown("m", 2), US: shown("ft", 2) },
  elevation: { SI: shown("m", 2), US: shown("ft", 2) },
  head: { SI: shown("m", 3), US: shown("ft", 3) },
  distance: { SI: shown("km", 1), US: shown("mi", 1) },
  temperature: { SI: shown("degC", 2), US: shown("degF", 2) },
  practicalSalinity: { SI: shown("1", 2), US: shown("1", 2) },
  absoluteSalinity: { SI: shown("g/kg", 3), US: shown("g/kg", 3) },
  conductivity: { SI: shown("mS/cm", 3), US: shown("mS/cm", 3) },
  density: { SI: shown("kg/m3", 2), US: shown("lb/ft3", 3) },
  buoyancyFrequencySquared: { SI: shown("s-2", 5), US: shown("s-2", 5) },
  seaPressure: { SI: shown("kPa", 2), US: shown("psi", 3) },
  gaugePressure: { SI: shown("kPa", 2), US: shown("psi", 3) },
  absolutePressure: { SI: shown("kPa", 2), US: shown("psi", 3) },
  airPressure: { SI: shown("kPa", 2), US: shown("psi", 3) },
  departure: { SI: shown("kPa", 3), US: shown("psi", 4) },
  force: { SI: shown("kN", 1), US: shown("kip", 2) },
  forcePerLength: { SI: shown("kN/m", 1), US: shown("kip/ft", 2) },
  moment: { SI: shown("kN m", 1), US: shown("kip ft", 1) },
} as const satisfies Readonly<Record<string, Readonly<Record<DisplaySystem, DisplayUnit>>>>;

export type ShownQuantity = keyof typeof DISPLAY;

export const displayUnit = (quantity: ShownQuantity, system: DisplaySystem): DisplayUnit => DISPLAY[quantity][system];

/**
 * A value for the screen, without its unit: `unitOf(displayUnit(quantity, system).unit).label` names that.
 * @param from the unit the value is in, as it comes from the program
 * @example formatQuantity(1025.2, "kg/m3", "density", "US") // "64.002"
 */
export function formatQuantity(
  value: number,
  from: UnitSymbol,
  quantity: ShownQuantity,
  system: DisplaySystem,
  grouping: NonNullable<NumberFormat["grouping"]> = "none",
): string {
  const { unit, digitsCount } = displayUnit(quantity, system);
  return formatNumber(convert(value, from, unit), { digitsCount, grouping });
}
