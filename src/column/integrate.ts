import { failed, type Issue, type Outcome, succeeded } from "../base/index.ts";
import { type Cast, sampleSalinity } from "../cast/index.ts";
import { ownSalinity, ownTemperature, waterModel } from "../water/index.ts";
import type { Basis } from "./basis.ts";
import type { Column } from "./column.ts";
import { type Record, recordOf } from "./record.ts";
import { referenceDensityOf } from "./reference-density.ts";
import { type ColumnFrame, Stretch } from "./stretch.ts";

/** Own salinity and temperature follow from the sample and, weakly, from the pressure that is being integrated. */
const MOST_ROUNDS_COUNT = 20;

type Knots = Pick<Column, "depthM" | "seaPressureDbar" | "practicalSalinity" | "inSituTempC" | "salinity" | "tempC">;

function march(cast: Cast, basis: Basis, frame: ColumnFrame, record: Record): Knots {
  const { along, sampleIndex } = record;
  const byDepth = record.coordinate === "depth";
  const n = along.length;
  const depthM = new Float64Array(n);
  const seaPressureDbar = new Float64Array(n);
  const practicalSalinity = new Float64Array(n);
  const inSituTempC = Float64Array.from(sampleIndex, (i) => cast.samples.inSituTempC[i]!);
  const salinity = new Float64Array(n);
  const tempC = new Float64Array(n);
  const stretch = new Stretch(frame);

  const measuredSalinity = sampleSalinity(cast.samples, basis.unmeasuredPracticalSalinity);
  const takeSample = (k: number, pressureDbar: number): void => {
    practicalSalinity[k] = measuredSalinity.at(sampleIndex[k]!, pressureDbar);
    salinity[k] = ownSalinity(frame.model, practicalSalinity[k]);
    tempC[k] = ownTemperature(frame.model, {
      salinity: salinity[k],
      inSituTempC: inSituTempC[k]!,
      seaPressureDbar: pressureDbar,
    });
  };

  for (let k = 0; k < n; k++) {
    const aboveDepthM = k === 0 ? 0 : depthM[k - 1]!;
    const abovePressureDbar = k === 0 ? 0 : seaPressureDbar[k - 1]!;
    const layOver = (): void => {
      if (k === 0) stretch.hold(salinity[0]!, tempC[0]!);
      else stretch.between({ along, salinity, tempC }, k - 1);
    };
    if (!byDepth) {
      takeSample(k, along[k]!);
      layOver();
      seaPressureDbar[k] = along[k]!;
      depthM[k] = stretch.depthDown(abovePressureDbar, aboveDepthM, along[k]!);
      continue;
    }
    depthM[k] = along[k]!;
    let pressureDbar = abovePressureDbar + (along[k]! - aboveDepthM);
    for (let round = 0; round < MOST_ROUNDS_COUNT; round++) {
      takeSample(k, pressureDbar);
      layOver();
      const next = stretch.pressureDown(aboveDepthM, abovePressureDbar, along[k]!);
      const change = Math.abs(next - pressureDbar);
      pressureDbar = next;
      if (!(change > 1e-12 * pressureDbar)) break;
    }
    seaPressureDbar[k] = pressureDbar;
    takeSample(k, pressureDbar);
  }
  return { depthM, seaPressureDbar, practicalSalinity, inSituTempC, salinity, tempC };
}

/**
 * Integrates one cast by the physics contract: dp/dz = rho(S(z), T(z), p) g(latitude, z), p(0) = 0, or the same equation
 * solved for z where sea pressure was measured. Good to 1e-8 relative, in practice to 1e-10.
 * Fails only where no sample can be used; everything else it had to assume or leave out is among the issues.
 */
export function integrateCast(cast: Cast, basis: Basis): Outcome<Column> {
  const latitudeDeg = basis.latitudeDeg ?? cast.latitudeDeg;
  const record = recordOf(cast, basis, latitudeDeg);
  const n = record.along.length;
  if (n === 0)
    return failed(...record.issues, {
      severity: "error",
      code: "no-usable-sample",
      message: `no sample has depth, temperature and salinity in water; check the columns and units`,
    });
  const frame: ColumnFrame = { coordinate: record.coordinate, latitudeDeg, model: waterModel(basis.water) };
  const knots = march(cast, basis, frame, record);
  const lastDepthM = knots.depthM[n - 1]!;
  const statedBedM = basis.bedDepthM ?? cast.waterDepthM;
  const bedDepthM = statedBedM !== null && statedBedM >= lastDepthM ? statedBedM : null;

  const issues: Issue[] = [...record.issues];
  if (latitudeDeg === null)
    issues.push({
      severity: "note",
      code: "gravity-assumed",
      message:
        "no latitude in file or basis; standard gravity 9.80665 m/s2 is used, with 0.15 % as its standard uncertainty",
    });
  if (statedBedM !== null && bedDepthM === null)
    issues.push({
      severity: "warning",
      code: "bed-above-last-sample",
      message: `bed at ${statedBedM} m lies above the last sample at ${lastDepthM.toFixed(3)} m; the bed is not used, correct it or the depths`,
    });
  const outside = countOutsideRange(knots, frame);
  if (outside > 0)
    issues.push({
      severity: "warning",
      code: "outside-water-model",
      message: `${outside} of ${n} samples lie outside ${frame.model.label} (${frame.model.range}); densities there are extrapolated`,
    });

  const unreferenced = {
    castId: cast.id,
    basis,
    latitudeDeg,
    coordinate: record.coordinate,
    n,
    sampleIndex: record.sampleIndex,
    ...knots,
    bedDepthM,
    bottomDepthM: bedDepthM ?? lastDepthM,
    issues,
  };
  return succeeded({ ...unreferenced, referenceRhoKgM3: referenceDensityOf(unreferenced) }, issues);
}

function countOutsideRange(knots: Knots, frame: ColumnFrame): number {
  let count = 0;
  knots.depthM.forEach((_, k) => {
    if (!frame.model.isWithinRange(knots.salinity[k]!, knots.inSituTempC[k]!, knots.seaPressureDbar[k]!)) count++;
  });
  return count;
}
