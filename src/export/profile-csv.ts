import type { Profile, SolvedCast, Survey } from "../survey/index.ts";
import { PROFILE_COLUMNS, UNCERTAINTY_COLUMN } from "./columns.ts";
import { type Cell, csvText } from "./csv.ts";
import { type ColumnDescription, countColumn, textColumn } from "./table.ts";

const CAST = textColumn("cast", "Name of the cast");
const LEVEL = textColumn("level", "Name of the level");
const FLAG = countColumn("flag", "Quality flag (QARTOD): 1 pass, 2 not evaluated, 3 suspect, 4 fail, 9 no sample");
const ORIGIN = textColumn(
  "origin",
  "sample, level, surface-gap or bed-gap: how the row came to be; rows in a gap stand on no measurement",
);

export const PROFILE_TABLE: readonly ColumnDescription[] = [CAST, ...PROFILE_COLUMNS, UNCERTAINTY_COLUMN, FLAG, ORIGIN];
export const LEVELS_TABLE: readonly ColumnDescription[] = [CAST, LEVEL, ...PROFILE_COLUMNS, UNCERTAINTY_COLUMN, ORIGIN];

/** No sample stands behind a level, so it has no quality flag. */
const NO_FLAG = null;

/** A function from a row's index to its cells: PROFILE_COLUMNS, and the uncertainty. */
function quantityCells(profile: Profile, uncertaintyKPa: Float64Array): (row: number) => readonly Cell[] {
  const columns = [...PROFILE_COLUMNS.map((column) => column.values(profile)), uncertaintyKPa];
  return (row) => columns.map((values) => values[row]!);
}

/**
 * The integrated profiles of casts in one table, one row a depth, in order of depth: surface, samples, levels, bed.
 * Casts without a solution have no rows.
 */
export function profileCsv(solved: readonly SolvedCast[]): string {
  return csvText(PROFILE_TABLE, profileRows(solved));
}

function* profileRows(solved: readonly SolvedCast[]): Generator<readonly Cell[]> {
  for (const { cast, solution } of solved) {
    if (!solution) continue;
    const { profile, uncertaintyKPa, levels, levelUncertainty, flag } = solution;
    const profileCells = quantityCells(profile, uncertaintyKPa);
    const levelCells = quantityCells(levels, levelUncertainty.combinedKPa);
    const rows = [
      ...Array.from(profile.depthM, (depthM, i) => ({
        depthM,
        cells: () => [...profileCells(i), flag[i]!, profile.origin[i]!],
      })),
      ...Array.from(levels.depthM, (depthM, i) => ({
        depthM,
        cells: () => [...levelCells(i), NO_FLAG, levels.origin[i]!],
      })),
    ];
    // The sort is stable: a level at a sample's own depth follows the sample.
    rows.sort((a, b) => a.depthM - b.depthM);
    for (const row of rows) yield [cast.name, ...row.cells()];
  }
}

/** Every level in every cast, one row each. */
export function levelsCsv(survey: Pick<Survey, "levels">, solved: readonly SolvedCast[]): string {
  return csvText(LEVELS_TABLE, levelRows(survey, solved));
}

function* levelRows({ levels }: Pick<Survey, "levels">, solved: readonly SolvedCast[]): Generator<readonly Cell[]> {
  for (const { cast, solution } of solved) {
    if (!solution) continue;
    const cells = quantityCells(solution.levels, solution.levelUncertainty.combinedKPa);
    for (const [i, level] of levels.entries()) yield [cast.name, level.name, ...cells(i), solution.levels.origin[i]!];
  }
}
