import { PA_PER_DBAR } from "../gsw-ts-port/index.ts";

export const KPA_PER_DBAR = PA_PER_DBAR / 1000;
