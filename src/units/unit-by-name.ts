/** Finds a unit by symbol or by any of its usual spellings, among them those of CF and UDUNITS. */
import type { QuantityKind } from "./unit.ts";
import { UNITS, type Unit } from "./unit-table.ts";

/** One spelling for signs that people type in many ways; blanks, dots and underscores do not tell units apart. */
function plain(text: string): string {
  return text
    .normalize("NFKC")
    .replace(/[−–]/g, "-")
    .replace(/[°º]/g, "deg")
    .replace(/[µμ]/g, "u")
    .replace(/\bper\b/gi, "/")
    .replace(/\*\*|\^/g, "")
    .replace(/[\s_.·*]/g, "");
}

/** Column names cannot hold a slash, so "uS_cm" has lost it. */
const withoutSlash = (text: string): string => text.replaceAll("/", "");

interface Spelling {
  readonly text: string;
  readonly unit: Unit;
}

const SPELLINGS: readonly Spelling[] = UNITS.flatMap((unit) =>
  [unit.symbol, unit.label, ...unit.aliases].filter((t) => t !== "").map((t) => ({ text: plain(t), unit })),
);

/** From strict to lenient: as written, in any case, without slashes. */
const MATCHES: readonly ((spelling: string, wanted: string) => boolean)[] = [
  (spelling, wanted) => spelling === wanted,
  (spelling, wanted) => spelling.toLowerCase() === wanted.toLowerCase(),
  (spelling, wanted) => withoutSlash(spelling) === withoutSlash(wanted),
  (spelling, wanted) => withoutSlash(spelling).toLowerCase() === withoutSlash(wanted).toLowerCase(),
];

/**
 * The unit a text names, or null. Case matters where it must (mS, MPa): an exact spelling wins over one that differs in
 * case. With a kind only units of that kind are considered, so that "1" or "C" can be asked for in context.
 * @example unitByName("degree_C")?.symbol // "degC"
 */
export function unitByName(text: string, kind?: QuantityKind): Unit | null {
  const wanted = plain(text);
  if (wanted === "") return null;
  const candidates = kind === undefined ? SPELLINGS : SPELLINGS.filter((s) => s.unit.kind === kind);
  for (const matches of MATCHES) {
    const found = candidates.find((spelling) => matches(spelling.text, wanted));
    if (found !== undefined) return found.unit;
  }
  return null;
}
