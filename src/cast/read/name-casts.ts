/** Short names that tell the casts of one file apart, built from no more than it takes. */
import type { RowGroup } from "./split-casts.ts";

export interface NameParts extends Pick<RowGroup, "station" | "castName" | "date"> {
  readonly clock: string | null;
}

const baseName = (fileName: string): string => fileName.replace(/^.*[\\/]/, "").replace(/\.[^.]*$/, "") || fileName;

/** "2.0" is how a spreadsheet writes station 2; a name that is only a figure gets its noun. */
const withNoun = (noun: string, text: string): string => {
  const plain = text.replace(/^(\d+)\.0+$/, "$1");
  return /^[\d.]+$/.test(plain) ? `${noun} ${plain}` : plain;
};

const isVaried = (texts: readonly (string | null)[]): boolean => new Set(texts).size > 1;

function countsOf(names: readonly string[]): ReadonlyMap<string, number> {
  const counts = new Map<string, number>();
  for (const name of names) counts.set(name, (counts.get(name) ?? 0) + 1);
  return counts;
}

/** Makes equal names different, by time of day where that does it, else by counting. */
function madeUnique(names: readonly string[], casts: readonly NameParts[]): readonly string[] {
  const uses = countsOf(names);
  const timed = names.map((name, i) => {
    const clock = casts[i]!.clock?.slice(0, 5);
    return clock && uses.get(name)! > 1 ? `${name}, ${clock}` : name;
  });
  const timedUses = countsOf(timed);
  const seen = new Map<string, number>();
  return timed.map((name) => {
    if (timedUses.get(name) === 1) return name;
    const count = (seen.get(name) ?? 0) + 1;
    seen.set(name, count);
    return `${name} (${count})`;
  });
}

/** One name a cast, all different. */
export function nameCasts(casts: readonly NameParts[], fileName: string): readonly string[] {
  const hasStations = isVaried(casts.map((cast) => cast.station));
  const hasLowerings = isVaried(casts.map((cast) => cast.castName));
  const hasDates = isVaried(casts.map((cast) => cast.date));
  const names = casts.map(({ station, castName, date }) => {
    const parts = [
      station !== null && (hasStations || !hasDates) ? withNoun("Station", station) : null,
      castName !== null && (hasLowerings || station === null) ? withNoun("Cast", castName) : null,
      hasDates ? date : null,
    ].filter((part) => part !== null);
    return parts.join(", ") || date || baseName(fileName);
  });
  return madeUnique(names, casts);
}
