export type LevelId = string & { readonly levelId: unique symbol };

/** A depth the user cares about: an instrument, an intake centreline. It stays put while casts change. */
export interface Level {
  readonly id: LevelId;
  readonly name: string;
  /** Below the water surface. */
  readonly depthM: number;
}
