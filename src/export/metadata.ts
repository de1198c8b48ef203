import type { Basis } from "../survey/index.ts";
import { basisJson } from "./basis-json.ts";
import { PROFILE_COLUMNS } from "./columns.ts";
import { VERSION } from "./version.ts";

/** A file that results were made from. */
export interface SourceFile {
  readonly fileName: string;
  /** SHA-256 of its bytes, hexadecimal. */
  readonly sha256: string;
}

interface TextColumn {
  readonly name: string;
  readonly description: string;
}

const CAST: TextColumn = { name: "cast", description: "Name of the cast" };
const LEVEL: TextColumn = { name: "level", description: "Name of the level" };
const ORIGIN: TextColumn = {
  name: "origin",
  description: "sample, level, surface-gap or bed-gap: how the row came to be; rows in a gap stand on no measurement",
};

const textSchema = ({ name, description }: TextColumn) => ({
  name,
  titles: name,
  datatype: "string",
  "dc:description": description,
});

const numberSchemas = PROFILE_COLUMNS.map(({ name, unit, description }) => ({
  name,
  titles: name,
  datatype: "double",
  "dc:description": description,
  "schema:unitText": unit,
}));

const flagSchema = {
  name: "flag",
  titles: "flag",
  datatype: "integer",
  "dc:description": "Quality flag (QARTOD): 1 pass, 2 not evaluated, 3 suspect, 4 fail, 9 no sample",
};

const TABLES = {
  profile: [textSchema(CAST), ...numberSchemas, flagSchema, textSchema(ORIGIN)],
  levels: [textSchema(CAST), textSchema(LEVEL), ...numberSchemas, textSchema(ORIGIN)],
};

/**
 * The metadata that goes beside a table (W3C Tabular Data, CSVW): what each column is and in which unit, and, under
 * notes, the basis, the program and the checksums of the input.
 * @param url name of the CSV file it stands beside
 */
export const tableMetadata = (
  url: string,
  table: keyof typeof TABLES,
  made: { readonly basis: Basis; readonly sources: readonly SourceFile[] },
): Record<string, unknown> => ({
  "@context": "http://www.w3.org/ns/csvw",
  url,
  dialect: { delimiter: ",", header: true, encoding: "utf-8" },
  tableSchema: { columns: TABLES[table] },
  notes: [
    {
      program: `Layerhead ${VERSION}`,
      basis: basisJson(made.basis),
      sources: made.sources.map(({ fileName, sha256 }) => ({ file: fileName, sha256 })),
    },
  ],
});
