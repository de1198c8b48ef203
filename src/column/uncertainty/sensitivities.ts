import type { SampleSalinity } from "../../cast/index.ts";
import { conductivityFromPracticalSalinity, practicalSalinityFromConductivity } from "../../gsw-ts-port/index.ts";
import { ownSalinity, ownTemperature, type WaterModel, waterModel } from "../../water/index.ts";
import type { Column } from "../column.ts";

/**
 * How a knot's density answers to what was measured there, by finite differences of the column's own water model, so
 * that every model is served alike. One entry a knot unless said otherwise.
 */
export interface Sensitivities {
  /** Own salinity per unit of measured salinity: of practical salinity, or of conductivity in mS/cm. */
  readonly ownPerSalinityRatio: Float64Array;
  /** Own salinity per kelvin, at the conductivity measured; 0 where salinity itself was measured. */
  readonly ownSalinityPerTempRatio: Float64Array;
  /** Own temperature per kelvin, and per unit of own salinity. */
  readonly ownPerTempRatio: Float64Array;
  readonly ownTempPerSalinityRatio: Float64Array;
  /** Density per unit of measured salinity. */
  readonly salinityKgM3: Float64Array;
  /** Density per kelvin of measured temperature, through the salinity too where that comes from conductivity. */
  readonly tempKgM3: Float64Array;
  /** Density per unit of relative error of all salt. */
  readonly saltKgM3: Float64Array;
  /** Density of each knot at the pressure halfway to the next, taken from that of the next: one entry an interval. */
  readonly stepKgM3: Float64Array;
}

/** Then the salinity that was measured is a conductivity. */
export const measuresConductivity = (salinityFrom: SampleSalinity["source"]): boolean =>
  salinityFrom === "conductivity" || salinityFrom === "specificConductance";

const SMALL_TEMP_C = 0.01;
const SMALL_SALINITY = 0.01;
const SMALL_CONDUCTIVITY_MSCM = 0.001;

/** Errors of conductivity and temperature come into salinity together: dS/dC, and dS/dt at the conductivity measured. */
function conductivitySlopes(practicalSalinity: number, inSituTempC: number, seaPressureDbar: number) {
  const conductivityMsCm = conductivityFromPracticalSalinity(practicalSalinity, inSituTempC, seaPressureDbar);
  const at = (tempC: number, addedMsCm: number): number =>
    practicalSalinityFromConductivity(conductivityMsCm + addedMsCm, tempC, seaPressureDbar);
  return {
    perMsCm: (at(inSituTempC, SMALL_CONDUCTIVITY_MSCM) - at(inSituTempC, 0)) / SMALL_CONDUCTIVITY_MSCM,
    perK: (at(inSituTempC + SMALL_TEMP_C, 0) - at(inSituTempC - SMALL_TEMP_C, 0)) / (2 * SMALL_TEMP_C),
  };
}

/** Density per unit of the model's own salinity and temperature; never asks for less than no salt. */
function ownSlopes(model: WaterModel, salinity: number, tempC: number, seaPressureDbar: number) {
  const fresherSalinity = Math.max(salinity - SMALL_SALINITY, 0);
  const saltierSalinity = salinity + SMALL_SALINITY;
  return {
    perSalinityKgM3:
      (model.density(saltierSalinity, tempC, seaPressureDbar) -
        model.density(fresherSalinity, tempC, seaPressureDbar)) /
      (saltierSalinity - fresherSalinity),
    perTempKgM3:
      (model.density(salinity, tempC + SMALL_TEMP_C, seaPressureDbar) -
        model.density(salinity, tempC - SMALL_TEMP_C, seaPressureDbar)) /
      (2 * SMALL_TEMP_C),
  };
}

/** @param salinityFrom where the cast has its salinity from */
export function sensitivitiesOf(column: Column, salinityFrom: SampleSalinity["source"]): Sensitivities {
  const { n } = column;
  const model = waterModel(column.basis.water);
  const byConductivity = measuresConductivity(salinityFrom);
  const ownPerPractical = ownSalinity(model, 1);
  const made = {
    ownPerSalinityRatio: new Float64Array(n).fill(ownPerPractical),
    ownSalinityPerTempRatio: new Float64Array(n),
    ownPerTempRatio: new Float64Array(n).fill(1),
    ownTempPerSalinityRatio: new Float64Array(n),
    salinityKgM3: new Float64Array(n),
    tempKgM3: new Float64Array(n),
    saltKgM3: new Float64Array(n),
    stepKgM3: stepsOf(column, model),
  };
  for (let k = 0; k < n; k++) {
    const salinity = column.salinity[k]!;
    const tempC = column.tempC[k]!;
    const seaPressureDbar = column.seaPressureDbar[k]!;
    const inSituTempC = column.inSituTempC[k]!;
    if (byConductivity) {
      const { perMsCm, perK } = conductivitySlopes(column.practicalSalinity[k]!, inSituTempC, seaPressureDbar);
      made.ownPerSalinityRatio[k] = ownPerPractical * perMsCm;
      made.ownSalinityPerTempRatio[k] = ownPerPractical * perK;
    }
    if (model.temperatureScale === "conservative") {
      const warmer = { salinity, inSituTempC: inSituTempC + SMALL_TEMP_C, seaPressureDbar };
      const saltier = { salinity: salinity + SMALL_SALINITY, inSituTempC, seaPressureDbar };
      made.ownPerTempRatio[k] = (ownTemperature(model, warmer) - tempC) / SMALL_TEMP_C;
      made.ownTempPerSalinityRatio[k] = (ownTemperature(model, saltier) - tempC) / SMALL_SALINITY;
    }
    const { perSalinityKgM3, perTempKgM3 } = ownSlopes(model, salinity, tempC, seaPressureDbar);
    const perOwnSalinityKgM3 = perSalinityKgM3 + perTempKgM3 * made.ownTempPerSalinityRatio[k]!;
    made.salinityKgM3[k] = perOwnSalinityKgM3 * made.ownPerSalinityRatio[k]!;
    made.tempKgM3[k] = perTempKgM3 * made.ownPerTempRatio[k]! + perOwnSalinityKgM3 * made.ownSalinityPerTempRatio[k]!;
    made.saltKgM3[k] = perOwnSalinityKgM3 * salinity;
  }
  return made;
}

function stepsOf({ n, salinity, tempC, seaPressureDbar }: Column, model: WaterModel): Float64Array {
  const stepKgM3 = new Float64Array(n - 1);
  for (let k = 0; k + 1 < n; k++) {
    const midDbar = (seaPressureDbar[k]! + seaPressureDbar[k + 1]!) / 2;
    stepKgM3[k] =
      model.density(salinity[k + 1]!, tempC[k + 1]!, midDbar) - model.density(salinity[k]!, tempC[k]!, midDbar);
  }
  return stepKgM3;
}
