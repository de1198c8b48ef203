import { parseArgs } from "node:util";
import type { Cast, FileReading } from "../cast/index.ts";
import { EXIT, type ExitCode, type Host, UsageError } from "./host.ts";
import { castIssueLines, issueLine } from "./issue-lines.ts";
import { readCastFiles } from "./read-files.ts";
import { textTable } from "./text-table.ts";
import { INSPECT_USAGE } from "./usage.ts";

/** `layerhead inspect`: how every file was read, decision by decision. */
export async function inspectCommand(host: Host, args: readonly string[]): Promise<ExitCode> {
  const { values, positionals } = parseArgs({
    args: [...args],
    options: { help: { type: "boolean", short: "h" } },
    allowPositionals: true,
  });
  if (values.help) {
    host.out(INSPECT_USAGE);
    return EXIT.done;
  }
  if (positionals.length === 0) throw new UsageError("inspect needs at least one file");
  const files = await readCastFiles(host, positionals);
  for (const { path, reading } of files) {
    if (reading.ok) host.out(`${readingText(reading.value)}\n`);
    for (const issue of reading.issues) (reading.ok ? host.out : host.err)(issueLine(path, issue));
    if (reading.ok)
      host.out(
        castIssueLines(
          path,
          reading.value.casts.map(({ name, issues }) => ({ castName: name, issues })),
        ),
      );
  }
  return files.every((file) => file.reading.ok) ? EXIT.done : EXIT.badInput;
}

function readingText(reading: FileReading): string {
  const { casts } = reading;
  const decimal = reading.decimalMark === "," ? "decimal comma" : "decimal point";
  const columns = textTable(
    [
      ["line head", ""],
      ["read as", ""],
      ["unit", ""],
      ["because", ""],
    ],
    reading.columns.map((column) => [column.header, column.role ?? "-", column.unit ?? "-", column.reason]),
  );
  return [
    reading.fileName,
    `  ${reading.encoding}, ${reading.delimiter}, ${decimal}, header in line ${reading.headerLineIndex}, ${reading.rowCount} rows`,
    columns,
    `  ${casts.length} cast${casts.length === 1 ? "" : "s"}, told apart by ${reading.splitBy}`,
    textTable(
      [
        ["cast", ""],
        ["samples", ""],
        ["time", ""],
        ["km", ""],
        ["", ""],
      ],
      casts.map((cast) => [
        cast.name,
        String(cast.samples.n),
        cast.time ?? "-",
        cast.distanceKm?.toString() ?? "-",
        position(cast),
      ]),
    ),
  ].join("\n");
}

const position = ({ latitudeDeg, longitudeDeg }: Cast): string =>
  latitudeDeg === null ? "" : `${latitudeDeg} N${longitudeDeg === null ? "" : `, ${longitudeDeg} E`}`;
