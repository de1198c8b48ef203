import { type Cast, joinStations, type StationList } from "../../cast/index.ts";
import type { KeptStations, Place, Work } from "./app-state.ts";

/** Casts take their places from a list, by the names of their stations; an earlier list goes. */
export const joinList = (work: Work, list: StationList): Work =>
  joined(work, { list, corrections: {}, matches: [], placesAsRead: {} });

/** The user's word on which station of the list a station of the casts is; null: none of them. */
export const correctStation = (work: Work, castStation: string, listStation: string | null): Work =>
  work.stations
    ? joined(work, { ...work.stations, corrections: { ...work.stations.corrections, [castStation]: listStation } })
    : work;

/** Casts have the places again that their own files give them. */
export function dropStations(work: Work): Work {
  const { stations, survey } = work;
  if (!stations) return work;
  const casts = survey.casts.map((cast) => ({ ...cast, ...stations.placesAsRead[cast.id] }));
  return { ...work, survey: { ...survey, casts }, stations: null };
}

/** A change of the casts, after which the list holds for those that have come as well. */
export function withStations(work: Work, change: (work: Work) => Work): Work {
  if (!work.stations) return change(work);
  const plain = dropStations(work);
  const changed = change(plain);
  return changed === plain ? work : joined(changed, work.stations, work.survey.casts);
}

/** @param earlier casts that may stay the very same, so that they are not solved again */
function joined(work: Work, stations: KeptStations, earlier: readonly Cast[] = work.survey.casts): Work {
  const { survey } = dropStations(work);
  const { casts, matches } = joinStations(survey.casts, stations.list, new Map(Object.entries(stations.corrections)));
  const earlierById = new Map(earlier.map((cast) => [cast.id, cast]));
  const placesAsRead: Record<string, Place> = {};
  const kept = casts.map((cast, k) => {
    if (!isSamePlace(cast, survey.casts[k]!)) placesAsRead[cast.id] = placeOf(survey.casts[k]!);
    const before = earlierById.get(cast.id);
    return before?.samples === cast.samples && isSamePlace(before, cast) ? before : cast;
  });
  return { ...work, survey: { ...survey, casts: kept }, stations: { ...stations, matches, placesAsRead } };
}

const placeOf = ({ latitudeDeg, longitudeDeg, distanceKm, waterDepthM }: Cast): Place => ({
  latitudeDeg,
  longitudeDeg,
  distanceKm,
  waterDepthM,
});

const isSamePlace = (a: Place, b: Place): boolean =>
  a.latitudeDeg === b.latitudeDeg &&
  a.longitudeDeg === b.longitudeDeg &&
  a.distanceKm === b.distanceKm &&
  a.waterDepthM === b.waterDepthM;
