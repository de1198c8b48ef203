/** What becomes of one column: used in a role and a unit, or not used, or asked about, and why in a plain sentence. */
import type { Issue } from "../../base/index.ts";
import { type UnitSymbol, unitByName } from "../../units/index.ts";
import type { ColumnRole } from "../reading.ts";
import { type Choice, choose, chooseForm } from "./ask.ts";
import { askedUnitCode, chooseUnit } from "./choose-unit.ts";
import { type Contender, TELLING_CELLS } from "./contender.ts";
import { dayCountOf } from "./day-count.ts";
import { type Decision, doubt, leave, use } from "./decision.ts";
import { chooseStyle, type StyleChoice } from "./number-style.ts";
import { type DecimalMark, parseNumber } from "./parse-number.ts";
import { parsePosition } from "./parse-position.ts";
import { dateOrderOf, datePart, orderInName, parseClock, parseDate, parseDateTime } from "./parse-time.ts";
import { isMeasured, type MeasuredRole, ROLE_WORDS } from "./roles.ts";
import { findSentinels } from "./sentinels.ts";

/** Of a column that lost its role to another. */
export function passOver(loser: Contender, winner: Contender): Decision {
  const words = ROLE_WORDS[loser.role];
  if (loser.filled.length === 0) return leave(loser, `named as ${words}, but empty`);
  if (winner.answer !== null) return leave(loser, `"${winner.header}" is ${words}, as you said`);
  const message = `"${winner.header}" and "${loser.header}" could both be ${words}; "${winner.header}" is used as the better match`;
  const issue: Issue = { severity: "note", code: "two-columns-for-one-role", message };
  return leave(loser, `could be ${words} too, but "${winner.header}" is the better match`, "likely", issue);
}

/** Of the only, or the best, column for a role. */
export function decide(contender: Contender, markOfTable: DecimalMark | null): Decision {
  const { role, filled } = contender;
  if (filled.length === 0) return leave(contender, `named as ${ROLE_WORDS[role]}, but empty`);
  if (isMeasured(role)) return decideMeasured(contender, role, markOfTable);
  switch (role) {
    case "date":
    case "dateTime":
      return decideDate(contender);
    case "clock":
      return decideClock(contender);
    case "turbidity":
      return use(contender, "listed, nothing is computed from it");
    default:
      return use(contender, "taken as written");
  }
}

const unreadable = (contender: Contender): Decision =>
  leave(
    contender,
    `named as ${ROLE_WORDS[contender.role]}, but it holds texts such as "${contender.filled[0]}"`,
    "likely",
  );

const isMostly = (cells: readonly string[], isRead: (cell: string) => boolean): boolean => {
  const telling = cells.slice(0, TELLING_CELLS);
  return telling.filter(isRead).length >= telling.length / 2;
};

/** Seconds since the start are no time of day. */
function decideClock(contender: Contender): Decision {
  const isRead = (cell: string): boolean => parseClock(cell) !== null;
  return isMostly(contender.filled, isRead) ? use(contender, "its cells read as such") : unreadable(contender);
}

/** Dates: counted, or written; day first or month first where the whole column tells, else the user is asked. */
function decideDate(contender: Contender): Decision {
  const { role, filled, header, name, answer } = contender;
  if (answer?.time) return use(contender, `${answer.unitText}, as you said`, { time: answer.time });
  if (contender.count) {
    const time = { order: null, count: contender.count };
    return use(contender, `${contender.count.name} is given in the file`, { time });
  }
  const count = dayCountOf(filled);
  if (count !== null)
    return use(contender, `its numbers can be ${count.name}`, { time: { order: null, count }, confidence: "likely" });
  const found = dateOrderOf(role === "date" ? filled : filled.map(datePart));
  const told = orderInName(header);
  const order = found.assumed ? told : found.order;
  if (order === null) return askOrder(contender, name);
  const time = { order, count: null };
  if (role === "date") return use(contender, "its cells tell the days apart", { time });
  const isRead = (cell: string): boolean => parseDateTime(cell, order) !== null;
  return isMostly(filled, isRead) ? use(contender, "its cells read as such", { time }) : unreadable(contender);
}

/** The texts still tell days apart, so that the column keeps its place; no date is read from it. */
function askOrder(contender: Contender, name: string): Decision {
  const { role, filled, header } = contender;
  const example = filled.map(datePart).find((cell) => parseDate(cell, "month-first") !== parseDate(cell, "day-first"))!;
  const choiceOf = (order: "day-first" | "month-first"): Choice =>
    chooseForm(name, role, order, `${order.replace("-", " ")}: ${example} is ${parseDate(example, order)}`);
  const message = `"${header}": no date in the file tells whether day or month stands first in ${example}; say which; dates such as 2020-03-04 would tell`;
  const open = doubt(contender, "whether day or month stands first is not told by any of its dates", {
    code: "date-order",
    message,
    choices: [choiceOf("month-first"), choiceOf("day-first")],
  });
  return { ...open, used: use(contender, "", { time: { order: null, count: null } }).used };
}

/** Barometers read in these. */
const AIR_UNITS: readonly UnitSymbol[] = ["mmHg", "hPa", "atm"];

function decideMeasured(contender: Contender, role: MeasuredRole, markOfTable: DecimalMark | null): Decision {
  const { written, answer } = contender;
  const writtenSymbol = written?.unit?.symbol ?? null;
  const unit = answer?.unit ?? writtenSymbol;
  const choice = chooseStyle(contender.evidence!, markOfTable, { role, unit });
  const style = answer?.style ?? choice.style;
  if (answer === null && choice.toldBy === "nothing") return askThousands(contender, role, unit);
  const issues = answer?.style ? [] : styleIssues(contender, choice);
  const how = { style, issues, isNegated: contender.countsWestOrSouth || (answer?.isNegated ?? false) };
  if (answer?.unit) return use(contender, `${answer.unit}, as you said`, { ...how, unit: answer.unit });
  if (writtenSymbol !== null) return decideByUnit(contender, writtenSymbol, how);
  if (written !== null && answer === null) return askUnknownUnit(contender, role, written.text);
  return decideByRule(contender, role, how);
}

/** How numbers are written where their column does not show it by itself. */
function styleIssues({ header }: Contender, { style, toldBy }: StyleChoice): readonly Issue[] {
  if (toldBy === "cells") return [];
  if (style.groupMark === null && style.decimalMark === ",") return [ASSUMED_COMMA];
  const mark = style.groupMark === "," ? "comma" : style.groupMark === "." ? "point" : null;
  if (mark === null) return [];
  const message = `"${header}": every ${mark} stands before three digits; it is read as parting thousands; if it is the decimal mark, say so`;
  return [{ severity: "warning", code: "assumed-thousands", message }];
}

const ASSUMED_COMMA: Issue = {
  severity: "warning",
  code: "assumed-decimal-comma",
  message: "every comma stands before three digits; it is read as the decimal mark; if it parts thousands, take it out",
};

function askThousands(contender: Contender, role: MeasuredRole, unit: UnitSymbol | null): Decision {
  const { header, name, evidence } = contender;
  const example = evidence!.unsureCommas[0]!;
  const form = (style: string): string => (unit === null ? style : `${unit} ${style}`);
  const why = `every comma stands before three digits: ${example} could be ${example.replace(",", ".")} or ${example.replace(",", "")}`;
  return doubt(contender, why, {
    code: "decimal-or-thousands",
    message: `"${header}": ${why}; say which, or write it without the comma`,
    choices: [
      chooseForm(name, role, form("decimal-comma"), `${example} is ${example.replace(",", ".")}`),
      chooseForm(name, role, form("decimal-point"), `${example} is ${example.replace(",", "")}`),
    ],
  });
}

/** Units that a column of a role is usually in; the likeliest first. */
const USUAL_UNITS: Readonly<Partial<Record<MeasuredRole, readonly UnitSymbol[]>>> = {
  depth: ["m", "ft", "cm", "fathom"],
  elevation: ["m", "ft"],
  surfaceElevation: ["m", "ft"],
  seaPressure: ["dbar", "kPa", "bar", "MPa", "psi", "mH2O"],
  absolutePressure: ["dbar", "kPa", "bar", "psi"],
  temperature: ["degC", "degF", "K"],
  practicalSalinity: ["1"],
  absoluteSalinity: ["g/kg"],
  dissolvedSolids: ["mg/L", "kg/m3"],
  suspendedSediment: ["mg/L", "kg/m3"],
  conductivity: ["mS/cm", "uS/cm", "S/m", "ratio"],
  specificConductance: ["uS/cm", "mS/cm", "S/m"],
  densityAnomaly: ["kg/m3"],
  distance: ["km", "mi", "m", "ft"],
  waterDepth: ["m", "ft"],
  elapsedTime: ["s", "min", "h"],
};

/** "Depth (dbar)" may be pressure after all, "Pressure (m)" depth. */
function otherReading(name: string, role: MeasuredRole, text: string): readonly Choice[] {
  const unit = unitByName(text);
  if (role === "depth" && unit?.kind === "pressure") return [choose(name, "seaPressure", unit.symbol)];
  if (role === "seaPressure" && unit?.kind === "length") {
    const column = unit.symbol === "ft" ? "ftH2O" : "mH2O";
    return [choose(name, "depth", unit.symbol), choose(name, "seaPressure", column)];
  }
  return [];
}

function askUnknownUnit(contender: Contender, role: MeasuredRole, text: string): Decision {
  const { header, name } = contender;
  const why = `"${text}" is no unit of ${ROLE_WORDS[role]} known here`;
  const usual = USUAL_UNITS[role] ?? [];
  return doubt(contender, why, {
    code: askedUnitCode(role),
    message: `"${header}": ${why}; say which it is, or write one that is known, such as ${usual.slice(0, 3).join(", ")}`,
    choices: [...otherReading(name, role, text), ...usual.map((unit) => choose(name, role, unit))],
  });
}

type How = NonNullable<Parameters<typeof use>[2]>;

const isPlace = (role: ColumnRole): boolean => role === "latitude" || role === "longitude";

function decideByRule(contender: Contender, role: MeasuredRole, how: How): Decision {
  const { header, name, filled } = contender;
  const parse = isPlace(role) ? parsePosition : parseNumber;
  const numbers = filled
    .map((cell) => parse(cell, how.style!))
    .filter((value) => value !== null && !Number.isNaN(value));
  const { found } = findSentinels(numbers as number[], role);
  const values = (numbers as number[]).filter((value) => !found.has(value));
  if (values.length === 0) {
    const why = `named as ${ROLE_WORDS[role]}, but it holds no numbers`;
    const message = `"${header}" is ${why}, only texts such as "${filled[0]}"; it is not used`;
    return leave(contender, why, "likely", { severity: "warning", code: "no-numbers", message });
  }
  const { unit, reason, issue, open } = chooseUnit({ role, header, values });
  const issues = [...(how.issues ?? []), ...(issue === null || contender.answer ? [] : [issue])];
  if (unit !== null) return use(contender, reason, { ...how, unit, issues, confidence: issue ? "likely" : "sure" });
  return doubt(contender, `named as ${ROLE_WORDS[role]}; ${reason}`, {
    code: issue!.code,
    message: issue!.message,
    choices: open.map((one) => choose(name, role, one)),
  });
}

function decideByUnit(contender: Contender, unit: UnitSymbol, how: How): Decision {
  const { role, unitSource } = contender;
  if (role === "seaPressure" && AIR_UNITS.includes(unit)) {
    return leave(contender, `${unit} is how barometers read the air`, "likely");
  }
  if (role === "practicalSalinity" && unit === "g/kg" && contender.answer === null) return askWhichSalinity(contender);
  return use(contender, `${unit === "1" ? "its unit" : unit} is given in ${unitSource}`, { ...how, unit });
}

/** Practical salinity has no unit, yet is often written in g/kg. */
function askWhichSalinity(contender: Contender): Decision {
  const { header, name } = contender;
  const why = "in g/kg it could be absolute salinity, or practical salinity under a wrong unit, 0.5 % apart";
  return doubt(contender, why, {
    code: "practical-or-absolute",
    message: `"${header}": ${why}; say which`,
    choices: [choose(name, "absoluteSalinity", "g/kg"), choose(name, "practicalSalinity", "1")],
  });
}
