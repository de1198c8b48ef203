import { type Cast, sampleSalinity } from "../../cast/index.ts";
import { waterModel } from "../../water/index.ts";
import type { Column } from "../column.ts";
import { surfaceGravityMs2 } from "../gravity.ts";
import { KPA_PER_DBAR } from "../kilopascal.ts";
import { type Nodes, nodesAtDepths, nodesOfProfile } from "../nodes.ts";
import { type Asked, ErrorTerms } from "./error-terms.ts";
import { placeOf } from "./place.ts";
import { CONTRIBUTORS, type Contributor, RANDOM_CONTRIBUTORS, type Uncertainty } from "./uncertainty.ts";

/** Coverage factor of the expanded uncertainty: about 95 %. */
const COVERAGE_FACTOR = 2;

/**
 * Standard uncertainty of gauge pressure in every row of a column's profile: water surface, samples, and the bed where it
 * is known. First-order propagation (JCGM 100:2008, eq. 10 and 13): systematic errors are summed along the cast before
 * they are squared, random ones after. It is that of the pressure at exactly the row's depth.
 * @param cast the one the column was made of
 */
export const uncertaintyOf = (column: Column, cast: Cast): Uncertainty =>
  propagate(column, cast, nodesOfProfile(column));

/** The same at levels, m below the water surface; how well a level stands where it is said to stand comes on top. */
export const uncertaintyAtDepths = (column: Column, cast: Cast, depthsM: ArrayLike<number>): Uncertainty =>
  propagate(column, cast, nodesAtDepths(column, depthsM));

function propagate(column: Column, cast: Cast, nodes: Nodes): Uncertainty {
  const { n, depthM } = nodes;
  const salinityFrom = sampleSalinity(cast.samples, column.basis.unmeasuredPracticalSalinity).source;
  const terms = new ErrorTerms(column, salinityFrom);
  const asked = askedOf(column, nodes);
  const each = (valueAt: (at: Asked) => number): Float64Array => {
    const values = new Float64Array(n);
    for (let i = 0; i < n; i++) values[i] = Number.isNaN(asked[i]!.gaugeKPa) ? Number.NaN : valueAt(asked[i]!);
    return values;
  };

  const contributionKPa = Object.fromEntries(
    CONTRIBUTORS.map((name) => [name, each((at) => Math.abs(terms.standardKPa(name, at)))]),
  ) as Record<Contributor, Float64Array>;
  const rootOfSquares = (names: readonly Contributor[]): Float64Array => {
    const sum = new Float64Array(n);
    for (const name of names) {
      const values = contributionKPa[name];
      for (let i = 0; i < n; i++) sum[i]! += values[i]! ** 2;
    }
    return sum.map(Math.sqrt);
  };
  const combinedKPa = rootOfSquares(CONTRIBUTORS);
  const weightKPaPerM = surfaceGravityMs2(column.latitudeDeg) / 1000;
  return {
    n,
    depthM,
    contributionKPa,
    randomKPa: rootOfSquares(RANDOM_CONTRIBUTORS),
    systematicKPa: rootOfSquares(CONTRIBUTORS.filter((name) => !RANDOM_CONTRIBUTORS.includes(name))),
    combinedKPa,
    expandedKPa: combinedKPa.map((standardKPa) => COVERAGE_FACTOR * standardKPa),
    absCombinedKPa: combinedKPa.map((standardKPa) => Math.hypot(standardKPa, column.basis.accuracy.airPressureKPa)),
    sampling: {
      shapeKPa: each(({ place }) => weightKPaPerM * terms.sampling.shapeDownTo(place)),
      boundKPa: each(({ place }) => weightKPaPerM * terms.sampling.boundDownTo(place)),
    },
    gaps: {
      surfaceGapM: each(({ place }) => terms.gaps.surfaceGapM(place)),
      surfaceBoundKPa: each(({ place }) => weightKPaPerM * terms.gaps.surfaceDownTo(place)),
      bedGapM: each(({ place }) => terms.gaps.bedGapM(place)),
      bedBoundKPa: each(({ place }) => weightKPaPerM * terms.gaps.bedDownTo(place)),
    },
    salinityFrom,
  };
}

/** The rows to be answered; only a level's own density matters, where it may stand a little off. */
function askedOf(column: Column, { depthM, seaPressureDbar, salinity, tempC, origin }: Nodes): readonly Asked[] {
  const { density } = waterModel(column.basis.water);
  return Array.from(depthM, (depth, i) => ({
    place: placeOf(column, depth),
    gaugeKPa: seaPressureDbar[i]! * KPA_PER_DBAR,
    levelRhoKgM3: origin[i] === "level" ? density(salinity[i]!, tempC[i]!, seaPressureDbar[i]!) : 0,
  }));
}
