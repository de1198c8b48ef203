import type { SampleSalinity } from "../../cast/index.ts";
import { waterModel } from "../../water/index.ts";
import type { Column } from "../column.ts";
import { surfaceGravityMs2 } from "../gravity.ts";
import { KPA_PER_DBAR } from "../kilopascal.ts";
import { type AppliedAccuracy, appliedAccuracy } from "./applied-accuracy.ts";
import { GapErrors } from "./gaps.ts";
import type { Place } from "./place.ts";
import { RunningIntegral, RunningSquares, RunningSum } from "./running-sums.ts";
import { SamplingErrors } from "./sampling.ts";
import { sensitivitiesOf } from "./sensitivities.ts";
import type { Contributor } from "./uncertainty.ts";

/** The air pressure that water properties count from. */
const STANDARD_ATMOSPHERE_KPA = 101.325;

/** Half-width over standard uncertainty of a rectangular distribution (JCGM 100:2008, 4.3.7). */
const ROOT3 = Math.sqrt(3);

/** A depth whose uncertainty is asked for. */
export interface Asked {
  readonly place: Place;
  readonly gaugeKPa: number;
  /** Density there where the depth is a level's; 0 where it is exact. */
  readonly levelRhoKgM3: number;
}

/**
 * Every contributor's standard uncertainty at any depth of one column, each from a running sum: one pass over the samples,
 * then one step a depth. Errors of density weigh as thickness times gravity; that more pressure makes denser water, which
 * changes an error by less than 0.05 % per 100 m, is left out. An error of a sample's depth moves its salinity and
 * temperature along the column, so it weighs as the step of density it shifts, at fixed depth; it is the same whether
 * depth or pressure was measured.
 */
export class ErrorTerms {
  readonly sampling: SamplingErrors;
  readonly gaps: GapErrors;
  readonly #column: Column;
  readonly #applied: AppliedAccuracy;
  readonly #weightKPaPerM: number;
  readonly #tempSquares: RunningSquares;
  readonly #salinitySquares: RunningSquares;
  readonly #depthSquares: RunningSquares;
  readonly #temp: RunningIntegral;
  readonly #salinity: RunningIntegral;
  readonly #salt: RunningIntegral;
  readonly #steps: RunningSum;
  readonly #aboveFirst: RunningIntegral;
  readonly #altitudeFrac: number;

  constructor(column: Column, salinityFrom: SampleSalinity["source"]) {
    const { n, depthM } = column;
    const { stepKgM3, tempKgM3, salinityKgM3, saltKgM3 } = sensitivitiesOf(column, salinityFrom);
    const heightM = stepKgM3.map((_, k) => depthM[k + 1]! - depthM[k]!);
    this.#column = column;
    this.#applied = appliedAccuracy(column, salinityFrom);
    this.#weightKPaPerM = surfaceGravityMs2(column.latitudeDeg) / 1000;
    this.sampling = new SamplingErrors(column, stepKgM3);
    this.gaps = new GapErrors(column, stepKgM3);
    this.#tempSquares = new RunningSquares(heightM, tempKgM3, depthM);
    this.#salinitySquares = new RunningSquares(heightM, salinityKgM3, depthM);
    this.#depthSquares = new RunningSquares(stepKgM3, new Float64Array(n).fill(1), null);
    this.#temp = new RunningIntegral(depthM, tempKgM3);
    this.#salinity = new RunningIntegral(depthM, salinityKgM3);
    this.#salt = new RunningIntegral(depthM, saltKgM3);
    this.#steps = new RunningSum(stepKgM3);
    this.#aboveFirst = new RunningIntegral(depthM, runningDensity(stepKgM3));
    this.#altitudeFrac = compressionFrac(column);
  }

  /** kPa; the sign of a systematic term is that of its error's effect. */
  standardKPa(name: Contributor, asked: Asked): number {
    const { place, gaugeKPa } = asked;
    const { accuracy } = this.#column.basis;
    const applied = this.#applied;
    const weighed = (arealKgM3M: number): number => this.#weightKPaPerM * arealKgM3M;
    switch (name) {
      case "temperature-random":
        return weighed(applied.randomTempC * Math.sqrt(this.#tempSquares.downTo(place)));
      case "temperature-systematic":
        return weighed(applied.systematicTempC * this.#temp.downTo(place));
      case "salinity-random":
        return weighed(applied.randomSalinity * Math.sqrt(this.#salinitySquares.downTo(place)));
      case "salinity-systematic":
        return weighed(applied.systematicSalinity * this.#salinity.downTo(place));
      case "sample-depth-random":
        return weighed(applied.randomDepthM * Math.sqrt(this.#depthSquares.downTo(place)));
      case "sample-depth-systematic":
        return weighed(applied.systematicDepthM * this.#steps.downTo(place));
      case "depth-scale":
        return weighed(accuracy.depthScaleFrac * this.#depthTimesSteps(place));
      case "level-depth":
        return weighed(accuracy.levelDepthM * asked.levelRhoKgM3);
      case "surface-gap":
        return weighed(this.gaps.surfaceDownTo(place) / (2 * ROOT3));
      case "bed-gap":
        return weighed(this.gaps.bedDownTo(place) / (2 * ROOT3));
      // The bound, not the shape: another curve through the same samples knows no better what lies between them.
      case "sampling":
        return weighed(this.sampling.boundDownTo(place) / ROOT3);
      case "gravity":
        return applied.gravityFrac * gaugeKPa;
      case "equation-of-state":
        return weighed(accuracy.equationOfStateKgM3 * place.depthM);
      case "composition":
        return weighed(accuracy.compositionFrac * this.#salt.downTo(place));
      case "altitude":
        return this.#altitudeFrac * gaugeKPa;
    }
  }

  /** The integral of depth over the density's steps, by parts. */
  #depthTimesSteps(place: Place): number {
    return place.depthM * this.#steps.downTo(place) - this.#aboveFirst.downTo(place);
  }
}

/** Density of each knot above that of the first, compressibility left out. */
function runningDensity(stepKgM3: Float64Array): Float64Array {
  const rhoKgM3 = new Float64Array(stepKgM3.length + 1);
  stepKgM3.forEach((step, k) => {
    rhoKgM3[k + 1] = rhoKgM3[k]! + step;
  });
  return rhoKgM3;
}

/**
 * Water properties count pressure from one standard atmosphere; under another air pressure all water is less or more
 * compressed by this share of its density, which is not corrected.
 */
function compressionFrac({ basis, salinity, tempC }: Column): number {
  const { density } = waterModel(basis.water);
  const missingDbar = (basis.airPressureKPa - STANDARD_ATMOSPHERE_KPA) / KPA_PER_DBAR;
  const rhoKgM3 = density(salinity[0]!, tempC[0]!, 10);
  return (density(salinity[0]!, tempC[0]!, 10 + missingDbar) - rhoKgM3) / rhoKgM3;
}
