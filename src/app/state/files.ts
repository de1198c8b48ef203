import type { Outcome } from "../../base/index.ts";
import type { AnyFileReading, Cast, ColumnAnswer, ReadingAnswers, StationList } from "../../cast/index.ts";
import { addCasts, type Basis, type Survey } from "../../survey/index.ts";
import type { FileTrouble, KeptReading, Work } from "./app-state.ts";

/** One file as the reading thread gives it back. */
export interface ReadFile {
  readonly fileName: string;
  readonly sha256: string | null;
  readonly outcome: Outcome<AnyFileReading>;
  readonly answers: ReadingAnswers;
  readonly areAnswersRemembered: boolean;
  readonly headerKey: string | null;
  /** Set where the file is no file of casts but a list of stations. */
  readonly stations: StationList | null;
}

/** What a survey that has no casts yet takes over with its first files. */
export interface SurveyStart {
  readonly name: string;
  readonly basis?: Partial<Basis>;
}

/** New files join the work; one that is there already, byte for byte, takes the place of its earlier reading. */
export function takeFiles(work: Work, files: readonly ReadFile[], start: SurveyStart): Work {
  const hasCasts = files.some(({ outcome }) => outcome.ok && outcome.value.casts.length > 0);
  const { survey } = work;
  const begun: Survey =
    survey.casts.length > 0 || !hasCasts
      ? survey
      : { ...survey, name: survey.name || start.name, basis: { ...survey.basis, ...start.basis } };
  return files.reduce((taken, file) => takeFile(taken, file), begun === survey ? work : { ...work, survey: begun });
}

function takeFile(work: Work, file: ReadFile): Work {
  if (!file.outcome.ok) return work;
  const there = work.readings.find(({ sha256 }) => sha256 !== null && sha256 === file.sha256);
  const name = there?.fileName ?? firstFree(file.fileName, new Set(work.readings.map(({ fileName }) => fileName)));
  return putReading(work, { ...file, fileName: name });
}

/** A file of the survey as it was read once more, by the name it has there. */
export interface FileAgain extends ReadFile {
  /** Which sheet of a workbook was asked for. */
  readonly sheet: string | null;
}

/** A file of that name read once more, with other answers or another sheet, in place of its earlier reading. */
export function takeAgain(work: Work, file: FileAgain): Work {
  const { outcome, answers, sheet } = file;
  if (outcome.ok) return putReading(work, file);
  const refused = work.readings.map((reading) => {
    if (reading.fileName !== file.fileName) return reading;
    const kept = { ...reading, answers, areAnswersRemembered: false, questions: [], refusal: outcome.issues };
    // Nothing is known of the columns of a sheet that is no table.
    return sheet === null || sheet === reading.sheet
      ? kept
      : { ...kept, sheet, headers: [], columns: [], firstRows: [] };
  });
  return { ...work, readings: refused, survey: putCasts(work.survey, file.fileName, []) };
}

function putReading(work: Work, file: ReadFile): Work {
  const { fileName, outcome, sha256, answers, areAnswersRemembered } = file;
  if (!outcome.ok) return work;
  const { casts, ...read } = outcome.value;
  const headerKey = file.headerKey ?? "";
  const reading: KeptReading = {
    ...read,
    fileName,
    sha256,
    answers,
    areAnswersRemembered,
    headerKey,
    refusal: [],
  };
  const isThere = work.readings.some((other) => other.fileName === fileName);
  return {
    ...work,
    readings: isThere
      ? work.readings.map((other) => (other.fileName === fileName ? reading : other))
      : [...work.readings, reading],
    survey: putCasts(
      work.survey,
      fileName,
      casts.map((cast) => ({ ...cast, fileName })),
    ),
  };
}

/** The casts of one file in place of those it gave before; the user's flags stay on casts that have the same samples. */
function putCasts(survey: Survey, fileName: string, casts: readonly Cast[]): Survey {
  const isOld = (cast: Cast): boolean => cast.fileName === fileName;
  const old = new Map(survey.casts.filter(isOld).map((cast) => [cast.id, cast.samples.n]));
  if (old.size === 0 && casts.length === 0) return survey;
  const firstOld = survey.casts.findIndex(isOld);
  const others = survey.casts.filter((cast) => !isOld(cast));
  const { casts: together } = addCasts({ casts: others }, casts);
  const added = together.slice(others.length);
  const at = firstOld < 0 ? others.length : firstOld;
  const hasSameSamples = new Map(added.map((cast) => [cast.id, old.get(cast.id) === cast.samples.n]));
  return {
    ...survey,
    casts: [...others.slice(0, at), ...added, ...others.slice(at)],
    flagEdits: survey.flagEdits.filter(({ castId }) => !old.has(castId) || hasSameSamples.get(castId)),
  };
}

/** What the files added last had to say. */
export const troublesOf = (files: readonly ReadFile[]): readonly FileTrouble[] =>
  files.flatMap(({ fileName, outcome }): FileTrouble[] => {
    const issues = outcome.ok ? outcome.value.issues : outcome.issues;
    return issues.length > 0 ? [{ fileName, wasRead: outcome.ok, issues }] : [];
  });

/** "pier.csv", or "pier.csv (2)" where another file of that name is there. */
function firstFree(wanted: string, taken: ReadonlySet<string>): string {
  let name = wanted;
  for (let count = 2; taken.has(name); count++) name = `${wanted} (${count})`;
  return name;
}

/** Other files that wait for an answer, with the same headers and nothing said about them yet. */
export const waitingLike = (reading: KeptReading, all: readonly KeptReading[]): readonly KeptReading[] =>
  all.filter(
    ({ fileName, headerKey, questions, answers }) =>
      fileName !== reading.fileName &&
      headerKey === reading.headerKey &&
      questions.length > 0 &&
      (answers.columns.length === 0 || answers === reading.answers),
  );

/** Answers with one more; what was said about the same column before goes. */
export const withAnswer = ({ columns }: ReadingAnswers, answer: ColumnAnswer): ReadingAnswers => ({
  columns: [...columns.filter(({ header }) => header !== answer.header), answer],
});
