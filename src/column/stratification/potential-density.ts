import { potentialTemperature } from "../../gsw-ts-port/index.ts";
import { absoluteSalinityOf, waterModel } from "../../water/index.ts";
import type { Column } from "../column.ts";
import { nodesOfProfile } from "../nodes.ts";

/** Densities of one column that can be compared with each other, as compressibility is left out of them. */
export interface PotentialDensities {
  readonly referenceSeaPressureDbar: number;
  /** From the water surface to the bottom of the column, gaps included. */
  readonly depthM: Float64Array;
  readonly rhoKgM3: Float64Array;
  /** Where the samples start among them. */
  readonly firstSampleIndex: number;
  /** Of the samples alone. */
  readonly sampleRhoKgM3: Float64Array;
}

/**
 * Density of every sample, and of the water at the surface and the bed as the basis has it, after moving it without
 * exchange of heat or salt to the pressure halfway down the column, by the column's own water model: its potential
 * density (IOC, SCOR & IAPSO 2010, sec. 3.4). One pressure for the whole column judges fresh water around 4 degC right
 * to 1e-3 kg/m3 within 50 dbar of it, as the temperature of greatest density falls by 0.002 degC a dbar. NaN in, NaN out.
 */
export function potentialDensities(column: Column): PotentialDensities {
  const model = waterModel(column.basis.water);
  const nodes = nodesOfProfile(column);
  const referenceSeaPressureDbar = nodes.seaPressureDbar[nodes.n - 1]! / 2;
  const rhoKgM3 = nodes.tempC.map((tempC, i) => {
    const salinity = nodes.salinity[i]!;
    const movedTempC =
      model.temperatureScale === "conservative"
        ? tempC
        : potentialTemperature(
            absoluteSalinityOf(model, salinity),
            tempC,
            nodes.seaPressureDbar[i]!,
            referenceSeaPressureDbar,
          );
    return model.density(salinity, movedTempC, referenceSeaPressureDbar);
  });
  const firstSampleIndex = nodes.knotIndex.indexOf(0);
  return {
    referenceSeaPressureDbar,
    depthM: nodes.depthM,
    rhoKgM3,
    firstSampleIndex,
    sampleRhoKgM3: rhoKgM3.slice(firstSampleIndex, firstSampleIndex + column.n),
  };
}
