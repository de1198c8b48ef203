import { failed, type Outcome } from "../../base/index.ts";
import type { FileReading } from "../reading.ts";

/** Reads one delimited text file (bytes as they came from disk) into casts. */
export function readCastFile(fileName: string, _bytes: Uint8Array): Outcome<FileReading> {
  return failed({ severity: "error", code: "not-built", message: `${fileName}: reading is not built yet` });
}
