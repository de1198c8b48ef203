/** One delimited text file, bytes as they came from disk, to casts. */
import { failed, type Issue, type Outcome, succeeded } from "../../base/index.ts";
import type { FileReading, ReadingAnswers } from "../reading.ts";
import { type DecodedText, decodeText } from "./decode-text.ts";
import { exchangeTable } from "./exchange-csv.ts";
import { unreadFormat } from "./file-format.ts";
import { findTable } from "./find-header.ts";
import { readTable } from "./read-table.ts";
import { type OnShare, untold, within } from "./share.ts";

const error = (code: string, message: string): Issue => ({ severity: "error", code, message });

/** The text of a file, or why it has none. */
function readText(bytes: Uint8Array): Outcome<DecodedText> {
  const format = unreadFormat(bytes);
  if (format !== null) {
    return failed(error("format-not-read", `the file is ${format}, which is not read yet; export the table as CSV`));
  }
  const decoded = decodeText(bytes);
  if (decoded === null) return failed(error("not-text", "the file is not text; expected a table such as CSV"));
  if (decoded.text.trim() === "") return failed(error("empty-file", "the file is empty; expected a table of samples"));
  return succeeded(decoded);
}

/**
 * Reads a file into casts. Every decision is in the result: encoding, delimiter, what each column is and why, what tells
 * casts apart, rows left out. Nothing is guessed without an issue that says so; a file that cannot be read gives errors.
 * @param answers what the user has said about columns; it stands above everything the file says
 * @param onShare told now and then which share of the work is done
 */
export function readCastFile(
  fileName: string,
  bytes: Uint8Array,
  answers?: ReadingAnswers,
  onShare: OnShare = untold,
): Outcome<FileReading> {
  const decoded = readText(bytes);
  if (!decoded.ok) return decoded;
  onShare(0.05);
  const { text, encoding } = decoded.value;
  const table = exchangeTable(text) ?? findTable(text, within(onShare, 0.05, 0.2));
  if (table === null) {
    const message = 'no table in the file; expected a row of headers such as "Depth (m)" above rows of numbers';
    return failed(error("no-table", message));
  }
  return readTable({ fileName, encoding }, table, answers, within(onShare, 0.2, 1));
}
