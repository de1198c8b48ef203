import { createHash } from "node:crypto";
import { failed, type Outcome } from "../base/index.ts";
import { type AnyFileReading, type ReadOptions, readFile, readStationList, type StationList } from "../cast/index.ts";
import type { SourceFile } from "../export/index.ts";
import type { Host } from "./host.ts";
import { progressBar } from "./progress-bar.ts";
import type { ReadingOptions } from "./reading-options.ts";

const WHY_UNREADABLE: Readonly<Record<string, string>> = {
  ENOENT: "no such file",
  EISDIR: "is a folder, expected a file; name the files in it",
  EACCES: "may not be read; check its permissions",
};

/** One file of the command line, read or not. */
export interface ReadFile {
  readonly path: string;
  readonly source: SourceFile;
  readonly reading: Outcome<AnyFileReading>;
}

/** The bytes of a file, or in one line why there are none. */
export async function bytesOf(host: Host, path: string): Promise<Outcome<Uint8Array>> {
  const unreadable = (message: string) => failed({ severity: "error", code: "unreadable-file", message });
  if (path.trim() === "") return unreadable("the name is empty, expected a file");
  try {
    return { ok: true, value: await host.readFile(path), issues: [] };
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code ?? "";
    return unreadable(WHY_UNREADABLE[code] ?? `cannot be read (${code || String(error)})`);
  }
}

export async function readCastFiles(
  host: Host,
  paths: readonly string[],
  { answers, sheet }: ReadingOptions,
): Promise<readonly ReadFile[]> {
  const files: ReadFile[] = [];
  let brokenPath: string | null = null;
  for (const path of paths) {
    const file = await readOne(host, path, { answers, ...(sheet !== null && { sheet }) });
    const isNetcdf = NETCDF_NAME.test(path);
    files.push(isNetcdf && brokenPath !== null ? { ...file, reading: readAfter(brokenPath, file.reading) } : file);
    if (isNetcdf && file.reading.issues.some(({ code }) => code === "broken-file")) brokenPath ??= path;
  }
  return files;
}

const NETCDF_NAME = /\.(nc4?|cdf|h5|hdf5?)$/i;

/** A damaged netCDF-4 file may leave the library that reads them in disorder: what it reads next is not to be relied on. */
function readAfter<T>(brokenPath: string, reading: Outcome<T>): Outcome<T> {
  const message = `read after ${brokenPath}, which is damaged and may have disturbed the reading; run again without that file`;
  return { ...reading, issues: [...reading.issues, { severity: "warning", code: "read-after-broken", message }] };
}

async function readOne(host: Host, path: string, options: ReadOptions): Promise<ReadFile> {
  const bytes = await bytesOf(host, path);
  if (!bytes.ok)
    return { path: path.trim() === "" ? '""' : path, source: { fileName: path, sha256: "" }, reading: bytes };
  const sha256 = createHash("sha256").update(bytes.value).digest("hex");
  const bar = progressBar(host, path, bytes.value.length);
  const reading = await readFile(path, bytes.value, { ...options, onShare: bar.onShare });
  bar.end();
  return { path, source: { fileName: path, sha256 }, reading };
}

export async function readStationFile(host: Host, path: string): Promise<Outcome<StationList>> {
  const bytes = await bytesOf(host, path);
  return bytes.ok ? readStationList(path, bytes.value) : bytes;
}
