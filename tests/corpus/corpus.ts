import { AGENCY_FILES } from "./agency-files.ts";
import { DELIMITED_TEXT } from "./delimited-text.ts";
import type { Refused, Understood } from "./expected.ts";
import { QUANTITIES } from "./quantities.ts";
import { TIMES_AND_PLACES } from "./times-and-places.ts";

/**
 * What must be understood of each file in `files/`, written from the files by hand and not from what the program says.
 * Values are those of the first sample of the first cast and the last sample of the last.
 */
export const UNDERSTOOD: readonly Understood[] = [
  ...DELIMITED_TEXT,
  ...QUANTITIES,
  ...TIMES_AND_PLACES,
  ...AGENCY_FILES,
];

export const REFUSED: readonly Refused[] = [
  { file: "prose.txt", trap: "sentences with commas", refusedFor: "no-table" },
  { file: "empty.csv", trap: "no bytes", refusedFor: "empty-file" },
  { file: "no-text.csv", trap: "bytes that are no text", refusedFor: "not-text" },
  { file: "zip-in-disguise.csv", trap: "an archive named as text", refusedFor: "format-not-read" },
  { file: "station-list.csv", trap: "places and nothing measured", refusedFor: "station-list" },
  { file: "real-bay-stations.csv", trap: "agency list of stations", refusedFor: "station-list" },
  { file: "real-channel-sites.csv", trap: "agency list of sites, depths in two units", refusedFor: "station-list" },
];
