import type { Cast } from "../cast/index.ts";
import { type Basis, defaultBasis } from "../column/index.ts";
import type { Level } from "../design/index.ts";

/** Everything the user has at hand, as one value. */
export interface Survey {
  readonly name: string;
  readonly casts: readonly Cast[];
  readonly basis: Basis;
  readonly levels: readonly Level[];
}

export const emptySurvey: Survey = { name: "", casts: [], basis: defaultBasis, levels: [] };
