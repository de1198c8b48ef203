/** What a unit measures. Two units convert into each other when, and only when, their kinds are equal. */
export type QuantityKind =
  | "length"
  | "pressure"
  | "temperature"
  | "conductivity"
  | "density"
  | "salinity"
  | "force"
  | "forcePerLength"
  | "moment"
  | "fraction"
  | "angle"
  | "time"
  | "perTimeSquared";

/** value in the base unit of the kind = (value - offset) * factor */
export interface UnitShape {
  readonly kind: QuantityKind;
  readonly symbol: string;
  /** As shown to people: "°C" where the symbol is "degC". */
  readonly label: string;
  readonly factor: number;
  /** What this unit reads where the base unit reads zero. */
  readonly offset: number;
  /** Other spellings, in the case people write them; matched exactly first, then without regard to case. */
  readonly aliases: readonly string[];
}
