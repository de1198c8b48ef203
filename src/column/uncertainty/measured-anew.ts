import type { SampleSalinity } from "../../cast/index.ts";
import { type WaterModel, waterModel } from "../../water/index.ts";
import type { Column } from "../column.ts";
import { type AppliedAccuracy, appliedAccuracy, type MeasuredSalinity } from "./applied-accuracy.ts";
import type { SeededDeviates } from "./seeded-deviates.ts";
import { type Sensitivities, sensitivitiesOf } from "./sensitivities.ts";

/**
 * The samples of a column as another lowering with the same sensors would have found them. Density is the water model's
 * own at the salinity and temperature drawn; only how these follow from what was measured is taken as a straight line.
 * At the default errors that is off by 0.3 % of the largest effect drawn, in water of 2 mS/cm and more; where the
 * conductivity's error is a quarter of the conductivity itself, by 2 %.
 */
export class MeasuredAnew {
  readonly depthM: Float64Array;
  readonly rhoKgM3: Float64Array;
  readonly #column: Column;
  readonly #model: WaterModel;
  readonly #slopes: Sensitivities;
  readonly #applied: AppliedAccuracy;

  constructor(column: Column, salinityFrom: SampleSalinity["source"]) {
    this.depthM = new Float64Array(column.n);
    this.rhoKgM3 = new Float64Array(column.n);
    this.#column = column;
    this.#model = waterModel(column.basis.water);
    this.#slopes = sensitivitiesOf(column, salinityFrom);
    this.#applied = appliedAccuracy(column, salinityFrom);
  }

  /** With systematic errors drawn once and random ones sample by sample. */
  draw(deviates: SeededDeviates): void {
    const { randomTempC, randomSalinity, randomDepthM, systematicTempC, systematicSalinity, systematicDepthM } =
      this.#applied;
    const { depthScaleFrac, compositionFrac } = this.#column.basis.accuracy;
    const tempErrorC = systematicTempC * deviates.normal();
    const salinityError = systematicSalinity * deviates.normal();
    const depthErrorM = systematicDepthM * deviates.normal();
    const scaleFactor = 1 + depthScaleFrac * deviates.normal();
    const saltFactor = 1 + compositionFrac * deviates.normal();
    for (let k = 0; k < this.#column.n; k++) {
      const sampleDepthErrorM =
        this.#column.depthM[k]! * (scaleFactor - 1) + depthErrorM + randomDepthM * deviates.normal();
      this.#take(
        k,
        tempErrorC + randomTempC * deviates.normal(),
        salinityError + randomSalinity * deviates.normal(),
        saltFactor,
        sampleDepthErrorM,
      );
    }
    keepOrder(this.depthM);
  }

  /** As it was measured. */
  repeat(): void {
    for (let k = 0; k < this.#column.n; k++) this.#take(k, 0, 0, 1, 0);
  }

  #take(k: number, tempErrorC: number, salinityError: MeasuredSalinity, saltFactor: number, depthErrorM: number): void {
    const { salinity, tempC, seaPressureDbar, depthM } = this.#column;
    const slopes = this.#slopes;
    const knotSalinity = salinity[k]!;
    const drawnSalinity = Math.max(
      (knotSalinity +
        slopes.ownPerSalinityRatio[k]! * salinityError +
        slopes.ownSalinityPerTempRatio[k]! * tempErrorC) *
        saltFactor,
      0,
    );
    const drawnTempC =
      tempC[k]! +
      slopes.ownPerTempRatio[k]! * tempErrorC +
      slopes.ownTempPerSalinityRatio[k]! * (drawnSalinity - knotSalinity);
    // No sample lies above the water. A metre stands for a decibar: the pressure goes along so that a shift compresses nothing.
    this.depthM[k] = Math.max(depthM[k]! + depthErrorM, 0);
    this.rhoKgM3[k] = this.#model.density(drawnSalinity, drawnTempC, seaPressureDbar[k]! + depthErrorM);
  }
}

/**
 * Puts depths that were drawn past one another back in order, so that samples keep theirs; to push one down to its
 * neighbour instead would move the water of a finely sampled cast down with it. Few change places, and not far.
 */
function keepOrder(depthM: Float64Array): void {
  for (let k = 1; k < depthM.length; k++) {
    const moved = depthM[k]!;
    let to = k;
    while (to > 0 && depthM[to - 1]! > moved) {
      depthM[to] = depthM[to - 1]!;
      to--;
    }
    depthM[to] = moved;
  }
}
