import { transfer } from "comlink";
import type { Samples } from "../cast/index.ts";
import { type Column, type Stratification, type Survey, solveCast, stratificationOf } from "../survey/index.ts";
import { type CastOnShelf, type PackedCast, packCast } from "./answered-cast.ts";
import { buffersOf } from "./buffers.ts";
import { inStore, keepOnly } from "./database.ts";

/* Keeps the samples of all casts, so that they need not cross to it again for every change, and solves them. */

const shelf = new Map<string, Samples>();

/** What solving needs beside the casts. */
export type SolvingTerms = Omit<Survey, "casts" | "name">;

/** What the page says of the layering of a column in its margin. */
export type Layering = Pick<
  Stratification,
  "stability" | "mixedLayer" | "pycnoclines" | "potentialEnergyAnomalyJM3" | "twoLayers" | "modes"
>;

export const solverTasks = {
  /** Null where nothing can be said of the column. */
  layering(column: Column): Layering | null {
    const whole = stratificationOf(column);
    if (whole === null) return null;
    const { stability, mixedLayer, pycnoclines, potentialEnergyAnomalyJM3, twoLayers, modes } = whole;
    return { stability, mixedLayer, pycnoclines, potentialEnergyAnomalyJM3, twoLayers, modes };
  },

  /** Puts the samples of new casts on the shelf and into the database. Without a database they last as long as the page. */
  async keepSamples(samplesByKey: ReadonlyMap<string, Samples>): Promise<void> {
    for (const [key, samples] of samplesByKey) {
      shelf.set(key, samples);
      await inStore("samples", "readwrite", (store) => store.put(samples, key)).catch(() => undefined);
    }
  },

  /** Samples of earlier work, taken from the database; those that are no longer needed are deleted there. */
  async restoreSamples(keys: readonly string[]): Promise<ReadonlyMap<string, Samples>> {
    const restored = new Map<string, Samples>();
    await keepOnly("samples", new Set(keys));
    for (const key of keys) {
      const samples = (await inStore("samples", "readonly", (store) => store.get(key))) as Samples | undefined;
      if (!samples) continue;
      shelf.set(key, samples);
      restored.set(key, structuredClone(samples));
    }
    return transfer(restored, [...buffersOf([...restored.values()])]);
  },

  solve(terms: SolvingTerms, casts: readonly CastOnShelf[]): readonly PackedCast[] {
    const buffers = new Set<ArrayBuffer>();
    const packed = casts.map(({ samplesKey, ...cast }) => {
      const solved = solveCast(terms, { ...cast, samples: shelf.get(samplesKey)! });
      const answer = packCast(solved, terms.basis.unmeasuredPracticalSalinity);
      for (const buffer of answer.buffers) buffers.add(buffer);
      return answer.packed;
    });
    return transfer(packed, [...buffers]);
  },
};

export type SolverTasks = typeof solverTasks;
