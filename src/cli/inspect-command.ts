import { parseArgs } from "node:util";
import type { AnyFileReading } from "../cast/index.ts";
import { type SolvedCast, solve } from "../survey/index.ts";
import { gatherSurvey } from "./gather-survey.ts";
import { EXIT, type ExitCode, type Host, UsageError } from "./host.ts";
import { inspectionJson } from "./inspection-json.ts";
import { castIssueLines } from "./issue-lines.ts";
import { READING_OPTIONS, readingOptions } from "./reading-options.ts";
import { textTable } from "./text-table.ts";
import { INSPECT_USAGE } from "./usage.ts";

/** `layerhead inspect`: how every file was read, decision by decision, and what the quality tests say. */
export async function inspectCommand(host: Host, args: readonly string[]): Promise<ExitCode> {
  const { values, positionals } = parseArgs({
    args: [...args],
    options: { help: { type: "boolean", short: "h" }, json: { type: "boolean" }, ...READING_OPTIONS },
    allowPositionals: true,
  });
  if (values.help) {
    host.out(INSPECT_USAGE);
    return EXIT.done;
  }
  if (positionals.length === 0) throw new UsageError("inspect needs at least one file");
  const options = readingOptions(values);
  const { survey, files, matches, allRead } = await gatherSurvey(host, positionals, options);
  const solved = solve(survey);
  if (values.json)
    host.out(`${JSON.stringify(inspectionJson({ files, solved, matches, preparation: options.preparation }))}\n`);
  else
    for (const { path, reading } of files) {
      if (!reading.ok) continue;
      const own = solved.filter(({ cast }) => cast.fileName === path);
      host.out(`${readingText(reading.value)}\n${castsText(own)}\n`);
      host.out(
        castIssueLines(
          path,
          own.map(({ cast, issues }) => ({ castName: cast.name, issues })),
        ),
      );
      host.out(own.map((cast) => remarkLines(path, cast)).join(""));
    }
  return allRead ? EXIT.done : EXIT.badInput;
}

function readingText(reading: AnyFileReading): string {
  const { sheet, sheets } = reading;
  const header = reading.headerLineIndex > 0 ? `header in line ${reading.headerLineIndex}, ` : "";
  const decimal = reading.decimalMark === "," ? "decimal comma" : "decimal point";
  const columns = textTable(
    [
      ["header", ""],
      ["read as", ""],
      ["unit", ""],
      ["how sure", ""],
      ["because", ""],
    ],
    reading.columns.map((column) => [
      column.header,
      column.role ?? "-",
      column.unit ?? "-",
      column.confidence,
      column.reason,
    ]),
  );
  return [
    reading.fileName,
    `  ${reading.encoding}, ${reading.delimiter}, ${decimal}, ${header}${reading.rowCount} rows`,
    ...(sheet === null ? [] : [`  sheet ${sheet}, of ${sheets.join(", ")}`]),
    columns,
  ].join("\n");
}

function castsText(solved: readonly SolvedCast[]): string {
  const rows = solved.map(({ cast, prepared }) => [
    cast.name,
    String(cast.samples.n),
    String(prepared.use.reduce((sum, used) => sum + used, 0)),
    cast.time ?? "-",
    cast.distanceKm?.toString() ?? "-",
    cast.latitudeDeg === null
      ? ""
      : `${cast.latitudeDeg} N${cast.longitudeDeg === null ? "" : `, ${cast.longitudeDeg} E`}`,
  ]);
  return textTable(
    [
      ["cast", ""],
      ["samples", ""],
      ["used", ""],
      ["time", ""],
      ["km", ""],
      ["", ""],
    ],
    rows,
  );
}

/** A line for every sample that is flagged or left out. */
const remarkLines = (path: string, { cast, prepared }: SolvedCast): string =>
  prepared.reasons
    .map((reasons, i) => {
      if (reasons.length === 0) return "";
      const word = prepared.use[i] === 1 ? `flag ${prepared.flag[i]}` : `flag ${prepared.flag[i]}, left out`;
      return `${path}:${cast.samples.lineIndex[i]}: ${cast.name}: ${word}: ${reasons.join("; ")}\n`;
    })
    .join("");
