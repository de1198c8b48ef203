import { failed } from "../base/index.ts";
import type { ReadFile, SurveyStart } from "./state/reduce.ts";
import { dispatch } from "./store.ts";
import { thread } from "./thread.ts";

/** Reads files in the background, each on its own: what one has wrong does not keep the others out. */
export async function readFiles(files: readonly File[]): Promise<void> {
  const read: ReadFile[] = [];
  for (const file of files) read.push(await readOne(file.name, () => file.arrayBuffer()));
  addRead(read, { name: read.length === 1 ? withoutEnding(read[0]!.fileName) : "Survey" });
}

/** Reads a file that came with the page. */
export async function readText(fileName: string, text: string, start: SurveyStart): Promise<void> {
  addRead([await readOne(fileName, async () => new TextEncoder().encode(text).buffer)], start);
}

const withoutEnding = (fileName: string): string => fileName.replace(/\.[^.]*$/, "");

const addRead = (files: readonly ReadFile[], start: SurveyStart): void => {
  if (files.length > 0) dispatch({ kind: "files-read", files, start });
};

async function readOne(fileName: string, bytesOf: () => Promise<ArrayBuffer>): Promise<ReadFile> {
  try {
    const bytes = new Uint8Array(await bytesOf());
    return { fileName, sha256: await sha256Of(bytes), outcome: await thread.readCastFile(fileName, bytes) };
  } catch (cause) {
    // A folder, a file moved meanwhile, or a fault of ours: it must not take the other files with it.
    const reason = cause instanceof Error ? cause.message : String(cause);
    const message = `the file could not be read (${reason}); check that it is a file and still there`;
    return { fileName, sha256: null, outcome: failed({ severity: "error", code: "not-readable", message }) };
  }
}

/** Hexadecimal; null where the browser withholds it, as on a page without a secure origin. */
async function sha256Of(bytes: Uint8Array<ArrayBuffer>): Promise<string | null> {
  if (!globalThis.crypto?.subtle) return null;
  const digest = new Uint8Array(await crypto.subtle.digest("SHA-256", bytes));
  return Array.from(digest, (byte) => byte.toString(16).padStart(2, "0")).join("");
}
