/** The sheets of an .xlsx workbook as rows of text cells. */

export interface Sheet {
  readonly name: string;
  readonly rows: readonly (readonly string[])[];
}

/** A workbook is a zip file; more than this is not unpacked, whatever its size when packed. */
export const MOST_UNPACKED_BYTES = 256 * 2 ** 20;

export class TooLargeError extends Error {
  override readonly name = "TooLargeError";
}

/**
 * Adds up what the parts of the zip file unpack to, by their own headers and then in fact: a part that unpacks to more
 * than its header says makes the unpacking fail.
 */
async function checkUnpackedSize(bytes: Uint8Array): Promise<void> {
  const { unzipSync } = await import("fflate");
  let total = 0;
  unzipSync(bytes, {
    filter: ({ originalSize }) => {
      total += originalSize;
      return false;
    },
  });
  if (total > MOST_UNPACKED_BYTES) throw new TooLargeError();
  unzipSync(bytes);
}

function cellText(value: unknown): string {
  if (value === null || value === undefined) return "";
  if (value instanceof Date)
    // Workbooks keep days as fractions: to the nearest 10 ms.
    return Number.isNaN(value.getTime())
      ? ""
      : new Date(Math.round(value.getTime() / 10) * 10).toISOString().replace(/T00:00:00\.000Z$|\.?0*Z$/, "");
  return String(value);
}

/** Every sheet of a workbook. Throws TooLargeError, or whatever the library makes of a broken file. */
export async function readWorkbook(bytes: Uint8Array): Promise<readonly Sheet[]> {
  await checkUnpackedSize(bytes);
  const { default: readSheets } = await import("read-excel-file/universal");
  const sheets = await readSheets(new Blob([bytes as Uint8Array<ArrayBuffer>]));
  return sheets.map(({ sheet, data }) => ({ name: sheet, rows: data.map((row) => row.map(cellText)) }));
}
