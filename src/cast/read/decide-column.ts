/** What becomes of one column: used in a role and a unit, or not used, and the reason in a plain sentence. */
import type { Issue } from "../../base/index.ts";
import type { UnitSymbol } from "../../units/index.ts";
import type { ColumnReading } from "../reading.ts";
import { askedUnitCode, chooseUnit } from "./choose-unit.ts";
import { type Contender, TELLING_CELLS } from "./contender.ts";
import { type DecimalMark, isSentinel, parseNumber } from "./parse-number.ts";
import { dateOrderOf, datePart, parseClock, parseDateTime } from "./parse-time.ts";
import { isMeasured, type MeasuredRole, ROLE_WORDS } from "./roles.ts";

export interface Decision {
  readonly reading: ColumnReading;
  readonly issues: readonly Issue[];
}

type Place = Pick<ColumnReading, "columnIndex" | "header">;

const leave = ({ columnIndex, header }: Place, why: string, ...issues: readonly Issue[]): Decision => ({
  reading: { columnIndex, header, role: null, unit: null, confidence: "sure", reason: `Not used: ${why}.` },
  issues,
});

const use = (contender: Contender, unit: UnitSymbol | null, why: string, ...issues: readonly Issue[]): Decision => {
  const { columnIndex, header, role } = contender;
  return {
    reading: { columnIndex, header, role, unit, confidence: "sure", reason: `Named as ${ROLE_WORDS[role]}; ${why}.` },
    issues,
  };
};

const UNUSED_NAMES: readonly (readonly [RegExp, string])[] = [
  [/^$/, "it has no name"],
  [/flag|(^|[\W_])q[cf]($|[\W_])|quality/i, "a flag about another column"],
  [/discrete|bottle/i, "single water samples, not the probe"],
  [/baro|(air|atmos\w*)[\W_]*press/i, "pressure of the air"],
  [/abs\w*[\W_]*press/i, "absolute pressure holds the pressure of the air, sea pressure is needed"],
  [/abs\w*[\W_]*sal/i, "absolute salinity, practical salinity is needed"],
  [/potential|conservative|theta/i, "temperature in situ is needed"],
  [
    /(bottom|max\w*|total|water|station|site|sonar|secchi)[\W_]*depth|bathymetry/i,
    "a depth of the place, not of the sample",
  ],
  [
    /^e\.?c\.?\b/i,
    "EC does not say whether it is compensated to 25 degC; name it conductivity or specific conductance",
  ],
];

/** Of a column whose name has no role. */
export function whyUnused(columnIndex: number, header: string): Decision {
  const known = UNUSED_NAMES.find(([pattern]) => pattern.test(header));
  return leave({ columnIndex, header }, known?.[1] ?? "its name is none known here");
}

/** Of a column that lost its role to another. */
export function passOver(loser: Contender, winner: Contender): Decision {
  const words = ROLE_WORDS[loser.role];
  if (loser.filled.length === 0) return leave(loser, `named as ${words}, but empty`);
  const message = `"${winner.header}" and "${loser.header}" could both be ${words}; "${winner.header}" is used as the better match`;
  const issue: Issue = { severity: "note", code: "two-columns-for-one-role", message };
  return leave(loser, `could be ${words} too, but "${winner.header}" is the better match`, issue);
}

/** Of the only, or the best, column for a role. */
export function decide(contender: Contender, decimalMark: DecimalMark): Decision {
  const { role, written, filled } = contender;
  const words = ROLE_WORDS[role];
  if (filled.length === 0) return leave(contender, `named as ${words}, but empty`);
  if (!isMeasured(role)) return decideText(contender);
  if (written === null) return decideByRule(contender, role, decimalMark);
  if (written.unit !== null) return decideByUnit(contender, written.unit.symbol);
  const why = `"${written.text}" is no unit of ${words} known here`;
  const message = `"${contender.header}": ${why}; write a unit that is known, or take the column out`;
  return leave(contender, why, { severity: "warning", code: askedUnitCode(role), message });
}

/** Text is taken as it is; a column of times must hold times, which seconds since the start are not. */
function decideText(contender: Contender): Decision {
  const { role } = contender;
  if (role === "station" || role === "castName") return use(contender, null, "taken as written");
  if (role === "date") return use(contender, null, "its cells tell the days apart");
  const telling = contender.filled.slice(0, TELLING_CELLS);
  const { order } = dateOrderOf(telling.map(datePart));
  const isRead = (cell: string) => (role === "clock" ? parseClock(cell) : parseDateTime(cell, order)) !== null;
  if (telling.filter(isRead).length >= telling.length / 2) return use(contender, null, "its cells read as such");
  return leave(contender, `named as ${ROLE_WORDS[role]}, but it holds texts such as "${telling[0]}"`);
}

function decideByRule(contender: Contender, role: MeasuredRole, decimalMark: DecimalMark): Decision {
  const values = contender.filled
    .filter((cell) => !isSentinel(role, cell))
    .map((cell) => parseNumber(cell, decimalMark))
    .filter((value) => value !== null);
  if (values.length === 0) {
    const why = `named as ${ROLE_WORDS[role]}, but it holds no numbers`;
    const message = `"${contender.header}" is ${why}, only texts such as "${contender.filled[0]}"; it is not used`;
    return leave(contender, why, { severity: "warning", code: "no-numbers", message });
  }
  const { unit, reason, issue } = chooseUnit({ role, header: contender.header, values });
  const issues = issue === null ? [] : [issue];
  return unit === null
    ? leave(contender, `named as ${ROLE_WORDS[role]}; ${reason}`, ...issues)
    : use(contender, unit, reason, ...issues);
}

/** Barometers read in these. */
const AIR_UNITS: readonly UnitSymbol[] = ["mmHg", "hPa", "atm"];

function decideByUnit(contender: Contender, unit: UnitSymbol): Decision {
  const { role, header, unitSource } = contender;
  if (role === "seaPressure" && AIR_UNITS.includes(unit)) {
    return leave(contender, `${unit} is how barometers read the air`);
  }
  const why = `${unit === "1" ? "its unit" : unit} is given in ${unitSource}`;
  if (role !== "practicalSalinity" || unit !== "g/kg") return use(contender, unit, why);
  const message = `"${header}" is in g/kg and read as practical salinity; if it is absolute salinity, it is 0.5 % too high`;
  return use(contender, unit, why, { severity: "warning", code: "salinity-in-g-kg", message });
}
