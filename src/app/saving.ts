import { effect } from "@preact/signals";
import { type AppState, initialState } from "./state/app-state.ts";
import { takeUp } from "./state/take-up.ts";
import { savingTrouble, state } from "./store.ts";

/* The whole state, undo included, in the browser's own database under one key. Nothing of it leaves the machine. */

const DATABASE = "layerhead";
const STORE = "work";
const KEY = "current";
/** Goes up when the shape of the state changes; older work is then not taken up. */
const SHAPE_VERSION = 1;

interface Saved {
  readonly shapeVersion: number;
  readonly state: AppState;
}

const settled = <T>(request: IDBRequest<T>): Promise<T> =>
  new Promise((resolve, reject) => {
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error);
  });

async function openStore(mode: IDBTransactionMode): Promise<IDBObjectStore> {
  const opening = indexedDB.open(DATABASE, 1);
  opening.onupgradeneeded = () => opening.result.createObjectStore(STORE);
  const database = await settled(opening);
  const transaction = database.transaction(STORE, mode);
  const close = () => database.close();
  transaction.oncomplete = close;
  transaction.onabort = close;
  return transaction.objectStore(STORE);
}

/** Takes up the work where it was left, or starts anew. */
export async function restore(): Promise<void> {
  try {
    const saved = (await settled((await openStore("readonly")).get(KEY))) as Saved | undefined;
    if (saved?.shapeVersion === SHAPE_VERSION) state.value = takeUp(saved.state);
  } catch (cause) {
    savingTrouble.value = `Earlier work could not be read (${reasonOf(cause)}).`;
  }
}

/** Saves every change as it is made; changes that come while one is being written are written together. */
export function keepSaved(): void {
  let isWriting = false;
  let written = state.peek();
  const write = async (): Promise<void> => {
    if (isWriting) return;
    isWriting = true;
    while (written !== state.peek()) {
      written = state.peek();
      try {
        const saved: Saved = { shapeVersion: SHAPE_VERSION, state: written };
        await settled((await openStore("readwrite")).put(saved, KEY));
        savingTrouble.value = "";
      } catch (cause) {
        savingTrouble.value = `Changes are not being saved (${reasonOf(cause)}); export before you close the page.`;
      }
    }
    isWriting = false;
  };
  effect(() => {
    if (state.value !== initialState) void write();
  });
}

const reasonOf = (cause: unknown): string => (cause instanceof Error ? cause.name : "unknown reason");
