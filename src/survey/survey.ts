import type { Cast } from "../cast/index.ts";
import { type Basis, defaultBasis } from "../column/index.ts";
import type { Level } from "../design/index.ts";
import { defaultPreparation, type FlagEdit, type Preparation } from "../quality/index.ts";

/** Everything the user has at hand, as one value. */
export interface Survey {
  readonly name: string;
  readonly casts: readonly Cast[];
  readonly basis: Basis;
  readonly preparation: Preparation;
  /** The user's own word on single samples; at most one a sample. */
  readonly flagEdits: readonly FlagEdit[];
  readonly levels: readonly Level[];
}

export const emptySurvey: Survey = {
  name: "",
  casts: [],
  basis: defaultBasis,
  preparation: defaultPreparation,
  flagEdits: [],
  levels: [],
};
