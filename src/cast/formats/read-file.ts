/** Any file to casts: text at once, workbooks and netCDF by libraries that are loaded when such a file comes. */
import Papa from "papaparse";
import { failed, type Outcome } from "../../base/index.ts";
import { findTable } from "../read/find-header.ts";
import { readCastFile } from "../read/read-cast-file.ts";
import { readTable } from "../read/read-table.ts";
import { listedRows } from "../read/rows.ts";
import type { FileReading, ReadingAnswers } from "../reading.ts";
import { readClassicNetcdf } from "./classic-netcdf.ts";
import { readHdfNetcdf } from "./hdf-netcdf.ts";
import type { NetcdfFile } from "./netcdf-file.ts";
import { netcdfTable } from "./netcdf-table.ts";
import { MOST_UNPACKED_BYTES, readWorkbook, type Sheet, TooLargeError } from "./workbook.ts";

export interface ReadOptions {
  readonly answers?: ReadingAnswers;
  /** Which sheet of a workbook; the first that holds casts unless given. */
  readonly sheet?: string;
  /** Told now and then, in order, which share of a text is done, from 0 to 1. */
  readonly onShare?: (doneFrac: number) => void;
}

/** A reading, and for a workbook which of its sheets it is of. */
export interface AnyFileReading extends FileReading {
  readonly sheet: string | null;
  readonly sheets: readonly string[];
}

const refusal = (code: string, message: string) => failed({ severity: "error", code, message });

const startsWith = (bytes: Uint8Array, ...magic: readonly number[]): boolean =>
  magic.every((byte, i) => bytes[i] === byte);

/**
 * Reads a file of any format into casts; see readCastFile. Never rejects for what a file holds: a file that cannot be
 * read gives errors.
 */
export async function readFile(
  fileName: string,
  bytes: Uint8Array,
  options: ReadOptions = {},
): Promise<Outcome<AnyFileReading>> {
  try {
    if (startsWith(bytes, 0x50, 0x4b, 0x03, 0x04)) return await readSheets(fileName, bytes, options);
    if (startsWith(bytes, 0x43, 0x44, 0x46))
      return fromNetcdf(fileName, "netCDF classic", await readClassicNetcdf(bytes), options);
    if (startsWith(bytes, 0x89, 0x48, 0x44, 0x46))
      return fromNetcdf(fileName, "netCDF-4", await readHdfNetcdf(bytes), options);
  } catch (cause) {
    if (cause instanceof TooLargeError)
      return refusal(
        "unpacks-too-large",
        `the workbook unpacks to more than ${MOST_UNPACKED_BYTES / 2 ** 20} MB; export the sheet as CSV`,
      );
    const reason = cause instanceof Error ? cause.message.split("\n")[0] : String(cause);
    return refusal("broken-file", `the file is damaged or not what its first bytes say (${reason}); export it anew`);
  }
  return withoutSheets(readCastFile(fileName, bytes, options.answers, options.onShare));
}

const withoutSheets = (reading: Outcome<FileReading>): Outcome<AnyFileReading> =>
  reading.ok ? { ...reading, value: { ...reading.value, sheet: null, sheets: [] } } : reading;

function fromNetcdf(fileName: string, format: string, file: NetcdfFile, options: ReadOptions): Outcome<AnyFileReading> {
  const { headers, units, rows } = netcdfTable(file);
  if (headers.length === 0 || rows.length === 0)
    return refusal(
      "no-table",
      "no variables of samples in the file; expected temperature, salinity and depth or pressure with CF names",
    );
  const table = {
    delimiter: { character: "\0", name: "variables" },
    header: { lineIndex: 0, cells: headers },
    unitTexts: units,
    rows: listedRows(rows.map((cells, i) => ({ lineIndex: i + 1, cells }))),
    preface: [],
    hasOpenQuote: false,
  };
  return withoutSheets(readTable({ fileName, encoding: format }, table, options.answers));
}

/** A cell that spans lines would set the numbers of the rows below it wrong. */
const sheetText = ({ rows }: Sheet): string =>
  Papa.unparse(
    rows.map((row) => row.map((cell) => cell.replace(/\s*[\r\n]+\s*/g, " "))),
    { newline: "\n" },
  );

function readSheet(fileName: string, sheet: Sheet, options: ReadOptions): Outcome<FileReading> {
  const table = findTable(sheetText(sheet));
  return table === null
    ? refusal(
        "no-table",
        `no table in sheet ${sheet.name}; expected a row of headers such as "Depth (m)" above rows of numbers`,
      )
    : readTable(
        { fileName, encoding: "workbook" },
        { ...table, delimiter: { ...table.delimiter, name: "cells" } },
        options.answers,
      );
}

async function readSheets(fileName: string, bytes: Uint8Array, options: ReadOptions): Promise<Outcome<AnyFileReading>> {
  const all = await readWorkbook(bytes);
  const sheets = all.map((sheet) => sheet.name);
  const wanted = options.sheet === undefined ? all : all.filter((sheet) => sheet.name === options.sheet);
  if (wanted.length === 0) {
    const found =
      sheets.length === 0 ? "the workbook has no sheets" : `no sheet ${options.sheet}; there are ${sheets.join(", ")}`;
    return refusal("no-sheet", found);
  }
  let first: Outcome<FileReading> | null = null;
  for (const sheet of wanted) {
    const reading = readSheet(fileName, sheet, options);
    if (reading.ok && (reading.value.casts.length > 0 || options.sheet !== undefined))
      return { ...reading, value: { ...reading.value, sheet: sheet.name, sheets } };
    first ??= reading;
  }
  return first!.ok ? { ...first!, value: { ...first!.value, sheet: wanted[0]!.name, sheets } } : first!;
}
