import { readText } from "./reading-files.ts";

/** Invented files that come with the page, fetched from its own origin when asked for. */
const FILES = import.meta.glob<string>("../../sample-data/*.csv", { query: "?raw", import: "default" });

export type SampleName = "estuary" | "reservoir";

const TITLE: Readonly<Record<SampleName, string>> = {
  estuary: "Sample estuary (invented)",
  reservoir: "Sample reservoir (invented)",
};

export async function loadSample(name: SampleName): Promise<void> {
  for (const [path, load] of Object.entries(FILES)) {
    const fileName = path.slice(path.lastIndexOf("/") + 1);
    if (fileName.includes(name)) await readText(fileName, await load(), TITLE[name]);
  }
}
