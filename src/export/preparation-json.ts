import type { Preparation } from "../survey/index.ts";

/** How the casts were prepared, as it is written beside the basis into every output. */
export const preparationJson = ({ way, binM, waterKind }: Preparation): Record<string, unknown> => ({
  way,
  bin_m: binM,
  water_kind: waterKind,
});
