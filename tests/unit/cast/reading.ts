import { readFileSync } from "node:fs";
import type { Issue } from "../../../src/base/index.ts";
import {
  type Cast,
  type ColumnRole,
  type FileReading,
  type Question,
  type ReadingAnswers,
  readCastFile,
} from "../../../src/cast/index.ts";

const pathOf = (folder: string, fileName: string): URL => new URL(`../../../${folder}/${fileName}`, import.meta.url);

export const bytesOfFile = (folder: string, fileName: string): Uint8Array => readFileSync(pathOf(folder, fileName));

const expectRead = (fileName: string, bytes: Uint8Array, answers?: ReadingAnswers): FileReading => {
  const outcome = readCastFile(fileName, bytes, answers);
  if (!outcome.ok) throw new Error(outcome.issues.map((issue) => issue.message).join("\n"));
  return outcome.value;
};

export const readDataFile = (fileName: string): FileReading =>
  expectRead(fileName, bytesOfFile("tests/data", fileName));

export const readSample = (fileName: string): FileReading => expectRead(fileName, bytesOfFile("sample-data", fileName));

const encoded = (text: string): Uint8Array => new TextEncoder().encode(text);

export const readText = (text: string, answers?: ReadingAnswers): FileReading =>
  expectRead("cast.csv", encoded(text), answers);

export const readBytes = (bytes: Uint8Array): FileReading => expectRead("cast.csv", bytes);

/** The issues of a file that must not be readable. */
export function errorsOf(content: string | Uint8Array): readonly Issue[] {
  const outcome = readCastFile("cast.csv", typeof content === "string" ? encoded(content) : content);
  if (outcome.ok) throw new Error("the file was read, expected errors");
  return outcome.issues;
}

/** role -> [header, unit] of the columns in use. */
export const rolesOf = (reading: FileReading): Partial<Record<ColumnRole, readonly [string, string | null]>> =>
  Object.fromEntries(reading.columns.flatMap((c) => (c.role === null ? [] : [[c.role, [c.header, c.unit]]])));

export const onlyCast = (reading: FileReading): Cast => {
  if (reading.casts.length !== 1) throw new Error(`${reading.casts.length} casts, expected one`);
  return reading.casts[0]!;
};

export const codesOf = (issues: readonly Issue[]): readonly string[] => issues.map((issue) => issue.code);

export const issueOf = (issues: readonly Issue[], code: string): Issue => {
  const found = issues.find((issue) => issue.code === code);
  if (!found) throw new Error(`no issue ${code} among ${codesOf(issues).join(", ")}`);
  return found;
};

export const questionOf = (reading: FileReading, code: string): Question => {
  const found = reading.questions.find((question) => question.code === code);
  if (!found)
    throw new Error(`no question ${code} among ${reading.questions.map((question) => question.code).join(", ")}`);
  return found;
};

/** The units that a question offers. */
export const unitsIn = (question: Question): readonly string[] =>
  question.choices.flatMap(({ answer }) => answer.unit ?? []);
