import type { Issue } from "../base/index.ts";
import { type Cast, type Samples, sampleSalinity } from "../cast/index.ts";
import { PA_PER_DBAR, standardOceanPressure } from "../gsw-ts-port/index.ts";
import type { Basis } from "./basis.ts";
import { STANDARD_GRAVITY_MS2 } from "./gravity.ts";

/** The latitude a standard ocean is taken at where none is known; between 0 and 90 degrees it moves depth by 0.3 %. */
const MIDDLE_LATITUDE_DEG = 45;

/** A cast's usable samples in order of the coordinate that was measured. */
export interface Record {
  readonly coordinate: "depth" | "pressure";
  /** Depth in m or sea pressure in dbar of each knot. */
  readonly along: Float64Array;
  readonly sampleIndex: Int32Array;
  readonly issues: readonly Issue[];
}

/** Depth or sea pressure per sample, whichever the instrument measured: the basis says how a depth column was made. */
function measuredCoordinate(
  samples: Samples,
  basis: Basis,
  latitudeDeg: number | null,
): { readonly coordinate: "depth" | "pressure"; readonly values: Float64Array } {
  const { depthM, seaPressureDbar } = samples;
  if (seaPressureDbar) return { coordinate: "pressure", values: seaPressureDbar };
  const depths = depthM ?? new Float64Array(samples.n).fill(Number.NaN);
  const made = basis.depthMade;
  switch (made.kind) {
    case "measured":
      return { coordinate: "depth", values: depths };
    case "standard-ocean": {
      const latitude = latitudeDeg ?? MIDDLE_LATITUDE_DEG;
      return { coordinate: "pressure", values: depths.map((z) => standardOceanPressure(-z, latitude)) };
    }
    case "constant": {
      const dbarPerM = (made.rhoKgM3 * STANDARD_GRAVITY_MS2) / PA_PER_DBAR;
      return { coordinate: "pressure", values: depths.map((z) => z * dbarPerM) };
    }
  }
}

const listOfLines = (samples: Samples, indices: readonly number[]): string => {
  const lines = indices.slice(0, 5).map((i) => samples.lineIndex[i]);
  return `line${lines.length > 1 ? "s" : ""} ${lines.join(", ")}${indices.length > 5 ? " and on" : ""}`;
};

/** Picks the samples a column can stand on and sorts them; what is left out is said. */
export function recordOf(cast: Cast, basis: Basis, latitudeDeg: number | null): Record {
  const { samples } = cast;
  const salinity = sampleSalinity(samples, basis.unmeasuredPracticalSalinity);
  const { coordinate, values } = measuredCoordinate(samples, basis, latitudeDeg);
  const usable: number[] = [];
  const inAir: number[] = [];
  const incomplete: number[] = [];
  for (let i = 0; i < samples.n; i++) {
    const x = values[i]!;
    // Conductivity needs a pressure to become salinity, but is missing or not whatever the pressure.
    if (!Number.isFinite(x + samples.inSituTempC[i]! + salinity.at(i, 0))) incomplete.push(i);
    else if (x < 0) inAir.push(i);
    else usable.push(i);
  }
  const inOrder = usable.every((i, k) => k === 0 || values[i]! >= values[usable[k - 1]!]!);
  if (!inOrder) usable.sort((a, b) => values[a]! - values[b]! || a - b);

  const issues: Issue[] = [];
  const warn = (code: string, message: string): void => void issues.push({ severity: "warning", code, message });
  if (incomplete.length > 0)
    warn(
      "incomplete-sample",
      `${incomplete.length} of ${samples.n} samples lack depth, temperature or salinity and are not used (${listOfLines(samples, incomplete)})`,
    );
  if (inAir.length > 0)
    warn(
      "above-surface",
      `${inAir.length} of ${samples.n} samples lie above the water surface and are not used (${listOfLines(samples, inAir)})`,
    );
  if (!inOrder)
    warn(
      "not-in-order",
      "samples are not in order of depth and were sorted; a raw record that goes down and up should be cut to one way first",
    );
  if (salinity.source === "basis")
    issues.push({
      severity: "note",
      code: "salinity-assumed",
      message: `no salinity or conductivity was measured; practical salinity ${basis.unmeasuredPracticalSalinity} is assumed`,
    });
  return {
    coordinate,
    along: Float64Array.from(usable, (i) => values[i]!),
    sampleIndex: Int32Array.from(usable),
    issues,
  };
}
