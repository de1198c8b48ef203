import type { ReadFile } from "./state/reduce.ts";
import { dispatch } from "./store.ts";
import { thread } from "./thread.ts";

/** Reads files in the background, each on its own: what one has wrong does not keep the others out. */
export async function readFiles(files: Iterable<File>): Promise<void> {
  const read: ReadFile[] = [];
  for (const file of files) read.push(await readOne(file.name, new Uint8Array(await file.arrayBuffer())));
  addRead(read, read.length === 1 ? withoutEnding(read[0]!.fileName) : "Survey");
}

/** Reads a file that came with the page. */
export async function readText(fileName: string, text: string, surveyName: string): Promise<void> {
  addRead([await readOne(fileName, new TextEncoder().encode(text))], surveyName);
}

const withoutEnding = (fileName: string): string => fileName.replace(/\.[^.]*$/, "");

const addRead = (files: readonly ReadFile[], surveyName: string): void => {
  if (files.length > 0) dispatch({ kind: "files-read", files, surveyName });
};

async function readOne(fileName: string, bytes: Uint8Array<ArrayBuffer>): Promise<ReadFile> {
  return { fileName, sha256: await sha256Of(bytes), outcome: await thread.readCastFile(fileName, bytes) };
}

/** Hexadecimal; null where the browser withholds it, as on a page without a secure origin. */
async function sha256Of(bytes: Uint8Array<ArrayBuffer>): Promise<string | null> {
  if (!globalThis.crypto?.subtle) return null;
  const digest = new Uint8Array(await crypto.subtle.digest("SHA-256", bytes));
  return Array.from(digest, (byte) => byte.toString(16).padStart(2, "0")).join("");
}
