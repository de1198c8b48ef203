import { createHash } from "node:crypto";
import { failed, type Outcome } from "../base/index.ts";
import { type FileReading, readCastFile } from "../cast/index.ts";
import type { SourceFile } from "../export/index.ts";
import type { Host } from "./host.ts";

const WHY_UNREADABLE: Readonly<Record<string, string>> = {
  ENOENT: "no such file",
  EISDIR: "is a folder, expected a file; name the files in it",
  EACCES: "may not be read; check its permissions",
};

/** One file of the command line, read or not. */
export interface ReadFile {
  readonly path: string;
  readonly source: SourceFile;
  readonly reading: Outcome<FileReading>;
}

export async function readCastFiles(host: Host, paths: readonly string[]): Promise<readonly ReadFile[]> {
  const files: ReadFile[] = [];
  for (const path of paths) files.push(await readOne(host, path));
  return files;
}

async function readOne(host: Host, path: string): Promise<ReadFile> {
  const unreadable = (message: string): ReadFile => ({
    path,
    source: { fileName: path, sha256: "" },
    reading: failed({ severity: "error", code: "unreadable-file", message }),
  });
  if (path.trim() === "") return { ...unreadable("the name is empty, expected a file"), path: '""' };
  let bytes: Uint8Array;
  try {
    bytes = await host.readFile(path);
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code ?? "";
    return unreadable(WHY_UNREADABLE[code] ?? `cannot be read (${code || String(error)})`);
  }
  const sha256 = createHash("sha256").update(bytes).digest("hex");
  return { path, source: { fileName: path, sha256 }, reading: readCastFile(path, bytes) };
}
