import {
  type ColumnDescription,
  LEVELS_TABLE,
  levelsCsv,
  PROFILE_TABLE,
  profileCsv,
  surveyJson,
  tableMetadata,
} from "../../export/index.ts";
import type { SolvedCast, Survey } from "../../survey/index.ts";
import type { KeptReading } from "./app-state.ts";

export type ExportKind = "cast-profile" | "all-profiles" | "levels" | "everything";

export interface ExportSource {
  readonly survey: Survey;
  readonly casts: readonly SolvedCast[];
  readonly inHand: SolvedCast | null;
  readonly readings: readonly Pick<KeptReading, "fileName" | "sha256">[];
}

export interface ExportFile {
  readonly name: string;
  readonly mediaType: string;
  readonly text: string;
}

/** The files that one choice of the export menu makes; beside each table goes its metadata. */
export function exportFiles(kind: ExportKind, source: ExportSource): readonly ExportFile[] {
  const { survey, casts, inHand } = source;
  const surveyName = plainName(survey.name);
  switch (kind) {
    case "cast-profile":
      return inHand
        ? withMetadata(`${plainName(inHand.cast.name)}-profile`, PROFILE_TABLE, profileCsv([inHand]), [inHand], source)
        : [];
    case "all-profiles":
      return withMetadata(`${surveyName}-profiles`, PROFILE_TABLE, profileCsv(casts), casts, source);
    case "levels":
      return withMetadata(`${surveyName}-levels`, LEVELS_TABLE, levelsCsv(survey, casts), casts, source);
    case "everything": {
      const text = `${JSON.stringify(surveyJson(survey, casts), null, 2)}\n`;
      return [{ name: `${surveyName}.json`, mediaType: "application/json", text }];
    }
  }
}

function withMetadata(
  name: string,
  columns: readonly ColumnDescription[],
  text: string,
  casts: readonly SolvedCast[],
  { survey, readings }: ExportSource,
): readonly ExportFile[] {
  const used = new Set(casts.map(({ cast }) => cast.fileName));
  const sources = readings.flatMap(({ fileName, sha256 }) =>
    used.has(fileName) && sha256 ? [{ fileName, sha256 }] : [],
  );
  const metadata = tableMetadata(`${name}.csv`, columns, {
    basis: survey.basis,
    preparation: survey.preparation,
    sources,
  });
  return [
    { name: `${name}.csv`, mediaType: "text/csv", text },
    // The name that CSVW has for the metadata of one table.
    {
      name: `${name}.csv-metadata.json`,
      mediaType: "application/json",
      text: `${JSON.stringify(metadata, null, 2)}\n`,
    },
  ];
}

/** A name that every file system takes. */
const plainName = (name: string): string =>
  name
    .normalize("NFKD")
    .replace(/[^\p{L}\p{N}]+/gu, "-")
    .replace(/^-|-$/g, "")
    .toLowerCase() || "survey";
