export type { Cast, CastId, Samples } from "./cast.ts";
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
