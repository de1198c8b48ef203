/**
 * The unit of a column whose header and units row do not give one: a rule for each role, each stated to the user. Where
 * the values leave room for two readings, no unit is chosen and the user is asked.
 */
import { max, median, min } from "simple-statistics";
import type { Issue } from "../../base/index.ts";
import type { UnitSymbol } from "../../units/index.ts";
import type { MeasuredRole } from "./roles.ts";

export interface UnitChoice {
  /** null: no unit could be told, the issue says why. */
  readonly unit: UnitSymbol | null;
  readonly reason: string;
  readonly issue: Issue | null;
  /** The units it could be, where none could be told. */
  readonly open: readonly UnitSymbol[];
}

export interface UnitlessColumn {
  readonly role: MeasuredRole;
  readonly header: string;
  /** The numbers of the column as written, without the missing ones; at least one. */
  readonly values: readonly number[];
}

/** The code of the issue that asks for a unit. */
export const askedUnitCode = (role: MeasuredRole): string => `no-unit-${kebab(role)}`;

const kebab = (role: MeasuredRole): string => role.replace(/[A-Z]/g, (capital) => `-${capital.toLowerCase()}`);

const shown = (value: number): string => String(Number(value.toPrecision(4)));

const span = (values: readonly number[]): string => `${shown(min([...values]))} to ${shown(max([...values]))}`;

const silent = (unit: UnitSymbol, reason: string): UnitChoice => ({ unit, reason, issue: null, open: [] });

function assumed(column: UnitlessColumn, unit: UnitSymbol, why: string, severity: "note" | "warning"): UnitChoice {
  const message = `"${column.header}" has no unit; ${unit} is assumed because ${why}; if that is wrong, write the unit in the header`;
  return {
    unit,
    reason: `no unit in the file, ${unit} assumed because ${why}`,
    issue: { severity, code: `assumed-unit-${kebab(column.role)}`, message },
    open: [],
  };
}

function undecided(column: UnitlessColumn, why: string, open: readonly UnitSymbol[]): UnitChoice {
  const message = `"${column.header}" has no unit, and ${why}; say which, or write the unit in the header, as in "${column.header} (${open[0]})"`;
  return {
    unit: null,
    reason: `no unit in the file, and ${why}`,
    issue: { severity: "warning", code: askedUnitCode(column.role), message },
    open,
  };
}

/** Liquid water in nature, in kelvin. */
const COLDEST_K = 270;
const WARMEST_K = 318;

function temperatureUnit(column: UnitlessColumn): UnitChoice {
  const middle = median([...column.values]);
  const least = min([...column.values]);
  const why = `values lie in ${span(column.values)}`;
  if (least >= COLDEST_K && max([...column.values]) <= WARMEST_K) return assumed(column, "K", why, "warning");
  if (middle < -2 || middle > 45) return undecided(column, `${why}, which is no water in degC`, ["degF", "degC", "K"]);
  if (least >= 32)
    return undecided(column, `${why}, which is warm water in degC and cold water in degF`, ["degC", "degF"]);
  if (middle > 35) return assumed(column, "degC", `${why}, though degF is as likely`, "warning");
  return assumed(column, "degC", why, "note");
}

const CONDUCTIVITY_UNITS: readonly UnitSymbol[] = ["uS/cm", "mS/cm", "S/m"];

/** No natural water conducts more than this, in S/m and in mS/cm. */
const MOST_S_PER_M = 7;
const MOST_MS_PER_CM = 70;

/**
 * By the median: sea water measures 3 to 6 S/m or 30 to 60 mS/cm, and from 100 up it can only be uS/cm. Brackish water in
 * mS/cm and sea water in S/m overlap, and a soft lake has as many uS/cm as the sea has mS/cm: specific conductance, which
 * is mostly of fresh water, is told by the last rule alone.
 */
function conductivityUnit(column: UnitlessColumn): UnitChoice {
  const middle = median([...column.values]);
  const most = max([...column.values]);
  const why = `the median is ${shown(middle)}`;
  const canBeSea = column.role === "conductivity";
  if (middle >= 100) return assumed(column, "uS/cm", `${why}, too high for mS/cm or S/m`, "warning");
  if (canBeSea && middle >= 30 && middle <= 60 && most <= MOST_MS_PER_CM) {
    return assumed(column, "mS/cm", `${why}, as of sea water in mS/cm`, "warning");
  }
  if (canBeSea && middle >= 3 && middle <= 6 && most <= MOST_S_PER_M) {
    return assumed(column, "S/m", `${why}, as of sea water in S/m`, "warning");
  }
  return undecided(column, `${why}, which could be more than one of uS/cm, mS/cm and S/m`, CONDUCTIVITY_UNITS);
}

function distanceUnit(column: UnitlessColumn): UnitChoice {
  if (/mile/i.test(column.header)) return silent("mi", "miles by its name");
  if (/r(iver)?[\s_.]*k(m|ilomet)/i.test(column.header)) return silent("km", "kilometres by its name");
  return assumed(column, "km", "distance without a unit is taken in kilometres", "warning");
}

export function chooseUnit(column: UnitlessColumn): UnitChoice {
  switch (column.role) {
    case "temperature":
      return temperatureUnit(column);
    case "conductivity":
    case "specificConductance":
      return conductivityUnit(column);
    case "distance":
      return distanceUnit(column);
    case "depth":
      return assumed(column, "m", "depth without a unit is taken in metres", "warning");
    case "elevation":
    case "surfaceElevation":
    case "waterDepth":
      return assumed(column, "m", "lengths without a unit are taken in metres", "warning");
    case "seaPressure":
    case "absolutePressure":
      return assumed(column, "dbar", "pressure without a unit is taken in decibars", "warning");
    case "absoluteSalinity":
      return silent("g/kg", "in g/kg by definition");
    case "dissolvedSolids":
    case "suspendedSediment":
      return assumed(column, "mg/L", "it is mostly given in mg/L", "warning");
    case "elapsedTime":
      return assumed(column, "s", "elapsed time without a unit is taken in seconds", "note");
    case "practicalSalinity":
      return silent("1", "practical salinity has no unit");
    case "densityAnomaly":
      return silent("kg/m3", "in kg/m3 by definition");
    case "latitude":
    case "longitude":
      return silent("deg", "in degrees");
  }
}
