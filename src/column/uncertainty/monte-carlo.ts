import { ToolError } from "../../base/index.ts";
import { type Cast, sampleSalinity } from "../../cast/index.ts";
import type { Column } from "../column.ts";
import { surfaceGravityMs2 } from "../gravity.ts";
import { KPA_PER_DBAR } from "../kilopascal.ts";
import { nodesAtDepths } from "../nodes.ts";
import { MeasuredAnew } from "./measured-anew.ts";
import { SeededDeviates } from "./seeded-deviates.ts";
import type { MonteCarlo, Uncertainty } from "./uncertainty.ts";
import { uncertaintyAtDepths } from "./uncertainty-of.ts";

export interface MonteCarloOptions {
  readonly trialCount: number;
  /** Any whole number; the same gives the same trials. */
  readonly seedIndex: number;
  /** Of levels, below the water surface. */
  readonly depthsM: ArrayLike<number>;
  /** Told now and then which share of the trials is done. */
  readonly onShare?: (doneFrac: number) => void;
}

/**
 * Propagates distributions by drawing (JCGM 101:2008): systematic errors once a trial, random ones once a sample, the
 * integral anew each time. Errors are normal but for gaps, which are anywhere between what is held and their bound, and
 * for the water between samples, which is anywhere within its bound. It shares with the first-order uncertainty what is
 * assumed, and differs in what follows: nothing is a straight line in density or depth, and samples keep their order.
 * Gaps make the mean differ from the column's pressure, which holds the gap at one end of what it may be.
 * @param cast the one the column was made of
 */
export function monteCarlo(column: Column, cast: Cast, options: MonteCarloOptions): MonteCarlo {
  const { trialCount, seedIndex, onShare } = options;
  if (!(Number.isInteger(trialCount) && trialCount >= 2))
    throw new ToolError("DomainError", `trialCount is ${trialCount}, expected a whole number from 2`);
  const depthM = Float64Array.from(options.depthsM);
  const pressuresKPa = Array.from(depthM, () => new Float64Array(trialCount));
  const trials = new Trials(column, cast, depthM, new SeededDeviates(seedIndex));
  const drawnKPa = new Float64Array(depthM.length);
  const every = Math.ceil(trialCount / 100);
  for (let trial = 0; trial < trialCount; trial++) {
    trials.drawInto(drawnKPa);
    for (let i = 0; i < drawnKPa.length; i++) pressuresKPa[i]![trial] = drawnKPa[i]!;
    if (trial % every === 0) onShare?.(trial / trialCount);
  }
  const each = (statistic: (sortedKPa: Float64Array) => number): Float64Array =>
    Float64Array.from(pressuresKPa, (values) => statistic(values));
  for (const values of pressuresKPa) values.sort();
  return {
    trialCount,
    depthM,
    meanKPa: each(meanOf),
    standardKPa: each((values) => Math.sqrt(meanSquareOffMean(values))),
    lowKPa: each((values) => quantile(values, 0.025)),
    highKPa: each((values) => quantile(values, 0.975)),
  };
}

/** JCGM 101:2008, 8: the two agree within the rounding of one significant digit, here 5 % of the uncertainty. */
const AGREEMENT_FRAC = 0.05;

/** Whether a Monte Carlo standard uncertainty confirms the first-order one; needs 10,000 trials to tell. */
export const confirmsFirstOrder = (drawnKPa: number, firstOrderKPa: number): boolean =>
  Math.abs(drawnKPa - firstOrderKPa) <= AGREEMENT_FRAC * firstOrderKPa;

/** Draws the pressure at some depths over and over. */
class Trials {
  readonly #deviates: SeededDeviates;
  readonly #anew: MeasuredAnew;
  readonly #firstOrder: Uncertainty;
  readonly #column: Column;
  /** Of the levels, from the top. */
  readonly #order: Int32Array;
  readonly #gaugeKPa: Float64Array;
  readonly #weightKPaPerM: number;
  /** The integral of density as measured, which the trials are held against. */
  readonly #asMeasured: Float64Array;
  readonly #drawn: Float64Array;

  constructor(column: Column, cast: Cast, depthM: Float64Array, deviates: SeededDeviates) {
    const { source } = sampleSalinity(cast.samples, column.basis.unmeasuredPracticalSalinity);
    this.#deviates = deviates;
    this.#anew = new MeasuredAnew(column, source);
    this.#firstOrder = uncertaintyAtDepths(column, cast, depthM);
    this.#column = column;
    this.#order = Int32Array.from(depthM.keys()).sort((a, b) => depthM[a]! - depthM[b]!);
    this.#gaugeKPa = nodesAtDepths(column, depthM).seaPressureDbar.map((dbar) => dbar * KPA_PER_DBAR);
    this.#weightKPaPerM = surfaceGravityMs2(column.latitudeDeg) / 1000;
    this.#asMeasured = new Float64Array(depthM.length);
    this.#drawn = new Float64Array(depthM.length);
    this.#anew.repeat();
    this.#integrateInto(this.#asMeasured, 0);
  }

  drawInto(pressureKPa: Float64Array): void {
    const { contributionKPa, gaps, sampling, depthM } = this.#firstOrder;
    const { levelDepthM, equationOfStateKgM3 } = this.#column.basis.accuracy;
    const deviates = this.#deviates;
    this.#anew.draw(deviates);
    this.#integrateInto(this.#drawn, levelDepthM * deviates.normal());
    const gravity = deviates.normal();
    const altitude = deviates.normal();
    const densityError = equationOfStateKgM3 * deviates.normal();
    const surfaceShare = deviates.uniform();
    const bedShare = deviates.uniform();
    const samplingShare = 2 * deviates.uniform() - 1;
    for (let i = 0; i < pressureKPa.length; i++)
      pressureKPa[i] =
        this.#gaugeKPa[i]! +
        this.#weightKPaPerM * (this.#drawn[i]! - this.#asMeasured[i]! + densityError * depthM[i]!) +
        contributionKPa.gravity[i]! * gravity +
        contributionKPa.altitude[i]! * altitude +
        gaps.surfaceBoundKPa[i]! * surfaceShare +
        gaps.bedBoundKPa[i]! * bedShare +
        sampling.boundKPa[i]! * samplingShare;
  }

  /** Density times depth (kg/m2) from the surface to every level, all levels off by one error. */
  #integrateInto(arealKgM3M: Float64Array, levelErrorM: number): void {
    const { depthM, rhoKgM3 } = this.#anew;
    const n = depthM.length;
    let knot = 0;
    let sum = depthM[0]! * rhoKgM3[0]!;
    for (const i of this.#order) {
      const levelM = Math.max(this.#firstOrder.depthM[i]! + levelErrorM, 0);
      while (knot + 1 < n && depthM[knot + 1]! <= levelM) {
        sum += ((depthM[knot + 1]! - depthM[knot]!) * (rhoKgM3[knot]! + rhoKgM3[knot + 1]!)) / 2;
        knot++;
      }
      const upperM = depthM[knot]!;
      const upperKgM3 = rhoKgM3[knot]!;
      const heightM = levelM - upperM;
      const slope = knot + 1 < n && heightM > 0 ? (rhoKgM3[knot + 1]! - upperKgM3) / (depthM[knot + 1]! - upperM) : 0;
      arealKgM3M[i] = sum + heightM * (upperKgM3 + (slope * heightM) / 2);
    }
  }
}

const meanOf = (values: Float64Array): number => values.reduce((sum, value) => sum + value, 0) / values.length;

function meanSquareOffMean(values: Float64Array): number {
  const mean = meanOf(values);
  return values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (values.length - 1);
}

/** Linear between neighbours. */
function quantile(sortedKPa: Float64Array, shareFrac: number): number {
  const at = shareFrac * (sortedKPa.length - 1);
  const below = Math.floor(at);
  const above = Math.min(below + 1, sortedKPa.length - 1);
  return sortedKPa[below]! + (at - below) * (sortedKPa[above]! - sortedKPa[below]!);
}
