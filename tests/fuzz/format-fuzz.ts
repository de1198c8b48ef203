/** Damaged workbooks and netCDF files go through the reader; whatever it makes of them, it must keep its promises. */
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { readFile } from "../../src/cast/index.ts";
import { below, pick, type Random, randomOf } from "./mutate-text.ts";
import type { Failure } from "./text-fuzz.ts";

const LONGEST_MS = 2000;

/** Read in full, a workbook may take this; nothing may take more for long. */
const MOST_GROWTH_BYTES = 1.5 * 2 ** 30;

export function binariesIn(folder: string): readonly Uint8Array[] {
  return readdirSync(folder)
    .filter((name) => /\.(nc|xlsx)$/.test(name))
    .sort()
    .map((name) => new Uint8Array(readFileSync(join(folder, name))));
}

/** Headers stand at the front of netCDF files and at the back of workbooks: that is where lies do most. */
function placeIn(random: Random, bytes: Uint8Array): number {
  const near = Math.min(bytes.length, 512);
  const kind = random();
  if (kind < 0.5) return below(random, near);
  if (kind < 0.7) return bytes.length - 1 - below(random, near);
  return below(random, bytes.length);
}

const TELLING_BYTES = [0x00, 0x01, 0x7f, 0x80, 0xff];

type Damage = (random: Random, bytes: Uint8Array, other: Uint8Array) => Uint8Array;

const DAMAGE: readonly Damage[] = [
  (random, bytes) => {
    const changed = bytes.slice();
    for (let n = 1 + below(random, 8); n > 0; n--) {
      changed[placeIn(random, bytes)] = random() < 0.5 ? pick(random, TELLING_BYTES) : below(random, 256);
    }
    return changed;
  },
  // Lengths and counts are whole numbers of four bytes.
  (random, bytes) => {
    const changed = bytes.slice();
    const view = new DataView(changed.buffer);
    const at = Math.min(placeIn(random, bytes) & ~3, Math.max(0, changed.length - 4));
    if (changed.length >= 4)
      view.setUint32(at, pick(random, [0, 1, 0x7fff_ffff, 0xffff_ffff, 0x1000_0000]), random() < 0.5);
    return changed;
  },
  (random, bytes) => bytes.slice(0, 1 + below(random, bytes.length)),
  (random, bytes, other) => {
    const at = below(random, bytes.length);
    const joined = new Uint8Array(bytes.length + other.length);
    joined.set(bytes.subarray(0, at));
    joined.set(other, at);
    return joined.subarray(0, at + other.length).slice();
  },
];

/** The same seed makes the same bytes. */
export function damagedBinary(seed: number, corpus: readonly Uint8Array[]): Uint8Array {
  const random = randomOf(seed);
  let bytes = pick(random, corpus);
  for (let n = 1 + below(random, 3); n > 0 && bytes.length > 0; n--)
    bytes = pick(random, DAMAGE)(random, bytes, pick(random, corpus));
  return bytes;
}

/** What is wrong with how damaged files are taken, seed by seed. */
export async function fuzzFormats(
  corpus: readonly Uint8Array[],
  firstSeed: number,
  count: number,
  onSeed: (seed: number) => void = () => {},
): Promise<readonly Failure[]> {
  const failures: Failure[] = [];
  for (let seed = firstSeed; seed < firstSeed + count; seed++) {
    onSeed(seed);
    const bytes = damagedBinary(seed, corpus);
    const startMs = performance.now();
    const startBytes = process.memoryUsage().rss;
    try {
      const outcome = await readFile("damaged", bytes);
      if (!outcome.ok && outcome.issues.every((issue) => issue.message === ""))
        failures.push({ seed, what: "no result and no message" });
      if (outcome.ok && outcome.value.casts.some(({ samples }) => samples.inSituTempC.length !== samples.n))
        failures.push({ seed, what: "a broken cast" });
    } catch (error) {
      failures.push({ seed, what: `throws ${String(error)}` });
    }
    if (performance.now() - startMs > LONGEST_MS) failures.push({ seed, what: "takes over two seconds" });
    if (process.memoryUsage().rss - startBytes > MOST_GROWTH_BYTES)
      failures.push({ seed, what: "takes too much memory" });
  }
  return failures;
}
