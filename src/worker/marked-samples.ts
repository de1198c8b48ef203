import { sampleSalinity } from "../cast/index.ts";
import { QUALITY_FLAG, type SolvedCast } from "../survey/index.ts";
import { sampleDepthsM } from "./sample-depths.ts";

/** Neighbouring samples that are flagged or left out for the same reasons. */
export interface MarkedRun {
  /** 1-based lines of the file, both included. */
  readonly fromLineIndex: number;
  readonly toLineIndex: number;
  readonly count: number;
  readonly isUsed: boolean;
  readonly reasons: readonly string[];
}

/** The samples that are shown as flagged or left out; one entry a sample, no more of them than can be told apart. */
export interface Marks {
  readonly sampleIndex: Int32Array;
  readonly depthM: Float64Array;
  readonly inSituTempC: Float64Array;
  readonly practicalSalinity: Float64Array;
  /** 1 where the sample is in the column all the same. */
  readonly isUsed: Uint8Array;
}

export interface MarkedSamples {
  /** Of every sample as read, in the order of the file. */
  readonly sampleDepthM: Float64Array;
  /** In the column, though suspect. */
  readonly flaggedCount: number;
  readonly leftOutCount: number;
  readonly runs: readonly MarkedRun[];
  readonly marks: Marks;
  /** Whether every one of them has its mark. */
  readonly areAllMarked: boolean;
}

const MOST_FLAGGED_COUNT = 150;
/** Samples with nothing wrong, as those of the way up: enough to show where they lie, too few to hide the curve. */
const MOST_PLAIN_COUNT = 60;

/** Which samples of a cast are flagged or left out, where they stand and why. */
export function markedSamples(solved: SolvedCast, unmeasuredPracticalSalinity: number): MarkedSamples {
  const { samples } = solved.cast;
  const { flag, use } = solved.prepared;
  const isFlagged = (i: number): boolean => flag[i] === QUALITY_FLAG.suspect || flag[i] === QUALITY_FLAG.fail;
  const marked: number[] = [];
  let leftOutCount = 0;
  for (let i = 0; i < samples.n; i++) {
    if (use[i] === 0) leftOutCount++;
    if (use[i] === 0 || isFlagged(i)) marked.push(i);
  }
  const sampleDepthM = sampleDepthsM(solved);
  const placed = marked.filter((i) => Number.isFinite(sampleDepthM[i]!));
  const shown = [
    ...evenly(placed.filter(isFlagged), MOST_FLAGGED_COUNT),
    ...evenly(
      placed.filter((i) => !isFlagged(i)),
      MOST_PLAIN_COUNT,
    ),
  ].sort((a, b) => a - b);
  const salinity = sampleSalinity(samples, unmeasuredPracticalSalinity);
  const ofShown = (valueAt: (i: number) => number): Float64Array => Float64Array.from(shown, valueAt);
  return {
    sampleDepthM,
    flaggedCount: marked.length - leftOutCount,
    leftOutCount,
    runs: runsOf(marked, solved),
    marks: {
      sampleIndex: Int32Array.from(shown),
      depthM: ofShown((i) => sampleDepthM[i]!),
      inSituTempC: ofShown((i) => samples.inSituTempC[i]!),
      // Conductivity needs a pressure; a decibar a metre moves its salinity by less than a mark is wide.
      practicalSalinity: ofShown((i) => salinity.at(i, samples.seaPressureDbar?.[i] ?? sampleDepthM[i]!)),
      isUsed: Uint8Array.from(shown, (i) => use[i]!),
    },
    areAllMarked: shown.length === placed.length,
  };
}

const evenly = (items: readonly number[], mostCount: number): readonly number[] =>
  items.length <= mostCount
    ? items
    : Array.from({ length: mostCount }, (_, k) => items[Math.floor((k * items.length) / mostCount)]!);

function runsOf(marked: readonly number[], { cast, prepared }: SolvedCast): readonly MarkedRun[] {
  const runs: { -readonly [K in keyof MarkedRun]: MarkedRun[K] }[] = [];
  let previous = -2;
  for (const i of marked) {
    const reasons = prepared.reasons[i]!;
    const isUsed = prepared.use[i] === 1;
    const last = runs.at(-1);
    const line = cast.samples.lineIndex[i]!;
    if (last && i === previous + 1 && last.isUsed === isUsed && isSameReasons(last.reasons, reasons)) {
      last.toLineIndex = line;
      last.count++;
    } else runs.push({ fromLineIndex: line, toLineIndex: line, count: 1, isUsed, reasons });
    previous = i;
  }
  return runs;
}

export const isSameReasons = (a: readonly string[], b: readonly string[]): boolean =>
  a === b || (a.length === b.length && a.every((reason, k) => reason === b[k]));
