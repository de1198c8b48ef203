import { type AnyFileReading, type ColumnAnswer, joinStations, type StationMatch } from "../cast/index.ts";
import { addCasts, type Basis, emptySurvey, type Level, type Survey } from "../survey/index.ts";
import type { Host } from "./host.ts";
import { issueLine } from "./issue-lines.ts";
import { type ReadFile, readCastFiles, readStationFile } from "./read-files.ts";
import type { ReadingOptions } from "./reading-options.ts";

/** The files of a command line as one survey, and how it came about. */
export interface Gathered {
  readonly survey: Survey;
  readonly files: readonly ReadFile[];
  /** How the stations of the list were joined; empty without a list. */
  readonly matches: readonly StationMatch[];
  /** Whether every file could be read and no question is open. */
  readonly allRead: boolean;
}

/** Reads every file, says on standard error what is to be said of each, and joins the list of stations. */
export async function gatherSurvey(
  host: Host,
  paths: readonly string[],
  options: ReadingOptions,
  terms: { readonly basis?: Basis; readonly levels?: readonly Level[] } = {},
): Promise<Gathered> {
  const files = await readCastFiles(host, paths, options);
  let survey: Survey = { ...emptySurvey, ...terms, preparation: options.preparation };
  let allRead = true;
  for (const { path, reading } of files) {
    for (const issue of reading.issues) host.err(issueLine(path, issue));
    if (!reading.ok) {
      allRead = false;
      continue;
    }
    for (const line of questionLines(path, reading.value)) host.err(line);
    allRead &&= reading.value.questions.length === 0;
    survey = addCasts(survey, reading.value.casts);
  }
  if (options.stations === null) return { survey, files, matches: [], allRead };

  const list = await readStationFile(host, options.stations);
  for (const issue of list.issues) host.err(issueLine(options.stations, issue));
  if (!list.ok) return { survey, files, matches: [], allRead: false };
  const { casts, matches } = joinStations(survey.casts, list.value);
  for (const match of matches.filter(({ how }) => how !== "same")) host.err(matchLine(options.stations, match));
  return { survey: { ...survey, casts }, files, matches, allRead };
}

const matchLine = (path: string, { castStation, listStation, how, reason }: StationMatch): string =>
  listStation === null
    ? `${path}: warning: station ${castStation} is not in the list (${reason})\n`
    : `${path}: note: station ${castStation} is taken for ${listStation} (${how}: ${reason})\n`;

/** An open question, with what to say to answer it. */
const questionLines = (path: string, { questions }: AnyFileReading): readonly string[] =>
  questions.map(({ message, choices }) => {
    const ways = choices.map(({ label, answer }) => `--read ${answerText(answer)} (${label})`);
    return `${path}: needs your answer: ${message}; say ${ways.join(" or ")}\n`;
  });

/** An answer as --read wants it. */
const answerText = ({ header, role, unit }: ColumnAnswer): string =>
  JSON.stringify(
    `${role}=${/[,:="]/.test(header) ? JSON.stringify(header) : header}${unit === null ? "" : `:${unit}`}`,
  );
