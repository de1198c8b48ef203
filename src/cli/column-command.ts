import { join } from "node:path";
import {
  type ColumnDescription,
  PROFILE_TABLE,
  profileCsv,
  type SourceFile,
  SUMMARY_TABLE,
  summaryCsv,
  surveyJson,
  tableMetadata,
} from "../export/index.ts";
import { type SolvedCast, type Survey, solve } from "../survey/index.ts";
import { type ColumnOptions, columnOptions } from "./column-options.ts";
import { columnText } from "./column-text.ts";
import { castFileNames } from "./file-names.ts";
import { gatherSurvey } from "./gather-survey.ts";
import { EXIT, type ExitCode, type Host } from "./host.ts";
import { castIssueLines } from "./issue-lines.ts";
import { levelChecks, levelChecksJson, type TrialTerms } from "./level-checks.ts";
import type { ReadFile } from "./read-files.ts";
import { uncertaintyText } from "./uncertainty-text.ts";
import { COLUMN_USAGE } from "./usage.ts";

/** `layerhead column`: reads every file, integrates every cast, writes what was asked for. */
export async function columnCommand(host: Host, args: readonly string[]): Promise<ExitCode> {
  const options = columnOptions(args);
  if (options.help) {
    host.out(COLUMN_USAGE);
    return EXIT.done;
  }
  const { survey, files, allRead } = await gatherSurvey(host, options.files, options.reading, options);
  const solved = solve(survey);
  for (const path of new Set(options.files)) {
    const own = solved.filter(({ cast }) => cast.fileName === path);
    host.err(
      castIssueLines(
        path,
        own.map(({ cast, issues }) => ({ castName: cast.name, issues })),
      ),
    );
  }

  if (options.json) host.out(`${JSON.stringify(columnJson(survey, solved, options.monteCarlo))}\n`);
  if (options.out !== null) await writeTables(host, options.out, survey, solved, sourcesOf(files));
  if (!options.json && options.out === null) host.out(solved.map((cast) => castText(survey, cast, options)).join("\n"));

  return allRead && solved.every((cast) => cast.solution !== null) ? EXIT.done : EXIT.badInput;
}

/** The survey's JSON, and with every cast its cross-check where one was asked for. */
function columnJson(survey: Survey, solved: readonly SolvedCast[], trials: TrialTerms | null) {
  const json = surveyJson(survey, solved);
  return trials
    ? { ...json, monte_carlo: solved.map((one) => levelChecksJson(levelChecks(survey, one, trials), trials)) }
    : json;
}

function castText(survey: Survey, one: SolvedCast, { uncertainty, monteCarlo }: ColumnOptions): string {
  const table = columnText(survey, one, uncertainty);
  return uncertainty || monteCarlo ? table + uncertaintyText(levelChecks(survey, one, monteCarlo)) : table;
}

const sourcesOf = (files: readonly ReadFile[]): readonly SourceFile[] =>
  files.filter((file) => file.reading.ok).map((file) => file.source);

const SUMMARY = "summary";

async function writeTables(
  host: Host,
  folder: string,
  survey: Survey,
  solved: readonly SolvedCast[],
  sources: readonly SourceFile[],
): Promise<void> {
  const withResult = solved.filter((cast) => cast.solution !== null);
  const stems = castFileNames(
    withResult.map(({ cast }) => cast.name),
    [SUMMARY],
  );
  const write = async (
    stem: string,
    columns: readonly ColumnDescription[],
    text: string,
    from: readonly SourceFile[],
  ) => {
    const fileName = `${stem}.csv`;
    await host.writeFile(join(folder, fileName), text);
    const metadata = tableMetadata(fileName, columns, {
      basis: survey.basis,
      preparation: survey.preparation,
      sources: from,
    });
    await host.writeFile(join(folder, `${fileName}-metadata.json`), `${JSON.stringify(metadata, null, 2)}\n`);
  };
  for (const [i, one] of withResult.entries()) {
    const own = sources.filter((source) => source.fileName === one.cast.fileName);
    await write(stems[i]!, PROFILE_TABLE, profileCsv([one]), own);
  }
  await write(SUMMARY, SUMMARY_TABLE, summaryCsv(solved), sources);
  host.err(`${withResult.length} casts written to ${folder}\n`);
}
