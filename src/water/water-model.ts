/** The water models a basis can name. A constant density carries its number. */
export type WaterChoice =
  | { readonly id: "teos10" | "exact" | "limnological" | "eos80" }
  | { readonly id: "constant"; readonly rhoKgM3: number };

export type WaterModelId = WaterChoice["id"];

/**
 * One interface for every equation of state. A model says in which salinity and temperature it thinks; those two are
 * what runs linearly between samples, and what `density` takes.
 */
export interface WaterModel {
  readonly id: WaterModelId;
  /** For people: the name of the standard or paper. */
  readonly label: string;
  /** "absolute" in g/kg (TEOS-10), "practical" on PSS-78. */
  readonly salinityScale: "absolute" | "practical";
  /** "conservative" (TEOS-10) or "in-situ", both ITS-90 in degC. */
  readonly temperatureScale: "conservative" | "in-situ";
  /** Density in kg/m3; salinity and temperature on the model's own scales, sea pressure in dbar. NaN in, NaN out. */
  density(salinity: number, tempC: number, seaPressureDbar: number): number;
  /** Whether the formula's source vouches for it at this salinity, in-situ temperature and sea pressure. */
  isWithinRange(salinity: number, inSituTempC: number, seaPressureDbar: number): boolean;
  /** The range in words, for messages. */
  readonly range: string;
}
