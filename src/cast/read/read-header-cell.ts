/** What one header says by itself: which role its name has, and the unit written in it. */
import { type Unit, unitByName } from "../../units/index.ts";
import type { ColumnRole } from "../reading.ts";
import { COLUMN_NAMES, ROLE_KIND } from "./column-names.ts";

export interface HeaderMeaning {
  readonly role: ColumnRole;
  /** Place of the name among those of its role; the smaller the better. */
  readonly rankIndex: number;
  readonly unit: Unit | null;
}

const ROLES = Object.keys(COLUMN_NAMES) as readonly ColumnRole[];

const lettersAndDigits = (text: string): string =>
  text
    .normalize("NFD")
    .replace(/\p{M}/gu, "")
    .toLowerCase()
    .replace(/[^a-z0-9]/g, "");

/** A name may end in the zone of its clock, which we keep to ourselves: times stay in the zone of the file. */
const TIME_ZONE = /(utc|gmt|local|lst|pt|pst|pdt|mst|mdt|cst|cdt|est|edt|cet|cest|bst)$/;

function roleOfName(name: string): { readonly role: ColumnRole; readonly rankIndex: number } | null {
  const key = lettersAndDigits(name);
  if (key === "") return null;
  if (/^distance(from|to|along)/.test(key)) return { role: "distance", rankIndex: 0 };
  for (const role of ROLES) {
    const rankIndex = COLUMN_NAMES[role].indexOf(key);
    if (rankIndex >= 0) return { role, rankIndex };
  }
  const withoutZone = key.replace(TIME_ZONE, "");
  for (const role of ["date", "clock", "dateTime"] as const) {
    const rankIndex = COLUMN_NAMES[role].indexOf(withoutZone);
    if (rankIndex >= 0) return { role, rankIndex };
  }
  return null;
}

/** Compensated to 25 degC: "Conductivity (uS/cm @ 25 C)" is specific conductance, whatever it calls itself. */
const AT_25 = /(@|\bat\b|\bref\b|_|\b)\s*25\s*(°|º|deg)?\s*_?c\b/i;

function asMeaning(name: string, unitTexts: readonly string[], header: string): HeaderMeaning | null {
  const found = roleOfName(name);
  if (found === null) return null;
  const role = found.role === "conductivity" && AT_25.test(header) ? "specificConductance" : found.role;
  const kind = ROLE_KIND[role];
  const unit = kind === undefined ? null : firstUnit(unitTexts, kind);
  return { role, rankIndex: found.rankIndex, unit };
}

function firstUnit(texts: readonly string[], kind: NonNullable<Unit["kind"]>): Unit | null {
  for (const text of texts) {
    const unit = unitByName(text.replace(/(@|\bat\b).*$/i, ""), kind);
    if (unit !== null) return unit;
  }
  return null;
}

/** "Depth (m)", "temperature [ITS-90, deg C]": name outside the brackets, unit inside. */
function bracketed(header: string): HeaderMeaning | null {
  const inside = [...header.matchAll(/[([{<]([^)\]}>]*)[)\]}>]/g)].map((match) => match[1] ?? "");
  if (inside.length === 0) return null;
  const name = header.replace(/[([{<][^)\]}>]*[)\]}>]/g, " ");
  return asMeaning(name, [...inside, ...inside.flatMap((text) => text.split(/[,;]/))], header);
}

/** "Depth.feet", "temp_C", "depth, m", "spec_cond_uS_cm": the last one to three words are the unit. */
function trailing(header: string): HeaderMeaning | null {
  const words = header.split(/[\s_.,:/-]+/).filter((word) => word !== "");
  for (let count = 1; count <= 3 && count < words.length; count++) {
    const name = words.slice(0, -count).join(" ");
    const meaning = asMeaning(name, [words.slice(-count).join(" ")], header);
    if (meaning !== null && meaning.unit !== null) return meaning;
  }
  return null;
}

/** Role and unit of a header, or null when its name is none that we use. */
export function readHeaderCell(header: string): HeaderMeaning | null {
  return bracketed(header) ?? asMeaning(header, [], header) ?? trailing(header);
}
