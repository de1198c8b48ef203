/**
 * The unit of a column whose header and units row do not give one. A rule for each role, each stated to the user; where
 * the values leave room for two readings the user is asked.
 */
import { max, median, min } from "simple-statistics";
import type { Issue } from "../../base/index.ts";
import type { UnitSymbol } from "../../units/index.ts";
import type { ColumnRole } from "../reading.ts";
import { ROLE_WORDS } from "./column-names.ts";

export interface UnitChoice {
  /** null: no unit could be told, the issue says why. */
  readonly unit: UnitSymbol | null;
  readonly reason: string;
  readonly issue: Issue | null;
}

export interface UnitlessColumn {
  readonly role: ColumnRole;
  readonly header: string;
  /** The numbers of the column as written, without the missing ones. */
  readonly values: readonly number[];
}

const shown = (value: number): string => String(Number(value.toPrecision(4)));

const span = (values: readonly number[]): string => `${shown(min(values))} to ${shown(max(values))}`;

const silent = (unit: UnitSymbol, reason: string): UnitChoice => ({ unit, reason, issue: null });

function assumed(column: UnitlessColumn, unit: UnitSymbol, why: string, severity: "note" | "warning"): UnitChoice {
  const { header, role } = column;
  return {
    unit,
    reason: `no unit in the file; ${unit} assumed because ${why}`,
    issue: {
      severity,
      code: `assumed-unit-${role}`,
      message: `"${header}" has no unit; ${unit} is assumed because ${why}; if that is wrong, write the unit in the header`,
    },
  };
}

function undecided(column: UnitlessColumn, why: string, remedy: string): UnitChoice {
  const { header, role } = column;
  return {
    unit: null,
    reason: `no unit in the file, and ${why}`,
    issue: { severity: "error", code: `no-unit-${role}`, message: `"${header}" has no unit, and ${why}; ${remedy}` },
  };
}

function temperatureUnit(column: UnitlessColumn): UnitChoice {
  const middle = median([...column.values]);
  const why = `values lie in ${span(column.values)}`;
  if (middle >= -2 && middle <= 35) return assumed(column, "degC", why, "note");
  if (middle > 35 && middle <= 45)
    return assumed(column, "degC", `${why}, though that is warm and may be degF`, "warning");
  return undecided(column, `${why}, outside -2 to 45 degC`, 'write the unit in the header, as in "Temperature (degF)"');
}

/**
 * By the median: sea water measures 3 to 6 S/m or 30 to 60 mS/cm, and what exceeds 100 can only be uS/cm. Brackish water
 * in mS/cm and sea water in S/m overlap from 0.3 to 3, and fresh water in uS/cm falls between the other two.
 */
function conductivityUnit(column: UnitlessColumn): UnitChoice {
  const middle = median([...column.values]);
  const why = `the median is ${shown(middle)}`;
  if (middle >= 100) return assumed(column, "uS/cm", `${why}, too high for mS/cm or S/m`, "warning");
  if (middle >= 30 && middle <= 60) return assumed(column, "mS/cm", `${why}, as of sea water in mS/cm`, "warning");
  if (middle >= 3 && middle <= 6) return assumed(column, "S/m", `${why}, as of sea water in S/m`, "warning");
  return undecided(
    column,
    `${why}, which could be more than one of uS/cm, mS/cm and S/m`,
    `write the unit in the header, as in "${column.header} (uS/cm)"`,
  );
}

function distanceUnit(column: UnitlessColumn): UnitChoice {
  if (/mile/i.test(column.header)) return silent("mi", "miles by its name");
  if (/r(iver)?\s*k(m|ilomet)/i.test(column.header)) return silent("km", "kilometres by its name");
  return assumed(column, "km", "distances along a channel are given in km", "warning");
}

/** A rule for each role that has a unit; text and time have none. */
export function chooseUnit(column: UnitlessColumn): UnitChoice {
  if (column.values.length === 0) return silent("1", `no numbers in the column`);
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
    case "seaPressure":
      return assumed(column, "dbar", "pressure without a unit is taken in decibars above the air", "warning");
    case "practicalSalinity":
      return silent("1", "practical salinity has no unit");
    case "densityAnomaly":
      return silent("kg/m3", "kg/m3 by definition");
    case "latitude":
    case "longitude":
      return silent("deg", `${ROLE_WORDS[column.role]} in degrees`);
    default:
      return silent("1", "has no unit");
  }
}
