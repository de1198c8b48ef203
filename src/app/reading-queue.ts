import { signal } from "@preact/signals";
import { threads } from "./threads.ts";

/** A file that is being read or waits for its turn. */
export interface ReadingJob {
  readonly number: number;
  readonly fileName: string;
  /** Null while nothing is known. */
  readonly doneFrac: number | null;
}

export const readingJobs = signal<readonly ReadingJob[]>([]);

/** Stops reading a file, or takes one that waits out of the queue. */
export function stopReading(job: ReadingJob): void {
  const isBeingRead = readingJobs.value.findIndex(isSame(job)) === 0;
  endJob(job);
  if (isBeingRead) threads.stopReading();
}

let lastNumber = 0;

export function startJob(fileName: string): ReadingJob {
  const job = { number: ++lastNumber, fileName, doneFrac: null };
  readingJobs.value = [...readingJobs.value, job];
  return job;
}

const isSame = (a: ReadingJob) => (b: ReadingJob) => a.number === b.number;

const endJob = (job: ReadingJob): void => {
  readingJobs.value = readingJobs.value.filter((other) => !isSame(job)(other));
};

export const advance = (job: ReadingJob, doneFrac: number): void => {
  readingJobs.value = readingJobs.value.map((other) => (isSame(job)(other) ? { ...job, doneFrac } : other));
};

let lastTurn: Promise<unknown> = Promise.resolve();

/** One reading at a time, in the order they were asked for; one that has been stopped is passed over. */
export function inTurn<T>(job: ReadingJob, read: () => Promise<T> | null): Promise<T | null> {
  const turn = lastTurn.then(async () => {
    const result = readingJobs.value.some(isSame(job)) ? await read() : null;
    endJob(job);
    return result;
  });
  lastTurn = turn.catch(() => undefined);
  return turn;
}
