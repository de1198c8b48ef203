import type { Column } from "../column.ts";
import { surfaceGravityMs2 } from "../gravity.ts";
import { rawBuoyancy, type Setting, smoothedBuoyancy, sortedBuoyancy } from "./buoyancy-profiles.ts";
import { flowNumbers } from "./flow-numbers.ts";
import { LinearProfile } from "./linear-profile.ts";
import { mixedLayerOf } from "./mixed-layer.ts";
import { stratificationMoments } from "./moments.ts";
import { completeOptions } from "./options.ts";
import { potentialDensities } from "./potential-density.ts";
import { potentialEnergyAnomaly } from "./potential-energy.ts";
import { pycnoclinesOf } from "./pycnoclines.ts";
import { sortedColumn } from "./sorted-column.ts";
import { stabilityOf } from "./stability.ts";
import type { Stratification, StratificationOptions } from "./stratification.ts";
import { thorpeSorting } from "./thorpe.ts";
import { twoLayers } from "./two-layers.ts";
import { verticalModes } from "./vertical-modes.ts";

/**
 * The layering of one column: how stable it is, where its layers meet, what it takes to mix it and how fast waves run
 * along it. Potential energy and the two layers are those of the measured column; smoothed buoyancy frequency,
 * pycnoclines, moments and modes are those of the column with its samples in order of density.
 * Null where a density is unknown (outside what the water model can compute) and for a column without depth.
 */
export function stratificationOf(column: Column, given: Partial<StratificationOptions> = {}): Stratification | null {
  const options = completeOptions(given);
  const densities = potentialDensities(column);
  if (!(column.bottomDepthM > 0 && densities.rhoKgM3.every(Number.isFinite))) return null;
  const { sampleRhoKgM3: potentialRhoKgM3, referenceSeaPressureDbar } = densities;
  const { densityNoiseKgM3, smoothingLengthM, modeCount, velocity } = options;

  const measured = new LinearProfile(densities.depthM, densities.rhoKgM3);
  const sorted = sortedColumn(densities);
  const gravityMs2 = surfaceGravityMs2(column.latitudeDeg);
  const setting: Setting = { gravityMs2, meanRhoKgM3: measured.mean(0, measured.bottomDepthM) };

  const smoothed = smoothedBuoyancy(sorted, smoothingLengthM, setting);
  const stability = stabilityOf(column.depthM, potentialRhoKgM3, densityNoiseKgM3);
  const isLayered = stability.verdict !== "neutral";
  const pycnoclines = isLayered ? pycnoclinesOf(smoothed, sorted, { ...setting, ...options }) : [];
  const main = pycnoclines[0];
  const potentialEnergyAnomalyJM3 = potentialEnergyAnomaly(measured, gravityMs2);
  const layers = main ? twoLayers(measured, main.depthM, { gravityMs2, potentialEnergyAnomalyJM3 }) : null;
  return {
    options,
    referenceSeaPressureDbar,
    potentialRhoKgM3,
    stability,
    buoyancy: { raw: rawBuoyancy(column), sorted: sortedBuoyancy(column.depthM, potentialRhoKgM3, setting), smoothed },
    thorpe: thorpeSorting(column.depthM, potentialRhoKgM3, densityNoiseKgM3),
    mixedLayer: mixedLayerOf(column, potentialRhoKgM3, smoothed, { ...setting, ...options }),
    pycnoclines,
    moments: isLayered ? stratificationMoments(sorted) : null,
    potentialEnergyAnomalyJM3,
    twoLayers: layers,
    modes: isLayered ? verticalModes(sorted, setting, { modeCount, latitudeDeg: column.latitudeDeg }) : null,
    flow: velocity && flowNumbers(velocity, sorted, layers, setting),
  };
}
