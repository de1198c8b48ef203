/** A table of stations: where each is, how far along the channel and how deep the water is there. */
import { failed, type Issue, type Outcome, succeeded } from "../../base/index.ts";
import { CellReader } from "./cell-reader.ts";
import { decodeText } from "./decode-text.ts";
import { unreadFormat } from "./file-format.ts";
import { findTable } from "./find-header.ts";
import { recogniseColumns } from "./recognise-columns.ts";
import { rowLengthIssues } from "./row-lengths.ts";

export interface ListedStation {
  readonly station: string;
  readonly latitudeDeg: number | null;
  readonly longitudeDeg: number | null;
  /** Along the channel, from the list's own origin. */
  readonly distanceKm: number | null;
  /** Of the bed below the water surface. */
  readonly waterDepthM: number | null;
}

export interface StationList {
  readonly fileName: string;
  readonly stations: readonly ListedStation[];
}

const error = (code: string, message: string): Issue => ({ severity: "error", code, message });

const PLACE_CODES = ["station", "latitude", "longitude", "distance", "depth", "waterDepth"] as const;

const orNull = (value: number | undefined, isValid: (value: number) => boolean = () => true): number | null =>
  value === undefined || Number.isNaN(value) || !isValid(value) ? null : value;

/** Reads a list of stations; a depth in it is that of the water. The first row of a station counts. */
export function readStationList(fileName: string, bytes: Uint8Array): Outcome<StationList> {
  const decoded = unreadFormat(bytes) === null ? decodeText(bytes) : null;
  const table = decoded && findTable(decoded.text);
  if (table === null) {
    return failed(
      error("no-table", 'no table of text in the file; expected a row of headers such as "Station,Latitude,Longitude"'),
    );
  }
  const lengths = rowLengthIssues(table);
  if (lengths.some((issue) => issue.severity === "error")) return failed(...lengths);
  const columns = recogniseColumns(table, { columns: [] });
  const reader = new CellReader(table, columns);
  const names = reader.texts("station");
  const has = PLACE_CODES.filter((role) => columns.used[role] !== undefined);
  if (names === null || has.length < 2) {
    const found = table.header.cells.map((header) => `"${header}"`).join(", ");
    return failed(
      error(
        "no-station-list",
        `no list of stations among ${found}; expected a station and its latitude, longitude, distance or depth`,
      ),
    );
  }
  const latitudeDeg = reader.numbers("latitude");
  const longitudeDeg = reader.numbers("longitude");
  const distanceKm = reader.numbers("distance");
  const waterDepthM = reader.numbers("waterDepth") ?? reader.numbers("depth");
  const seen = new Set<string>();
  const repeated = new Set<string>();
  const stations = names.flatMap((station, i): ListedStation[] => {
    if (station === "") return [];
    if (seen.has(station)) {
      repeated.add(station);
      return [];
    }
    seen.add(station);
    return [
      {
        station,
        latitudeDeg: orNull(latitudeDeg?.[i], (value) => Math.abs(value) <= 90),
        longitudeDeg: orNull(longitudeDeg?.[i], (value) => Math.abs(value) <= 180),
        distanceKm: orNull(distanceKm?.[i]),
        waterDepthM: orNull(waterDepthM?.[i], (value) => value > 0),
      },
    ];
  });
  if (stations.length === 0) return failed(error("no-station-list", "the list names no station"));
  const issues = [
    ...lengths,
    ...columns.issues.filter((issue) => issue.code !== "two-columns-for-one-role"),
    ...reader.issues,
  ];
  if (repeated.size > 0) {
    const message = `${[...repeated].slice(0, 5).join(", ")} stand more than once in the list; the first row counts`;
    issues.push({ severity: "warning", code: "station-repeated", message });
  }
  return succeeded({ fileName, stations }, issues);
}
