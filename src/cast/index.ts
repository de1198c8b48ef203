export type { Cast, CastId, Samples } from "./cast.ts";
export { type AnyFileReading, type ReadOptions, readFile } from "./formats/read-file.ts";
export { readCastFile } from "./read/read-cast-file.ts";
export type {
  ColumnAnswer,
  ColumnReading,
  ColumnRole,
  Confidence,
  FileReading,
  Question,
  ReadingAnswers,
} from "./reading.ts";
export { type SampleSalinity, sampleSalinity } from "./sample-salinity.ts";
