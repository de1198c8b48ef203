/** Damaged text files go through the reader; whatever it makes of them, it must keep its promises. */
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import {
  type Cast,
  type FileReading,
  headerKey,
  parseAnswers,
  readCastFile,
  readStationList,
} from "../../src/cast/index.ts";
import { below, damaged, pick, type Random, randomOf } from "./mutate-text.ts";

/** One damaged input, and what was wrong with the answer to it. */
export interface Failure {
  /** Makes the same input again. */
  readonly seed: number;
  readonly what: string;
}

/** Of computing, so that a busy machine is not taken for a slow program. */
const LONGEST_MS = 2000;

const computedMs = (): number => {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
};

export function corpusIn(folder: string): readonly Uint8Array[] {
  return readdirSync(folder)
    .sort()
    .map((name) => new Uint8Array(readFileSync(join(folder, name))));
}

const ROLE_WORDS = [
  "depth",
  "pressure",
  "temperature",
  "salinity",
  "date",
  "dateTime",
  "elevation",
  "latitude",
  "unused",
  "flag",
  "year",
];
const UNITS = [
  "m",
  "ft",
  "degF",
  "dbar",
  "uS/cm",
  "day-first",
  "m upward",
  "m decimal-comma",
  "hours since 2020-01-01",
  "days since 1899-12-30",
  "",
];

/** What a user might say, mostly wrong. */
function anyAnswers(random: Random, headers: readonly string[]): string {
  const one = (): string => {
    const header =
      random() < 0.5 ? `#${1 + below(random, 6)}` : JSON.stringify(pick(random, ["Depth (m)", ...headers]));
    const unit = pick(random, UNITS);
    return `${pick(random, ROLE_WORDS)}=${header}${unit === "" ? "" : `:${unit}`}`;
  };
  return Array.from({ length: 1 + below(random, 3) }, one).join(",");
}

function* wrongInCast(cast: Cast): Generator<string> {
  const { samples } = cast;
  for (const [name, values] of Object.entries(samples)) {
    if (typeof values === "number" || values === null) continue;
    if (values.length !== samples.n) yield `${name} has ${values.length} values, expected ${samples.n}`;
  }
  if (samples.n < 2) yield `a cast of ${samples.n} samples`;
  const vertical = samples.depthM ?? samples.seaPressureDbar;
  if (!vertical?.every(Number.isFinite)) yield "a sample without a finite depth or pressure";
  if (!samples.inSituTempC.every(Number.isFinite)) yield "a sample without a finite temperature";
  if (cast.time !== null && !/^\d{4}-\d\d-\d\d(T\d\d:\d\d(:\d\d)?)?$/.test(cast.time)) yield `time ${cast.time}`;
  if (Math.abs(cast.latitudeDeg ?? 0) > 90 || Math.abs(cast.longitudeDeg ?? 0) > 180) yield "a place off the Earth";
}

function* wrongInReading(reading: FileReading): Generator<string> {
  const { columns, headers, questions, casts, issues } = reading;
  if (columns.length !== headers.length) yield `${columns.length} columns for ${headers.length} headers`;
  if (columns.some(({ reason }) => reason.length < 5)) yield "a column without a reason";
  if (casts.length === 0 && questions.length === 0) yield "no cast and no question";
  for (const { code, message, choices } of questions) {
    if (message === "" || choices.length === 0) yield `question ${code} says nothing`;
    if (!issues.some((issue) => issue.code === code)) yield `question ${code} is not among the issues`;
  }
  if (new Set(casts.map((cast) => cast.name)).size !== casts.length) yield "two casts of one name";
  for (const cast of casts) yield* wrongInCast(cast);
}

/** Everything that is wrong with what the reader makes of some bytes; a throw counts. */
export function* wrongWith(bytes: Uint8Array, random: Random): Generator<string> {
  const outcome = readCastFile("fuzz.csv", bytes);
  for (const issue of outcome.issues) if (issue.message === "") yield `issue ${issue.code} says nothing`;
  if (!outcome.ok && !outcome.issues.some((issue) => issue.severity === "error")) yield "refused without a reason";
  if (outcome.ok) yield* wrongInReading(outcome.value);
  const headers = outcome.ok ? outcome.value.headers : [];
  if (outcome.ok) headerKey(outcome.value);
  const said = parseAnswers(anyAnswers(random, headers));
  if (!said.ok && said.issues.length === 0) yield "answers refused without a reason";
  if (said.ok) {
    const again = readCastFile("fuzz.csv", bytes, said.value);
    if (again.ok) yield* wrongInReading(again.value);
    else if (again.issues.length === 0) yield "refused without a reason once answered";
  }
  const list = readStationList("fuzz.csv", bytes);
  if (!list.ok && list.issues.length === 0) yield "list refused without a reason";
}

/** The input that a seed makes. */
export const inputOf = (seed: number, corpus: readonly Uint8Array[]): Uint8Array => damaged(randomOf(seed), corpus);

function wrongOf(seed: number, corpus: readonly Uint8Array[]): readonly string[] {
  const bytes = inputOf(seed, corpus);
  const startMs = computedMs();
  try {
    const wrong = [...wrongWith(bytes, randomOf(~seed))];
    const tookMs = computedMs() - startMs;
    return tookMs > LONGEST_MS ? [...wrong, `took ${Math.round(tookMs)} ms for ${bytes.length} bytes`] : wrong;
  } catch (error) {
    return [`threw ${error instanceof Error ? (error.stack ?? error.message) : String(error)}`];
  }
}

/** Reads the inputs of so many seeds from the first on. @param onSeed told each seed before it is tried */
export function fuzzText(
  corpus: readonly Uint8Array[],
  firstSeed: number,
  count: number,
  onSeed: (seed: number) => void = () => {},
): readonly Failure[] {
  const failures: Failure[] = [];
  for (let seed = firstSeed; seed < firstSeed + count; seed++) {
    onSeed(seed);
    for (const what of wrongOf(seed, corpus)) failures.push({ seed, what });
  }
  return failures;
}
