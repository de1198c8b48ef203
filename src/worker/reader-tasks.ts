import { type Remote, transfer, wrap } from "comlink";
import type { Outcome } from "../base/index.ts";
import {
  type AnyFileReading,
  headerKey,
  type ReadingAnswers,
  readFile,
  readStationList,
  type StationList,
} from "../cast/index.ts";
import { buffersOf } from "./buffers.ts";
import type { SolverTasks } from "./solver-tasks.ts";

/** Answers by the header of the files they are for. */
export type RememberedAnswers = Readonly<Record<string, ReadingAnswers>>;

export interface ReadRequest {
  readonly file: File;
  /** What the user has said about this very file; without it, what is remembered for its header counts. */
  readonly answers?: ReadingAnswers;
  readonly sheet?: string;
  readonly remembered: RememberedAnswers;
}

export interface ReadAnswer {
  readonly outcome: Outcome<AnyFileReading>;
  /** SHA-256 of the bytes, hexadecimal; null where the browser does not compute it. */
  readonly sha256: string | null;
  readonly answers: ReadingAnswers;
  readonly areAnswersRemembered: boolean;
  readonly headerKey: string | null;
  /** Set where the file is no file of casts but a list of stations. */
  readonly stations: StationList | null;
  /** Under which the solving thread has the samples of each cast. */
  readonly samplesKeys: readonly string[];
}

const NO_ANSWERS: ReadingAnswers = { columns: [] };

let solver: Remote<SolverTasks> | null = null;

export const readerTasks = {
  /** Where samples go: a port to the thread that solves. */
  connect(port: MessagePort): void {
    solver = wrap<SolverTasks>(port);
  },

  /**
   * Reads one file; its casts are at the solver when the answer comes.
   * @param onShare told now and then which share is done, from 0 to 1
   */
  async read(request: ReadRequest, onShare: (doneFrac: number) => void): Promise<ReadAnswer> {
    const { file, sheet, remembered } = request;
    const bytes = new Uint8Array(await file.arrayBuffer());
    const sha256 = await sha256Of(bytes);
    const attempt = (answers: ReadingAnswers): Promise<Outcome<AnyFileReading>> =>
      readFile(file.name, bytes, { answers, onShare, ...(sheet === undefined ? {} : { sheet }) });

    let answers = request.answers ?? NO_ANSWERS;
    let outcome = await attempt(answers);
    const key = outcome.ok ? headerKey(outcome.value) : null;
    const earlier = key === null || request.answers ? undefined : remembered[key];
    if (earlier) {
      answers = earlier;
      outcome = await attempt(answers);
    }
    const list = outcome.ok ? null : readStationList(file.name, bytes);
    const samplesKeys = outcome.ok ? await handToSolver(outcome.value) : [];
    const answer = {
      outcome,
      sha256,
      answers,
      areAnswersRemembered: earlier !== undefined,
      headerKey: key,
      stations: list?.ok ? list.value : null,
      samplesKeys,
    };
    return transfer(answer, [...buffersOf(outcome.ok ? outcome.value.casts.map((cast) => cast.samples) : [])]);
  },
};

export type ReaderTasks = typeof readerTasks;

async function handToSolver({ casts }: AnyFileReading): Promise<readonly string[]> {
  const keyed = casts.map(({ samples }) => [crypto.randomUUID() as string, samples] as const);
  await solver?.keepSamples(new Map(keyed));
  return keyed.map(([key]) => key);
}

async function sha256Of(bytes: Uint8Array<ArrayBuffer>): Promise<string | null> {
  if (!globalThis.crypto?.subtle) return null;
  const digest = new Uint8Array(await crypto.subtle.digest("SHA-256", bytes));
  return Array.from(digest, (byte) => byte.toString(16).padStart(2, "0")).join("");
}
