import { effect } from "@preact/signals";
import { inStore } from "../worker/index.ts";
import { pruneKeptFiles } from "./kept-files.ts";
import { noteSamplesKey, samplesKeyOf } from "./samples-keys.ts";
import { allReadingsOf, initialState } from "./state/app-state.ts";
import { type SavedState, samplesKeysOf, statePacker, takeUp } from "./state/saved-state.ts";
import { savingTrouble, state } from "./store.ts";
import { threads } from "./threads.ts";

/* The whole state, undo included, under one key; the samples of its casts are written by the thread that has them. */

const KEY = "current";
/** Goes up when the shape of the state changes; older work is then not taken up. */
const SHAPE_VERSION = 2;

interface Saved {
  readonly shapeVersion: number;
  readonly state: SavedState;
}

/** Takes up the work where it was left, or starts anew. */
export async function restore(): Promise<void> {
  try {
    const saved = (await inStore("work", "readonly", (store) => store.get(KEY))) as Saved | undefined;
    if (saved?.shapeVersion !== SHAPE_VERSION) return;
    const samplesByKey = await threads.solver.restoreSamples([...samplesKeysOf(saved.state)]);
    for (const [key, samples] of samplesByKey) noteSamplesKey(samples, key);
    state.value = takeUp(saved.state, samplesByKey);
    void pruneKeptFiles(allReadingsOf(state.value));
  } catch (cause) {
    savingTrouble.value = `Earlier work could not be read (${reasonOf(cause)}).`;
  }
}

/** Saves every change as it is made; changes that come while one is being written are written together. */
export function keepSaved(): void {
  const pack = statePacker(samplesKeyOf);
  let isWriting = false;
  let written = state.peek();
  const write = async (): Promise<void> => {
    if (isWriting) return;
    isWriting = true;
    while (written !== state.peek()) {
      written = state.peek();
      try {
        const saved: Saved = { shapeVersion: SHAPE_VERSION, state: pack(written) };
        await inStore("work", "readwrite", (store) => store.put(saved, KEY));
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
