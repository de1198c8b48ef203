/** Formats that are no delimited text, told by their first bytes. */

interface KnownFormat {
  readonly name: string;
  readonly magic: readonly number[];
}

const FORMATS: readonly KnownFormat[] = [
  { name: "a workbook (xlsx) or another zip archive", magic: [0x50, 0x4b, 0x03, 0x04] },
  { name: "an old workbook (xls)", magic: [0xd0, 0xcf, 0x11, 0xe0] },
  { name: "a netCDF-4 or HDF5 file", magic: [0x89, 0x48, 0x44, 0x46] },
  { name: "a netCDF file", magic: [0x43, 0x44, 0x46, 0x01] },
  { name: "a netCDF file", magic: [0x43, 0x44, 0x46, 0x02] },
  { name: "a netCDF file", magic: [0x43, 0x44, 0x46, 0x05] },
  { name: "a PDF document", magic: [0x25, 0x50, 0x44, 0x46] },
  { name: "a compressed file (gzip)", magic: [0x1f, 0x8b] },
];

/** What the file is, in words, when it is one of the formats we know but do not read; else null. */
export function unreadFormat(bytes: Uint8Array): string | null {
  return FORMATS.find((format) => format.magic.every((byte, i) => bytes[i] === byte))?.name ?? null;
}
