/** Casts take place, distance and water depth from a list of stations, by the name of their station. */
import type { Cast } from "./cast.ts";
import type { ListedStation, StationList } from "./read/station-list.ts";

export interface StationMatch {
  readonly castStation: string;
  readonly listStation: string | null;
  /** Letter by letter, by a likeness that is stated, as the user said, or not at all. */
  readonly how: "same" | "tolerant" | "corrected" | "none";
  readonly reason: string;
}

export interface JoinedCasts {
  readonly casts: readonly Cast[];
  /** One a station of the casts, in their order. */
  readonly matches: readonly StationMatch[];
}

/** Case, blanks, punctuation, leading zeros and a trailing ".0" do not tell stations apart. */
const plain = (name: string): string =>
  name
    .normalize("NFKC")
    .toLowerCase()
    .replace(/(\d)\.0+$/, "$1")
    .replace(/[^\p{L}\p{N}.]/gu, "")
    .replace(/(?<!\d)\.|\.(?!\d)/g, "")
    .replace(/(^|[^\d.])0+(?=\d)/g, "$1");

const figuresIn = (name: string): readonly string[] => plain(name).match(/\d+(?:\.\d+)?/g) ?? [];

const isFigure = (name: string): boolean => /^\d+(\.\d+)?$/.test(plain(name));

/** "16" is in "NL 16": one of the two names is only the figure that the other has in it. */
const sharesFigure = (a: string, b: string): boolean => {
  const [inA, inB] = [figuresIn(a), figuresIn(b)];
  return (isFigure(a) || isFigure(b)) && inA.length === 1 && inB.length === 1 && inA[0] === inB[0];
};

type Found = Pick<StationMatch, "listStation" | "how" | "reason">;

/** The only station of the list that a rule allows; several are none. */
function only(stations: readonly ListedStation[], isLike: (name: string) => boolean): string | "several" | null {
  const found = stations.filter(({ station }) => isLike(station));
  if (found.length > 1) return "several";
  return found[0]?.station ?? null;
}

const none = (reason: string): Found => ({ listStation: null, how: "none", reason });

function suggestion(name: string, stations: readonly ListedStation[]): string {
  const first = plain(name).charAt(0);
  const close = stations.map(({ station }) => station).filter((station) => plain(station).charAt(0) === first);
  return close.length === 0 ? "" : `; could be ${close.slice(0, 3).join(" or ")}`;
}

function matchOf(name: string, stations: readonly ListedStation[]): Found {
  if (stations.some(({ station }) => station === name))
    return { listStation: name, how: "same", reason: "the same name" };
  const rules = [
    [(other: string) => plain(other) === plain(name), "the same but for case, blanks, signs and zeros"],
    [(other: string) => sharesFigure(other, name), "the figure in the name is the same"],
  ] as const;
  for (const [isLike, reason] of rules) {
    const found = only(stations, isLike);
    if (found === "several") return none(`several stations of the list are like it: ${reason}`);
    if (found !== null) return { listStation: found, how: "tolerant", reason };
  }
  return none(`no station of the list has such a name${suggestion(name, stations)}`);
}

function corrected(listStation: string | null, stations: readonly ListedStation[]): Found {
  if (listStation === null) return { listStation, how: "corrected", reason: "left without a station, as you said" };
  return stations.some(({ station }) => station === listStation)
    ? { listStation, how: "corrected", reason: "as you said" }
    : none(`"${listStation}", as you said, is not in the list`);
}

/** What the cast itself says stands above the list; a place is taken whole or not at all. */
function withPlace(cast: Cast, listed: ListedStation): Cast {
  const hasPlace = cast.latitudeDeg !== null && cast.longitudeDeg !== null;
  return {
    ...cast,
    latitudeDeg: hasPlace ? cast.latitudeDeg : listed.latitudeDeg,
    longitudeDeg: hasPlace ? cast.longitudeDeg : listed.longitudeDeg,
    distanceKm: cast.distanceKm ?? listed.distanceKm,
    waterDepthM: cast.waterDepthM ?? listed.waterDepthM,
  };
}

/** @param corrections by station of the casts: the station of the list that it is, or null for none */
export function joinStations(
  casts: readonly Cast[],
  list: StationList,
  corrections: ReadonlyMap<string, string | null> = new Map(),
): JoinedCasts {
  const byName = new Map(list.stations.map((listed) => [listed.station, listed]));
  const castStations = [...new Set(casts.map((cast) => cast.station).filter((station) => station !== null))];
  const matches = castStations.map((castStation): StationMatch => {
    const said = corrections.get(castStation);
    const found = said === undefined ? matchOf(castStation, list.stations) : corrected(said, list.stations);
    return { castStation, ...found };
  });
  const listStationOf = new Map(matches.map((match) => [match.castStation, match.listStation]));
  const joined = casts.map((cast) => {
    const listed = byName.get(listStationOf.get(cast.station ?? "") ?? "");
    return listed ? withPlace(cast, listed) : cast;
  });
  return { casts: joined, matches };
}
