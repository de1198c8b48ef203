import { type Evidence, type Quantity, written } from "../evidence.ts";
import type { Finding } from "../finding.ts";
import type { WaterKind } from "../preparation.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";
import type { InOwnUnit } from "../resolution.ts";

interface Range {
  readonly lowest: InOwnUnit;
  readonly highest: InOwnUnit;
}

type Ranges = Readonly<Record<Quantity["name"], Range>>;

/** What no sensor reads in water: noise around zero salinity is not less than -0.05, and no lake is saltier than brine. */
const SENSOR: Ranges = {
  temperature: { lowest: -5, highest: 50 },
  salinity: { lowest: -0.05, highest: 300 },
};

/** What passes without remark in each kind of water; `any` are the defaults of the QARTOD manual. */
const USUAL: Readonly<Record<WaterKind, Ranges>> = {
  any: { temperature: { lowest: -2, highest: 40 }, salinity: { lowest: 0, highest: 42 } },
  fresh: { temperature: { lowest: -0.1, highest: 40 }, salinity: { lowest: 0, highest: 1 } },
  estuary: { temperature: { lowest: -2, highest: 40 }, salinity: { lowest: 0, highest: 38 } },
  sea: { temperature: { lowest: -2.5, highest: 36 }, salinity: { lowest: 20, highest: 42 } },
};

/** The kind of water in words. */
const WATER: Readonly<Record<WaterKind, string>> = {
  any: "natural water",
  fresh: "fresh water",
  estuary: "an estuary",
  sea: "the sea",
};

const isOutside = (value: InOwnUnit, { lowest, highest }: Range): boolean => value < lowest || value > highest;

const inWords = ({ lowest, highest }: Range): string => `${lowest} to ${highest}`;

/** Values that no sensor reads in water fail; values unusual for the kind of water are suspect. */
export const grossRange = (evidence: Evidence, kind: WaterKind): readonly Finding[] => [
  ...evidence.quantities.flatMap(({ name, values, write }) =>
    [...values.keys()].flatMap((i): readonly Finding[] => {
      const value = values[i]!;
      const finding = { check: "gross-range", sampleIndex: i } as const;
      if (isOutside(value, SENSOR[name])) {
        const reason = `${name} ${write(value)} is outside ${inWords(SENSOR[name])}, what a sensor reads in water`;
        return [{ ...finding, flag: QUALITY_FLAG.fail, reason }];
      }
      if (isOutside(value, USUAL[kind][name])) {
        const reason = `${name} ${write(value)} is outside ${inWords(USUAL[kind][name])}, the range of ${WATER[kind]}`;
        return [{ ...finding, flag: QUALITY_FLAG.suspect, reason }];
      }
      return [];
    }),
  ),
  ...outOfWater(evidence),
  ...tooDeep(evidence),
];

/** A cell in water, however fresh, conducts. */
const outOfWater = ({ samples }: Evidence): readonly Finding[] =>
  [...(samples.conductivityMsCm ?? samples.specificConductanceMsCm ?? []).entries()]
    .filter(([, conductivityMsCm]) => conductivityMsCm <= 0)
    .map(([sampleIndex, conductivityMsCm]) => ({
      check: "gross-range",
      sampleIndex,
      flag: QUALITY_FLAG.fail,
      reason: `conductivity ${conductivityMsCm} mS/cm: the cell was in air`,
    }));

/** The deepest trench is 10 935 m deep. */
const DEEPEST_M = 12_000;

const tooDeep = ({ depthM }: Evidence): readonly Finding[] =>
  [...depthM.entries()]
    .filter(([, depth]) => depth > DEEPEST_M)
    .map(([sampleIndex, depth]) => ({
      check: "gross-range",
      sampleIndex,
      flag: QUALITY_FLAG.fail,
      reason: `depth ${written(depth)} m is below the bed of every water`,
    }));
