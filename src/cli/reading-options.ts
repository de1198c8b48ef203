import { parseAnswers, type ReadingAnswers } from "../cast/index.ts";
import { defaultPreparation, type Preparation } from "../survey/index.ts";
import { UsageError } from "./host.ts";

/** The options by which column and inspect are told how to read files and what to do with raw casts. */
export const READING_OPTIONS = {
  read: { type: "string" },
  sheet: { type: "string" },
  stations: { type: "string" },
  way: { type: "string" },
  bins: { type: "string" },
  "water-kind": { type: "string" },
} as const;

export interface ReadingOptions {
  readonly answers: ReadingAnswers;
  readonly sheet: string | null;
  /** A list of stations to join to the casts. */
  readonly stations: string | null;
  readonly preparation: Preparation;
}

type Given = { readonly [name in keyof typeof READING_OPTIONS]?: string | undefined };

function oneOf<Word extends string>(
  option: string,
  text: string | undefined,
  words: readonly Word[],
  otherwise: Word,
): Word {
  if (text === undefined) return otherwise;
  const word = words.find((candidate) => candidate === text);
  if (word === undefined) throw new UsageError(`${option} ${text}: expected ${words.join(", ")}`);
  return word;
}

function answersOf(text: string | undefined): ReadingAnswers {
  if (text === undefined) return { columns: [] };
  const parsed = parseAnswers(text);
  if (!parsed.ok) throw new UsageError(`--read: ${parsed.issues.map((issue) => issue.message).join("; ")}`);
  return parsed.value;
}

const BINS = ["none", "0.1", "0.25", "0.5", "1"] as const;

export function readingOptions(given: Given): ReadingOptions {
  const bins = oneOf("--bins", given.bins, BINS, "none");
  return {
    answers: answersOf(given.read),
    sheet: given.sheet ?? null,
    stations: given.stations ?? null,
    preparation: {
      way: oneOf("--way", given.way, ["auto", "down", "up", "all"], defaultPreparation.way),
      binM: bins === "none" ? null : Number(bins),
      waterKind: oneOf(
        "--water-kind",
        given["water-kind"],
        ["any", "fresh", "estuary", "sea"],
        defaultPreparation.waterKind,
      ),
    },
  };
}
