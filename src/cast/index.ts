export type { Cast, CastId, Samples } from "./cast.ts";
export { readCastFile } from "./read/read-cast-file.ts";
export type { ColumnReading, ColumnRole, FileReading } from "./reading.ts";
export { type SampleSalinity, sampleSalinity } from "./sample-salinity.ts";
