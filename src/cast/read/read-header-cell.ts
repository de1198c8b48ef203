/** What one header says by itself: which role its name has, and the unit written in it. */
import { type QuantityKind, type Unit, unitByName } from "../../units/index.ts";
import type { ColumnRole } from "../reading.ts";
import { COLUMN_NAMES } from "./column-names.ts";
import { isMeasured, MEASURED } from "./roles.ts";

/** A unit as written; `unit` is null when the text names none of the kind that is needed. */
export interface WrittenUnit {
  readonly text: string;
  readonly unit: Unit | null;
}

export interface HeaderMeaning {
  readonly role: ColumnRole;
  /** Place of the name among those of its role; the smaller the better. */
  readonly rankIndex: number;
  readonly written: WrittenUnit | null;
}

/** Names and units are shorter; so much also bounds the work on them. */
export const LONGEST_NAME = 200;

const ROLES = Object.keys(COLUMN_NAMES) as readonly ColumnRole[];

const lettersAndDigits = (text: string): string =>
  text
    .normalize("NFD")
    .replace(/\p{M}/gu, "")
    .toLowerCase()
    .replace(/[^a-z0-9]/g, "");

/** The name of a clock may end in its zone, which is not used: times stay in the zone of the file. */
const TIME_ZONE = /(utc|gmt|local|lst|pt|pst|pdt|mst|mdt|cst|cdt|est|edt|cet|cest|bst)$/;

function roleOfName(name: string): Pick<HeaderMeaning, "role" | "rankIndex"> | null {
  const key = lettersAndDigits(name);
  if (/^distance(from|to|along)/.test(key)) return { role: "distance", rankIndex: 0 };
  for (const role of ROLES) {
    const isTime = role === "date" || role === "clock" || role === "dateTime";
    const rankIndex = COLUMN_NAMES[role].indexOf(isTime ? key.replace(TIME_ZONE, "") : key);
    if (rankIndex >= 0) return { role, rankIndex };
  }
  return null;
}

/** What people put in brackets, or in a units row, that is no unit. */
const REMARK =
  /^$|^(raw|water|sea ?water|mean|avg|average|corrected|calculated|measured|in.?situ|practical|below .*|ctd|probe.*|sensor.*|primary|\d+|.*\b25\b.*)$/i;

/** Compensated to 25 degC: "Conductivity (uS/cm @ 25 C)" is specific conductance, whatever it calls itself. */
const AT_25 = /(@|\bat\b|\bref\b|\b)\s*25\s*[°º]?\s*(deg)?\s*_?c\b/i;

/** A column of seconds or days that have gone by is no clock. */
const isElapsed = (unitText: string): boolean => unitByName(unitText, "time") !== null;

/** "Longitude (W)", "degrees_south": degrees, and which way they count. */
const HEMISPHERE = /^(deg(rees?)?|[°º])?[\s_.]*([nsew]|north|south|east|west)$/i;

/** The first of the texts that is a unit of the kind, else the first that is no mere remark. */
export function writtenUnit(texts: readonly string[], kind: QuantityKind): WrittenUnit | null {
  const stripped = texts
    .map((text) => text.slice(0, LONGEST_NAME))
    .map((text) => text.replace(/(@|\bat\b).*$|\babs(olute)?\b|\bgauge\b/gi, "").trim());
  for (const text of stripped) {
    const unit = kind === "angle" && HEMISPHERE.test(text) ? unitByName("deg") : unitByName(text, kind);
    if (unit !== null) return { text, unit };
  }
  const unknown = stripped.find((text) => !REMARK.test(text));
  return unknown === undefined ? null : { text: unknown, unit: null };
}

/** "psia", "dbar (absolute)", "kPa abs" */
const ABSOLUTE = /\babs(olute)?\b|^\s*(psi|bar|dbar|kpa)\s*\(?a\)?\s*$/i;

/** A unit can say more than its size: "psia" holds the air, "uS/cm @ 25 C" is compensated. */
export function roleByUnit(role: ColumnRole, header: string, unitTexts: readonly string[]): ColumnRole {
  if (role === "conductivity" && AT_25.test(header)) return "specificConductance";
  if (role === "clock" && unitTexts.some(isElapsed)) return "elapsedTime";
  return role === "seaPressure" && unitTexts.some((text) => ABSOLUTE.test(text)) ? "absolutePressure" : role;
}

function meaningOf(name: string, unitTexts: readonly string[], header: string): HeaderMeaning | null {
  const found = roleOfName(name);
  if (found === null) return null;
  const role = roleByUnit(found.role, header, unitTexts);
  const written = isMeasured(role) ? writtenUnit(unitTexts, MEASURED[role].kind) : null;
  return { role, rankIndex: found.rankIndex, written };
}

const BRACKETS = /[([{<]([^)\]}>]*)[)\]}>]/g;

/** "Depth (m)", "temperature [ITS-90, deg C]": name outside the brackets, unit inside. */
function bracketed(header: string): HeaderMeaning | null {
  const inside = [...header.matchAll(BRACKETS)].map((match) => match[1] ?? "");
  if (inside.length === 0) return null;
  return meaningOf(header.replace(BRACKETS, " "), [...inside, ...inside.flatMap((text) => text.split(/[,;]/))], header);
}

/** "Depth.feet", "temp_C", "TempC", "Depth in m", "spec_cond_uS_cm": the last one to three words are the unit. */
function trailing(header: string): HeaderMeaning | null {
  const words = header
    .replace(/([a-z])([A-Z])/g, "$1 $2")
    .split(/[\s_.,:/-]+/)
    .filter((word) => word !== "");
  for (let count = 1; count <= 3 && count < words.length; count++) {
    const name = words.slice(0, -count).join(" ").replace(/ in$/i, "");
    const meaning = meaningOf(name, [words.slice(-count).join(" ")], header);
    if (meaning?.written?.unit) return meaning;
  }
  return null;
}

/** Role and unit of a header, or null when its name is none that we use. */
export function readHeaderCell(header: string): HeaderMeaning | null {
  if (header.length > LONGEST_NAME || !/\p{L}/u.test(header)) return null;
  return bracketed(header) ?? meaningOf(header, [], header) ?? trailing(header);
}
