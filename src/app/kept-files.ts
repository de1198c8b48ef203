import { inStore, keepOnly } from "../worker/index.ts";
import type { KeptReading } from "./state/app-state.ts";

/* The files themselves, so that they can be read again with other answers, after a reload too. */

/** A larger file is at hand only until the page is closed. */
const LARGEST_KEPT_BYTES = 128 * 2 ** 20;

const atHand = new Map<string, File>();

/** Files are told apart by their bytes, where the browser tells them, else by name. */
const keyOf = ({ sha256, fileName }: Pick<KeptReading, "sha256" | "fileName">): string => sha256 ?? fileName;

export function keepFile(reading: Pick<KeptReading, "sha256" | "fileName">, file: File): void {
  const key = keyOf(reading);
  atHand.set(key, file);
  if (file.size <= LARGEST_KEPT_BYTES)
    inStore("files", "readwrite", (store) => store.put(file, key)).catch(() => undefined);
}

/** Null where the bytes are gone: the user has to add the file again. */
export async function keptFile(reading: Pick<KeptReading, "sha256" | "fileName">): Promise<File | null> {
  const key = keyOf(reading);
  const file = atHand.get(key);
  if (file) return file;
  return inStore("files", "readonly", (store) => store.get(key) as IDBRequest<File | undefined>).then(
    (stored) => stored ?? null,
    () => null,
  );
}

/** Deletes the files of readings that are no more. */
export const pruneKeptFiles = (readings: readonly KeptReading[]): Promise<void> =>
  keepOnly("files", new Set(readings.map(keyOf))).catch(() => undefined);
