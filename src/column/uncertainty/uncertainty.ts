import type { SampleSalinity } from "../../cast/index.ts";

/**
 * Everything a pressure may be wrong by, each an error of its own, in the order of reports. Random errors are independent
 * from sample to sample; all others are one error along the whole cast.
 */
export const CONTRIBUTORS = [
  "temperature-random",
  "temperature-systematic",
  /** Of conductivity where salinity comes from it. */
  "salinity-random",
  "salinity-systematic",
  "sample-depth-random",
  "sample-depth-systematic",
  "depth-scale",
  "level-depth",
  "surface-gap",
  "bed-gap",
  "sampling",
  "gravity",
  "equation-of-state",
  "composition",
  "altitude",
] as const;

export type Contributor = (typeof CONTRIBUTORS)[number];

export const RANDOM_CONTRIBUTORS: readonly Contributor[] = [
  "temperature-random",
  "salinity-random",
  "sample-depth-random",
];

/**
 * Standard uncertainty (k = 1) of gauge pressure at some depths of a column, one entry a depth; NaN where the column has
 * no water. Plain data, so that it can be handed between threads.
 */
export interface Uncertainty {
  readonly n: number;
  readonly depthM: Float64Array;
  /** What each contributor makes alone. */
  readonly contributionKPa: Readonly<Record<Contributor, Float64Array>>;
  /** Root sum of squares of the random contributors. */
  readonly randomKPa: Float64Array;
  /** Root sum of squares of all others. */
  readonly systematicKPa: Float64Array;
  /** Root sum of squares of all. */
  readonly combinedKPa: Float64Array;
  /** Twice the combined: the pressure lies within it with about 95 %. */
  readonly expandedKPa: Float64Array;
  /** Of absolute pressure: combined, and the air pressure with it. */
  readonly absCombinedKPa: Float64Array;
  readonly sampling: SamplingError;
  readonly gaps: GapBounds;
  /** Where the cast has its salinity from: the salinity contributors are then of that. */
  readonly salinityFrom: SampleSalinity["source"];
}

/** How wrong the straight line between samples may be; the bound is what counts, as a rectangular distribution. */
export interface SamplingError {
  /** Monotone cubic less straight line (signed): what another smooth curve through the same samples would give. */
  readonly shapeKPa: Float64Array;
  /** No water whose density runs one way between each two samples can be off by more. */
  readonly boundKPa: Float64Array;
}

/** Water the probe did not sample, down to each depth: how much of it, and how far its weight may lie from what is held. */
export interface GapBounds {
  readonly surfaceGapM: Float64Array;
  readonly surfaceBoundKPa: Float64Array;
  readonly bedGapM: Float64Array;
  readonly bedBoundKPa: Float64Array;
}

/** The budget of one depth in words and numbers. */
export interface Budget {
  readonly depthM: number;
  readonly combinedKPa: number;
  readonly expandedKPa: number;
  /** By share of the variance, largest first; those that make nothing are left out. */
  readonly shares: readonly BudgetShare[];
  /** Which contributor dominates. */
  readonly sentence: string;
}

export interface BudgetShare {
  readonly name: Contributor;
  /** For people. */
  readonly words: string;
  readonly standardKPa: number;
  /** Of the variance; the shares of a budget sum to 1. */
  readonly shareFrac: number;
}

/** One thing that could be done, and what it would make of the uncertainty at a level. */
export interface Improvement {
  readonly kind: "sample" | "sensor";
  /** What to do, for people. */
  readonly words: string;
  /** Where the sample should be taken; null for a sensor. */
  readonly depthM: number | null;
  readonly combinedKPa: number;
  /** By how much the combined standard uncertainty falls, as a share of itself. */
  readonly gainFrac: number;
}

/** Pressures of many trials in which every error was drawn at random (JCGM 101:2008), one entry a depth. */
export interface MonteCarlo {
  readonly trialCount: number;
  readonly depthM: Float64Array;
  readonly meanKPa: Float64Array;
  readonly standardKPa: Float64Array;
  /** Between these lie 95 % of the trials: the 2.5 and 97.5 percentiles. */
  readonly lowKPa: Float64Array;
  readonly highKPa: Float64Array;
}
