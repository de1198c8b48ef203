import { parseArgs } from "node:util";
import {
  type Basis,
  type DepthMade,
  defaultBasis,
  type Level,
  type LevelId,
  type ReferenceDensity,
  type WaterChoice,
} from "../survey/index.ts";
import { UsageError } from "./host.ts";
import type { TrialTerms } from "./level-checks.ts";
import { READING_OPTIONS, type ReadingOptions, readingOptions } from "./reading-options.ts";

/** What `layerhead column` was asked to do. */
export interface ColumnOptions {
  readonly help: boolean;
  readonly files: readonly string[];
  readonly basis: Basis;
  readonly levels: readonly Level[];
  readonly json: boolean;
  readonly out: string | null;
  readonly reading: ReadingOptions;
  /** Whether a terminal is told how sure each pressure is. */
  readonly uncertainty: boolean;
  readonly monteCarlo: TrialTerms | null;
}

interface Range {
  readonly lowest: number;
  readonly highest: number;
  readonly unit: string;
}

const DENSITY: Range = { lowest: 500, highest: 3000, unit: "kg/m3" };

function numberIn(option: string, text: string, { lowest, highest, unit }: Range): number {
  const value = text.trim() === "" ? Number.NaN : Number(text);
  if (!(value >= lowest && value <= highest))
    throw new UsageError(`${option} ${text}: expected a number from ${lowest} to ${highest}${unit && ` ${unit}`}`);
  return value;
}

/** A word of a list, or `constant:RHO`. */
function wordOrDensity<Word extends string>(option: string, text: string, words: readonly Word[]): Word | number {
  const word = words.find((candidate) => candidate === text);
  if (word !== undefined) return word;
  const density = /^constant:(.*)$/.exec(text)?.[1];
  if (density === undefined) throw new UsageError(`${option} ${text}: expected ${words.join(", ")} or constant:RHO`);
  return numberIn(`${option} constant`, density, DENSITY);
}

function water(text: string): WaterChoice {
  const choice = wordOrDensity("--water", text, ["teos10", "exact", "limnological", "eos80"] as const);
  return typeof choice === "number" ? { id: "constant", rhoKgM3: choice } : { id: choice };
}

function depthMade(text: string): DepthMade {
  const choice = wordOrDensity("--depth-made", text, ["measured", "standard-ocean"] as const);
  return typeof choice === "number" ? { kind: "constant", rhoKgM3: choice } : { kind: choice };
}

function referenceDensity(text: string): ReferenceDensity {
  if (text === "surface" || text === "mean") return { kind: text };
  const value = Number(text);
  if (!(value >= DENSITY.lowest && value <= DENSITY.highest))
    throw new UsageError(
      `--reference-density ${text}: expected surface, mean or a number from ${DENSITY.lowest} to ${DENSITY.highest} kg/m3`,
    );
  return { kind: "number", rhoKgM3: value };
}

const DEPTH: Range = { lowest: 0, highest: 12_000, unit: "m" };

const levelsOf = (text: string): readonly Level[] =>
  text.split(",").map((part, index) => {
    const depthM = numberIn("--levels", part, DEPTH);
    return { id: `level-${index + 1}` as LevelId, name: `${depthM} m`, depthM };
  });

const wholeNumber = (option: string, text: string, range: Range): number => {
  const value = numberIn(option, text, range);
  if (!Number.isInteger(value)) throw new UsageError(`${option} ${text}: expected a whole number`);
  return value;
};

function trialTerms(trials: string | undefined, seed: string | undefined): TrialTerms | null {
  if (trials === undefined) {
    if (seed !== undefined) throw new UsageError("--seed goes with --monte-carlo");
    return null;
  }
  return {
    trialCount: wholeNumber("--monte-carlo", trials, { lowest: 100, highest: 1e7, unit: "trials" }),
    seedIndex: wholeNumber("--seed", seed ?? "1", { lowest: 0, highest: 2 ** 32 - 1, unit: "" }),
  };
}

const OPTIONS = {
  help: { type: "boolean", short: "h" },
  latitude: { type: "string" },
  water: { type: "string" },
  salinity: { type: "string" },
  "air-pressure": { type: "string" },
  "reference-density": { type: "string" },
  "depth-made": { type: "string" },
  bed: { type: "string" },
  levels: { type: "string" },
  uncertainty: { type: "boolean" },
  "monte-carlo": { type: "string" },
  seed: { type: "string" },
  json: { type: "boolean" },
  out: { type: "string" },
  ...READING_OPTIONS,
} as const;

/** Reads the arguments behind `column`; throws UsageError with one line that says what was wrong. */
export function columnOptions(args: readonly string[]): ColumnOptions {
  const { values, positionals } = parseArgs({
    args: joinNegativeNumbers(args),
    options: OPTIONS,
    allowPositionals: true,
  });
  const given = <T>(text: string | undefined, read: (text: string) => T, otherwise: T): T =>
    text === undefined ? otherwise : read(text);
  const help = values.help === true;
  if (!help && positionals.length === 0) throw new UsageError("name at least one cast file");
  if (values.out?.trim() === "") throw new UsageError("--out needs the name of a folder");
  return {
    help,
    files: positionals,
    basis: {
      ...defaultBasis,
      water: given(values.water, water, defaultBasis.water),
      latitudeDeg: given(
        values.latitude,
        (text) => numberIn("--latitude", text, { lowest: -90, highest: 90, unit: "degrees" }),
        null,
      ),
      airPressureKPa: given(
        values["air-pressure"],
        (text) => numberIn("--air-pressure", text, { lowest: 30, highest: 120, unit: "kPa" }),
        defaultBasis.airPressureKPa,
      ),
      unmeasuredPracticalSalinity: given(
        values.salinity,
        (text) => numberIn("--salinity", text, { lowest: 0, highest: 120, unit: "" }),
        defaultBasis.unmeasuredPracticalSalinity,
      ),
      depthMade: given(values["depth-made"], depthMade, defaultBasis.depthMade),
      referenceDensity: given(values["reference-density"], referenceDensity, defaultBasis.referenceDensity),
      bedDepthM: given(values.bed, (text) => numberIn("--bed", text, DEPTH), null),
    },
    levels: given(values.levels, levelsOf, []),
    json: values.json === true,
    out: values.out ?? null,
    reading: readingOptions(values),
    uncertainty: values.uncertainty === true,
    monteCarlo: trialTerms(values["monte-carlo"], values.seed),
  };
}

/** `--latitude -38` would be taken for two options; `--latitude=-38` is not. */
const joinNegativeNumbers = (args: readonly string[]): string[] =>
  args.reduce<string[]>((joined, arg) => {
    const before = joined.at(-1);
    if (/^-[\d.]/.test(arg) && before?.startsWith("--") && !before.includes("="))
      joined[joined.length - 1] = `${before}=${arg}`;
    else joined.push(arg);
    return joined;
  }, []);
