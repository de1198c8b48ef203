/** What kind of water the user says it is; it narrows the ranges that pass without remark. */
export type WaterKind = "any" | "fresh" | "estuary" | "sea";

/** How raw casts become samples that a column can stand on. */
export interface Preparation {
  /**
   * Which part of a lowering is used: on the way down, on the way up, or every sample. `auto` takes one way of a raw
   * record and leaves a file that is already clean as it is.
   */
  readonly way: "auto" | "down" | "up" | "all";
  /** Thickness of the bins that good samples are averaged in; null: samples stay as measured. */
  readonly binM: number | null;
  readonly waterKind: WaterKind;
}

export const defaultPreparation: Preparation = { way: "auto", binM: null, waterKind: "any" };
