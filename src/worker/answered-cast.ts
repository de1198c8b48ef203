import type { Cast } from "../cast/index.ts";
import {
  type Budget,
  budgetOf,
  type PreparedCast,
  type Profile,
  type Solution,
  type SolvedCast,
  uncertaintyAtDepths,
} from "../survey/index.ts";
import { buffersOf } from "./buffers.ts";
import { type DrawnProfile, drawnProfile } from "./drawn-profile.ts";
import { isSameReasons, type MarkedSamples, markedSamples } from "./marked-samples.ts";
import { packRuns, type Run, unpackRuns } from "./runs.ts";

/** A solved cast with what the page draws of it. */
export type AnsweredCast = SolvedCast & {
  readonly drawn: DrawnProfile | null;
  readonly marked: MarkedSamples;
  /** What the uncertainty at the bottom is made of. */
  readonly bottomBudget: Budget | null;
};

/** A solved cast on its way between threads: the cast stays behind, lists of equal items are said once. */
export interface PackedCast {
  readonly issues: SolvedCast["issues"];
  /** `cast` is null where it is the very cast that was read. */
  readonly prepared: Omit<PreparedCast, "cast" | "reasons"> & {
    readonly cast: Cast | null;
    readonly reasons: readonly Run<readonly string[]>[];
  };
  readonly solution: (Omit<Solution, "profile"> & { readonly profile: PackedProfile }) | null;
  readonly drawn: DrawnProfile | null;
  readonly marked: MarkedSamples;
  readonly bottomBudget: Budget | null;
}

type PackedProfile = Omit<Profile, "origin"> & { readonly origin: readonly Run<Profile["origin"][number]>[] };

/** Packs a solved cast; `buffers` can be handed over, the samples it was solved from stay where they are. */
export function packCast(
  solved: SolvedCast,
  unmeasuredPracticalSalinity: number,
): { readonly packed: PackedCast; readonly buffers: ReadonlySet<ArrayBuffer> } {
  const { cast, issues, prepared, solution } = solved;
  const packed: PackedCast = {
    issues,
    prepared: {
      ...prepared,
      cast: prepared.cast === cast ? null : prepared.cast,
      reasons: packRuns(prepared.reasons, isSameReasons),
    },
    solution: solution && {
      ...solution,
      profile: { ...solution.profile, origin: packRuns(solution.profile.origin) },
    },
    drawn: solution && drawnProfile(solution),
    marked: markedSamples(solved, unmeasuredPracticalSalinity),
    bottomBudget:
      solution && budgetOf(uncertaintyAtDepths(solution.column, prepared.cast, [solution.column.bottomDepthM]), 0),
  };
  const buffers = buffersOf(packed);
  for (const kept of buffersOf(cast.samples)) buffers.delete(kept);
  return { packed, buffers };
}

/** The solved cast again, of the cast the page has. */
export function unpackCast(packed: PackedCast, cast: Cast): AnsweredCast {
  const { issues, prepared, solution, drawn, marked, bottomBudget } = packed;
  return {
    cast,
    issues,
    prepared: unpackPrepared(prepared, cast),
    solution: solution && {
      ...solution,
      profile: { ...solution.profile, origin: unpackRuns(solution.profile.origin) },
    },
    drawn,
    marked,
    bottomBudget,
  };
}

/** The reasons of a raw record are millions; they are written out when somebody asks for them. */
function unpackPrepared({ reasons, ...prepared }: PackedCast["prepared"], cast: Cast): PreparedCast {
  let written: readonly (readonly string[])[] | null = null;
  return {
    ...prepared,
    cast: prepared.cast ?? cast,
    get reasons() {
      written ??= unpackRuns(reasons);
      return written;
    },
  };
}

/** A cast without its samples, which the solving thread has under a key. */
export interface CastOnShelf extends Omit<Cast, "samples"> {
  readonly samplesKey: string;
}

export const onShelf = ({ samples: _, ...cast }: Cast, samplesKey: string): CastOnShelf => ({ ...cast, samplesKey });
