/**
 * The long run, in chunks of seeds: each in a thread that is watched, so that a hang is found and named too.
 *
 *   npx vite build --ssr tests/fuzz/run-fuzz.ts --outDir dist/fuzz
 *   node dist/fuzz/run-fuzz.js text 1 1000000
 *
 * Arguments: text or formats, the first seed, how many, and the folder of the corpus (of the folder it is run in).
 */
import { isMainThread, parentPort, Worker, workerData } from "node:worker_threads";
import { binariesIn, fuzzFormats } from "./format-fuzz.ts";
import { corpusIn, type Failure, fuzzText } from "./text-fuzz.ts";

interface Chunk {
  readonly kind: keyof typeof KINDS;
  readonly folder: string;
  readonly firstSeed: number;
  readonly count: number;
  /** The seed in hand. */
  readonly seedInHand: SharedArrayBuffer;
}

const KINDS = {
  text: { folder: "tests/corpus/files", chunk: 20_000 },
  // A fresh thread has a fresh copy of the libraries: one damaged file must not stand in for the next.
  formats: { folder: "tests/formats", chunk: 250 },
} as const;
const HANG_MS = 10_000;
const LOOK_MS = 500;
const TOLD_MS = 5_000;

/** What came of a chunk: how many inputs it got through, and what was wrong. */
interface Done {
  readonly count: number;
  readonly failures: readonly Failure[];
}

/** A chunk in a thread of its own; a seed that does not come to an end is a failure and ends the chunk there. */
function runChunk(chunk: Chunk): Promise<Done> {
  return new Promise((resolve, reject) => {
    const worker = new Worker(new URL(import.meta.url), { workerData: chunk });
    const inHand = new Int32Array(chunk.seedInHand);
    let [seed, sinceMs] = [0, performance.now()];
    const watch = setInterval(() => {
      const now = Atomics.load(inHand, 0);
      if (now !== seed) [seed, sinceMs] = [now, performance.now()];
      else if (performance.now() - sinceMs > HANG_MS) {
        clearInterval(watch);
        const done = { count: seed - chunk.firstSeed + 1, failures: [{ seed, what: "hangs" }] };
        void worker.terminate().then(() => resolve(done));
      }
    }, LOOK_MS);
    worker.once("message", (failures: readonly Failure[]) => {
      clearInterval(watch);
      resolve({ count: chunk.count, failures });
    });
    worker.once("error", (error) => {
      clearInterval(watch);
      reject(error);
    });
  });
}

async function runAll([kindText, firstText, countText, folderText]: readonly string[]): Promise<void> {
  const kind = kindText === "formats" ? "formats" : "text";
  const folder = folderText ?? KINDS[kind].folder;
  const [firstSeed, count] = [Number(firstText ?? 1), Number(countText ?? KINDS[kind].chunk)];
  const startMs = performance.now();
  let failureCount = 0;
  let toldMs = startMs;
  for (let done = 0; done < count; ) {
    const size = Math.min(KINDS[kind].chunk, count - done);
    const seedInHand = new SharedArrayBuffer(4);
    const chunk = await runChunk({ kind, folder, firstSeed: firstSeed + done, count: size, seedInHand });
    done += chunk.count;
    failureCount += chunk.failures.length;
    for (const { seed, what } of chunk.failures.slice(0, 20)) process.stdout.write(`seed ${seed}: ${what}\n`);
    const now = performance.now();
    if (now - toldMs < TOLD_MS && done < count) continue;
    toldMs = now;
    const perSecond = Math.round(done / ((now - startMs) / 1000));
    process.stdout.write(`${done} inputs, ${failureCount} failures, ${perSecond} a second\n`);
  }
  process.exitCode = failureCount === 0 ? 0 : 1;
}

if (isMainThread) await runAll(process.argv.slice(2));
else {
  const { kind, folder, firstSeed, count, seedInHand } = workerData as Chunk;
  const inHand = new Int32Array(seedInHand);
  const onSeed = (seed: number): void => void Atomics.store(inHand, 0, seed);
  const failures =
    kind === "text"
      ? fuzzText(corpusIn(folder), firstSeed, count, onSeed)
      : await fuzzFormats(binariesIn(folder), firstSeed, count, onSeed);
  parentPort!.postMessage(failures);
}
