import type { Basis, Preparation } from "../survey/index.ts";
import { basisJson } from "./basis-json.ts";
import { preparationJson } from "./preparation-json.ts";
import type { ColumnDescription } from "./table.ts";
import { VERSION } from "./version.ts";

/** A file that results were made from. */
export interface SourceFile {
  readonly fileName: string;
  /** SHA-256 of its bytes, hexadecimal. */
  readonly sha256: string;
}

const schema = ({ name, description, datatype, unit }: ColumnDescription): Record<string, string> => ({
  name,
  titles: name,
  datatype,
  "dc:description": description,
  ...(unit !== undefined && { "schema:unitText": unit }),
});

/**
 * The metadata that goes beside a table (W3C Tabular Data, CSVW): what each column is and in which unit, and, under
 * notes, the basis, the preparation, the program and the checksums of the input.
 * @param url name of the CSV file it stands beside
 */
export const tableMetadata = (
  url: string,
  columns: readonly ColumnDescription[],
  made: { readonly basis: Basis; readonly preparation: Preparation; readonly sources: readonly SourceFile[] },
): Record<string, unknown> => ({
  "@context": "http://www.w3.org/ns/csvw",
  url,
  dialect: { delimiter: ",", header: true, encoding: "utf-8" },
  tableSchema: { columns: columns.map(schema) },
  notes: [
    {
      program: `Layerhead ${VERSION}`,
      basis: basisJson(made.basis),
      preparation: preparationJson(made.preparation),
      sources: made.sources.map(({ fileName, sha256 }) => ({ file: fileName, sha256 })),
    },
  ],
});
