import type { CurveInput, LevelInput, PanelInput, PlumbValue, SheetInput } from "../../charts/layout/index.ts";
import { type Basis, describeAtDepths, type Level, type Solution } from "../../survey/index.ts";
import { convert, convertArray, type DisplaySystem, displayUnit } from "../../units/index.ts";
import type { AnsweredCast, DrawnProfile } from "../../worker/index.ts";
import { ownUnit, type PageQuantity, shownValue, unitLabel } from "./shown.ts";
import { buoyancyAround } from "./water-at.ts";

/** What is drawn of one panel, before casts are put in. */
interface PanelKind extends Omit<PanelInput, "curves" | "unit" | "title" | "shortTitle"> {
  readonly title: (basis: Basis, system: DisplaySystem) => string;
  readonly shortTitle: string;
  readonly quantity: PageQuantity;
  readonly values: (
    profile: Omit<DrawnProfile, "firstSampleIndex" | "lastSampleIndex" | "departureUncertaintyKPa">,
  ) => Float64Array;
}

const PLAIN = { scale: "linear", isStepped: false, withZero: false, share: 1, isDroppable: false } as const;

const PANELS: readonly PanelKind[] = [
  {
    ...PLAIN,
    id: "temperature",
    title: () => "Temperature",
    shortTitle: "Temp.",
    quantity: "temperature",
    values: (p) => p.inSituTempC,
  },
  {
    ...PLAIN,
    id: "salinity",
    title: () => "Practical salinity",
    shortTitle: "Salinity",
    quantity: "practicalSalinity",
    values: (p) => p.practicalSalinity,
  },
  {
    ...PLAIN,
    id: "density",
    title: () => "Density",
    shortTitle: "Density",
    quantity: "density",
    values: (p) => p.rhoKgM3,
  },
  {
    ...PLAIN,
    id: "buoyancy",
    title: () => "N²",
    shortTitle: "N²",
    scale: "log",
    isStepped: true,
    isDroppable: true,
    quantity: "buoyancyFrequencySquared",
    values: (p) => p.buoyancyFrequencySquaredPerS2,
  },
  {
    ...PLAIN,
    id: "departure",
    title: (basis, system) => `Departure from ${referenceName(basis, system)}`,
    shortTitle: "Departure",
    withZero: true,
    share: 1.45,
    quantity: "departure",
    values: (p) => p.departureKPa,
  },
];

/** @example "1025 kg/m³", "surface sample" */
function referenceName({ referenceDensity }: Basis, system: DisplaySystem): string {
  switch (referenceDensity.kind) {
    case "surface":
      return "surface sample";
    case "mean":
      return "depth mean";
    case "number": {
      const { unit } = displayUnit("density", system);
      const rounded = Number(convert(referenceDensity.rhoKgM3, "kg/m3", unit).toFixed(2));
      return `${rounded} ${unitLabel("density", system)}`;
    }
  }
}

const inShownUnit = (values: Float64Array, quantity: PageQuantity, system: DisplaySystem): Float64Array =>
  convertArray(values, ownUnit(quantity), displayUnit(quantity, system).unit);

export const inShownUnitOne = (value: number, quantity: PageQuantity, system: DisplaySystem): number =>
  convert(value, ownUnit(quantity), displayUnit(quantity, system).unit);

/** The band is as wide as the expanded uncertainty, k = 2. */
const EXPANDED = 2;

export interface SheetSource {
  /** Those to draw; the one in hand may stand anywhere among them. */
  readonly solved: readonly AnsweredCast[];
  readonly castInHandId: string | null;
  readonly colourIndexOf: Readonly<Record<string, number>>;
  readonly basis: Basis;
  /** The charts reach down to it; 0 without levels. */
  readonly deepestLevelM: number;
  readonly system: DisplaySystem;
}

/** Whether two sources draw the same sheet: then what is laid out stands, however much else has changed. */
export const isSameSheet = (a: SheetSource, b: SheetSource): boolean =>
  a.castInHandId === b.castInHandId &&
  a.colourIndexOf === b.colourIndexOf &&
  a.basis === b.basis &&
  a.deepestLevelM === b.deepestLevelM &&
  a.system === b.system &&
  a.solved.length === b.solved.length &&
  a.solved.every(({ drawn }, k) => drawn === b.solved[k]!.drawn);

/** The sheet of linked profiles in the units shown; the cast in hand comes last, so that it is drawn on top. */
export function profileSheet(source: SheetSource): SheetInput {
  const { basis, system, deepestLevelM } = source;
  const drawn = source.solved.filter((entry) => entry.drawn !== null);
  drawn.sort((a, b) => Number(a.cast.id === source.castInHandId) - Number(b.cast.id === source.castInHandId));
  const curvesOf = (panel: PanelKind): CurveInput[] =>
    drawn.map(({ cast, drawn: profile }) => ({
      castId: cast.id,
      colourIndex: source.colourIndexOf[cast.id] ?? 0,
      isInHand: cast.id === source.castInHandId,
      depths: inShownUnit(profile!.depthM, "depth", system),
      values: inShownUnit(panel.values(profile!), panel.quantity, system),
      halfWidths:
        panel.id === "departure" && cast.id === source.castInHandId
          ? inShownUnit(
              profile!.departureUncertaintyKPa.map((standardKPa) => EXPANDED * standardKPa),
              panel.quantity,
              system,
            )
          : null,
      firstSampleIndex: profile!.firstSampleIndex,
      lastSampleIndex: profile!.lastSampleIndex,
    }));
  const deepestM = Math.max(deepestLevelM, ...drawn.map(({ solution }) => solution!.column.bottomDepthM));
  return {
    depthUnit: unitLabel("depth", system),
    deepest: inShownUnitOne(deepestM, "depth", system),
    panels: PANELS.map(({ quantity, values: _, title, ...panel }, k) => ({
      ...panel,
      title: title(basis, system),
      unit: unitLabel(quantity, system),
      curves: curvesOf(PANELS[k]!),
    })),
    gaps: gapsOf(drawn.find(({ cast }) => cast.id === source.castInHandId)).map(([fromM, toM]) => ({
      from: inShownUnitOne(fromM, "depth", system),
      to: inShownUnitOne(toM, "depth", system),
    })),
  };
}

/** Levels as the charts write them. */
export const levelInputs = (levels: readonly Level[], system: DisplaySystem): readonly LevelInput[] =>
  levels.map(({ id, name, depthM }) => ({
    levelId: id,
    depth: inShownUnitOne(depthM, "depth", system),
    label: `${name} · ${shownValue(depthM, "depth", system)}`,
  }));

/** Depths in m between which a cast has no samples, at the surface and at the bed. */
function gapsOf(inHand: AnsweredCast | undefined): readonly (readonly [number, number])[] {
  if (!inHand?.solution) return [];
  const { depthM, n, bottomDepthM } = inHand.solution.column;
  const gaps = [[0, depthM[0]!] as const, [depthM[n - 1]!, bottomDepthM] as const];
  return gaps.filter(([from, to]) => to > from);
}

/** What the panels show of a column at some depths, by the index of a depth. */
export function columnValuesAt(
  { column, profile }: Solution,
  depthsM: readonly number[],
  system: DisplaySystem,
): (index: number) => Readonly<Record<string, number>> {
  const at = describeAtDepths(column, depthsM);
  return (index) =>
    Object.fromEntries(
      PANELS.map((panel) => [
        panel.id,
        panel.id === "buoyancy"
          ? buoyancyAround(profile, depthsM[index]!)
          : inShownUnitOne(panel.values(at)[index]!, panel.quantity, system),
      ]),
    );
}

/** Every drawn cast at one depth, for the dots on the plumb line; casts that end above it have none. */
export function plumbValues(source: SheetSource, depthM: number): readonly PlumbValue[] {
  return source.solved.flatMap(({ cast, solution }): PlumbValue[] => {
    if (!solution || depthM > solution.column.bottomDepthM) return [];
    return [
      {
        colourIndex: source.colourIndexOf[cast.id] ?? 0,
        isInHand: cast.id === source.castInHandId,
        values: columnValuesAt(solution, [depthM], source.system)(0),
      },
    ];
  });
}
