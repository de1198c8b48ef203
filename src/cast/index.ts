export type { Cast, CastId, Samples } from "./cast.ts";
export { type AnyFileReading, type ReadOptions, readFile } from "./formats/read-file.ts";
export { type JoinedCasts, joinStations, type StationMatch } from "./join-stations.ts";
export { headerKey, parseAnswers } from "./read/parse-answers.ts";
export { readCastFile } from "./read/read-cast-file.ts";
export { type ListedStation, readStationList, type StationList } from "./read/station-list.ts";
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
