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
  for (const path of paths) files.push(await readOne(host, path, { answers, ...(sheet !== null && { sheet }) }));
  return files;
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
