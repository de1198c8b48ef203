import type { Basis } from "../survey/index.ts";
import { readFiles } from "./reading-files.ts";
import type { SurveyStart } from "./state/files.ts";

/** Invented files that come with the page, fetched from its own origin when asked for. */
const FILES = import.meta.glob<string>("../../sample-data/*.csv", { query: "?raw", import: "default" });

const FRESH: Partial<Basis> = { referenceDensity: { kind: "number", rhoKgM3: 1000 } };

const SAMPLES = {
  estuary: { name: "Corrow estuary (invented)" },
  reservoir: { name: "Halvane reservoir (invented)", basis: FRESH },
} as const satisfies Readonly<Record<string, SurveyStart>>;

export async function loadSample(sample: keyof typeof SAMPLES): Promise<void> {
  for (const [path, load] of Object.entries(FILES)) {
    const fileName = path.slice(path.lastIndexOf("/") + 1);
    if (fileName.includes(sample)) await readFiles([new File([await load()], fileName)], SAMPLES[sample]);
  }
}
