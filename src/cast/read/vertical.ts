/** Where each sample was: depth or sea pressure, also from elevations and from pressures that hold the weight of the air. */
import { max, median } from "simple-statistics";
import type { Issue } from "../../base/index.ts";
import { convert } from "../../units/index.ts";
import type { CellReader } from "./cell-reader.ts";

export interface Vertical {
  readonly depthM: Float64Array | null;
  readonly seaPressureDbar: Float64Array | null;
  /** Depth counts from the highest sample of each cast, wherever the rows of all casts begin. */
  readonly isFromHighest: boolean;
  /** The weight of the air was in the pressure and has been taken off. */
  readonly isAbsolute: boolean;
  readonly issues: readonly Issue[];
}

/** One standard atmosphere is 10.13 dbar; at altitude and in any weather the air weighs between these. */
const LIGHTEST_AIR_DBAR = 7.5;
const HEAVIEST_AIR_DBAR = 10.9;
const STANDARD_AIR_DBAR = convert(1, "atm", "dbar");
/** In air, or held at the surface, a reading stays this steady from row to row. */
const STEADY_DBAR = 0.05;
const FEWEST_STEADY = 3;

/** A cast starts in the air or in the first metres: pressure that starts here can hold the air as well as not. */
const DEEPEST_START_DBAR = 3;

export const couldHoldAir = (leastDbar: number): boolean =>
  leastDbar >= LIGHTEST_AIR_DBAR && leastDbar <= HEAVIEST_AIR_DBAR + DEEPEST_START_DBAR;

const isWeightOfAir = (pressureDbar: number): boolean =>
  pressureDbar >= LIGHTEST_AIR_DBAR && pressureDbar <= HEAVIEST_AIR_DBAR;

/**
 * What a pressure sensor reads before it goes under: its first rows, steady, the least of all, and about the weight of
 * the air. null when the first rows are nothing of the kind.
 */
export function deckReadingDbar(pressureDbar: Float64Array): number | null {
  const measured = [...pressureDbar.filter((value) => !Number.isNaN(value))];
  const first = measured[0];
  if (first === undefined) return null;
  const end = measured.findIndex((value) => Math.abs(value - first) > STEADY_DBAR);
  const steady = measured.slice(0, end < 0 ? measured.length : end);
  if (steady.length < FEWEST_STEADY || steady.length === measured.length) return null;
  const reading = median(steady);
  const isLeast = measured.every((value) => value >= reading - STEADY_DBAR);
  return isLeast && isWeightOfAir(reading) ? reading : null;
}

type Pressure = Pick<Vertical, "seaPressureDbar" | "isAbsolute" | "issues">;

const warned = (code: string, message: string): Issue => ({ severity: "warning", code, message });

function withoutAir(absoluteDbar: Float64Array): Pressure {
  const deck = deckReadingDbar(absoluteDbar);
  const airDbar = deck ?? STANDARD_AIR_DBAR;
  const message =
    deck === null
      ? `the weight of the air, one standard atmosphere or ${airDbar.toFixed(2)} dbar, is taken off absolute pressure; no reading in air tells it; 0.3 m of depth may be at stake`
      : `the first readings, ${airDbar.toFixed(3)} dbar, are taken for the weight of the air and off absolute pressure`;
  return {
    seaPressureDbar: absoluteDbar.map((value) => value - airDbar),
    isAbsolute: true,
    issues: [warned(deck === null ? "standard-air-taken-off" : "deck-reading-taken-off", message)],
  };
}

/** Pressure in dbar and depth in metres differ by the weight of the air, or hardly at all, at the shallowest sample. */
function exceedsDepth(pressureDbar: Float64Array, depthM: Float64Array | null): boolean {
  if (depthM === null) return false;
  let at = -1;
  for (let i = 0; i < depthM.length; i++) {
    const isMeasured = depthM[i]! >= 0 && !Number.isNaN(pressureDbar[i]!);
    if (isMeasured && (at < 0 || depthM[i]! < depthM[at]!)) at = i;
  }
  return at >= 0 && isWeightOfAir(pressureDbar[at]! - depthM[at]!);
}

/** A pressure column that does not say whether it is gauge is absolute where its first rows or the depths show the air. */
function readPressure(reader: CellReader, isGauge: boolean, depthM: Float64Array | null): Pressure {
  const own = reader.numbers("seaPressure");
  if (own !== null && !isGauge && (deckReadingDbar(own) !== null || exceedsDepth(own, depthM))) return withoutAir(own);
  const absolute = own === null ? reader.numbers("absolutePressure") : null;
  return absolute === null ? { seaPressureDbar: own, isAbsolute: false, issues: [] } : withoutAir(absolute);
}

function depthFrom(elevationM: Float64Array | null, surfaceM: Float64Array | null): Float64Array | null {
  if (elevationM === null) return null;
  if (surfaceM !== null) return elevationM.map((value, i) => surfaceM[i]! - value);
  const highest = max([...elevationM.filter((value) => !Number.isNaN(value)), Number.NEGATIVE_INFINITY]);
  return elevationM.map((value) => highest - value);
}

/** @param isGauge whether the column of sea pressure says that it is gauge pressure */
export function readVertical(reader: CellReader, isGauge: boolean): Vertical {
  const depth = reader.numbers("depth");
  const pressure = readPressure(reader, isGauge, depth);
  if (depth !== null || pressure.seaPressureDbar !== null) return { depthM: depth, ...pressure, isFromHighest: false };
  const surface = reader.numbers("surfaceElevation");
  const depthM = depthFrom(reader.numbers("elevation"), surface);
  return { depthM, ...pressure, isFromHighest: depthM !== null && surface === null };
}
