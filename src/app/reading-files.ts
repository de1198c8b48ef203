import { signal } from "@preact/signals";
import { failed } from "../base/index.ts";
import type { ColumnAnswer, ReadingAnswers, StationList } from "../cast/index.ts";
import { type ReadRequest, Stopped } from "../worker/index.ts";
import { keepFile, keptFile } from "./kept-files.ts";
import { advance, inTurn, type ReadingJob, startJob } from "./reading-queue.ts";
import { noteSamplesKey } from "./samples-keys.ts";
import { type KeptReading, readingsOf } from "./state/app-state.ts";
import { type FileAgain, type ReadFile, type SurveyStart, waitingLike, withAnswer } from "./state/files.ts";
import { dispatch, isStationPanelOpen, openReading, state } from "./store.ts";
import { threads } from "./threads.ts";

/** Files whose reading cannot be changed, since their bytes are no longer at hand. */
export const filesGone = signal<readonly string[]>([]);

/** Reads files in the background, each on its own: what one has wrong does not keep the others out. */
export async function readFiles(files: readonly File[], start?: SurveyStart): Promise<void> {
  const read: { readonly file: File; readonly answer: ReadFile }[] = [];
  const jobs = files.map((file) => ({ file, job: startJob(file.name) }));
  for (const { file, job } of jobs) {
    const answer = await inTurn(job, () => readOne(job, { file, remembered: remembered() }));
    if (answer) read.push({ file, answer });
  }
  if (read.length === 0) return;
  const answers = read.map(({ answer }) => answer).filter(({ stations }) => !stations);
  if (answers.length > 0) dispatch({ kind: "files-read", files: answers, start: start ?? { name: nameFor(answers) } });
  for (const { file, answer } of read) if (answer.outcome.ok) keepFile(answer, file);
  filesGone.value = [];
  openQuestions(answers);
  for (const { answer } of read) if (answer.stations) takeStations(answer.stations);
}

interface Rereading {
  readonly answers: ReadingAnswers;
  readonly sheet?: string;
}

/** What files are about to be read again with; a later wish takes the place of one that waits. */
const wishes = new Map<string, Rereading>();

/** One more answer about a file, on top of those on their way; it goes for files that wait with the same headers, too. */
export function answerColumn(reading: KeptReading, answer: ColumnAnswer): Promise<void> {
  const wish = { answers: withAnswer((wishes.get(reading.fileName) ?? reading).answers, answer) };
  return readAgain([reading, ...waitingLike(reading, readingsOf(state.value))], wish, "keep");
}

/** Reads files of the survey again, with other answers or another sheet. */
export async function readAgain(
  readings: readonly KeptReading[],
  wish: Rereading,
  memory: "keep" | "forget" | "as-it-is",
): Promise<void> {
  for (const { fileName } of readings) wishes.set(fileName, wish);
  const read = await Promise.all(readings.map((reading) => readOneAgain(reading, wish)));
  const files = read.filter((file) => file !== null);
  if (files.length > 0) dispatch({ kind: "files-read-again", files, memory });
}

/** Null where the bytes are gone, the reading was stopped, or a later wish has taken its place. */
async function readOneAgain(reading: KeptReading, wish: Rereading): Promise<FileAgain | null> {
  const { fileName } = reading;
  const file = await keptFile(reading);
  if (!file) {
    wishes.delete(fileName);
    filesGone.value = [...filesGone.value, fileName];
    return null;
  }
  const job = startJob(fileName);
  const sheet = wish.sheet ?? reading.sheet;
  const answer = await inTurn(job, () =>
    wishes.get(fileName) === wish
      ? readOne(job, { file, remembered: {}, answers: wish.answers, ...(sheet === null ? {} : { sheet }) })
      : null,
  );
  if (wishes.get(fileName) === wish) wishes.delete(fileName);
  return answer && { ...answer, fileName, sheet };
}

function takeStations(list: StationList): void {
  dispatch({ kind: "stations-listed", list });
  isStationPanelOpen.value = true;
}

const remembered = () => state.value.history.present.remembered;

const nameFor = (read: readonly ReadFile[]): string =>
  read.length === 1 ? read[0]!.fileName.replace(/\.[^.]*$/, "") : "Survey";

/** Null where the user stopped it. */
async function readOne(job: ReadingJob, request: ReadRequest): Promise<ReadFile | null> {
  const { file, answers } = request;
  try {
    const { samplesKeys, ...answer } = await threads.read(request, (doneFrac) => advance(job, doneFrac));
    if (answer.outcome.ok)
      answer.outcome.value.casts.forEach(({ samples }, k) => {
        noteSamplesKey(samples, samplesKeys[k]!);
      });
    return { ...answer, fileName: file.name };
  } catch (cause) {
    if (cause instanceof Stopped) return null;
    // A folder, a file moved meanwhile, or a fault of ours: it must not take the other files with it.
    const reason = cause instanceof Error ? cause.message : String(cause);
    const message = `the file could not be read (${reason}); check that it is a file and still there`;
    return {
      fileName: file.name,
      sha256: null,
      outcome: failed({ severity: "error", code: "not-readable", message }),
      answers: answers ?? { columns: [] },
      areAnswersRemembered: false,
      headerKey: null,
      stations: null,
    };
  }
}

/** A file that waits for an answer shows its reading by itself. */
function openQuestions(read: readonly ReadFile[]): void {
  const asking = readingsOf(state.value).find(
    ({ sha256, questions }) => questions.length > 0 && read.some((file) => file.sha256 === sha256),
  );
  if (asking) openReading.value = asking.fileName;
}
