import type { Evidence } from "./evidence.ts";
import type { QualityFlag } from "./quality-flag.ts";

/** Every reason a sample can be flagged or left out; the codes of the issues are made from these. */
export type CheckName =
  | "missing"
  | "above-surface"
  | "gross-range"
  | "freezing"
  | "stated-flag"
  | "stated-density-disagrees"
  | "duplicate"
  | "depth-jump"
  | "deck"
  | "soak"
  | "other-way"
  | "pressure-reversal"
  | "dry-sensor"
  | "spike"
  | "rate"
  | "flat-line"
  | "stuck-sensor"
  | "density-inversion"
  | "by-hand";

/** One thing that one check has to say about one sample. */
export interface Finding {
  readonly check: CheckName;
  readonly sampleIndex: number;
  /** Null: nothing is wrong with the sample, it only has no place in the column. */
  readonly flag: QualityFlag | null;
  /** Whether the preparation takes it out, whatever its flag. */
  readonly leftOut?: true;
  /** A plain sentence without its full stop. */
  readonly reason: string;
}

/** A check of samples against their neighbours; `order` are indices of samples, from the top down. */
export type NeighbourCheck = (evidence: Evidence, order: readonly number[]) => readonly Finding[];
