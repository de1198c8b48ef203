import type { Cast, CastId } from "../cast/index.ts";
import type { Survey } from "./survey.ts";

/** The first of `wanted`, `wanted (2)`, `wanted (3)` ... that is not taken. */
function firstFree(wanted: string, taken: ReadonlySet<string>): string {
  if (!taken.has(wanted)) return wanted;
  let count = 2;
  while (taken.has(`${wanted} (${count})`)) count++;
  return `${wanted} (${count})`;
}

/** A survey with more casts; names and ids that would clash get a number, so that each still means one cast. */
export function addCasts<S extends Pick<Survey, "casts">>(survey: S, casts: readonly Cast[]): S {
  const names = new Set(survey.casts.map((cast) => cast.name));
  const ids = new Set<string>(survey.casts.map((cast) => cast.id));
  const added = casts.map((cast): Cast => {
    const name = firstFree(cast.name, names);
    const id = firstFree(cast.id, ids) as CastId;
    names.add(name);
    ids.add(id);
    return { ...cast, id, name };
  });
  return { ...survey, casts: [...survey.casts, ...added] };
}
