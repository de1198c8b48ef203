import type { Profile, SolvedCast, Survey } from "../survey/index.ts";
import { PROFILE_COLUMNS } from "./columns.ts";
import { type Cell, csvText } from "./csv.ts";

const QUANTITIES = PROFILE_COLUMNS.map((column) => column.name);

/** No sample stands behind a level, so it has no quality flag. */
const NO_FLAG = null;

/** A function from a row's index to its cells, in the order of PROFILE_COLUMNS. */
function quantityCells(profile: Profile): (row: number) => readonly Cell[] {
  const columns = PROFILE_COLUMNS.map((column) => column.values(profile));
  return (row) => columns.map((values) => values[row]!);
}

/**
 * The integrated profiles of casts in one table, one row a depth, in order of depth: surface, samples, levels, bed.
 * Casts without a solution have no rows.
 */
export function profileCsv(solved: readonly SolvedCast[]): string {
  return csvText(["cast", ...QUANTITIES, "flag", "origin"], profileRows(solved));
}

function* profileRows(solved: readonly SolvedCast[]): Generator<readonly Cell[]> {
  for (const { cast, solution } of solved) {
    if (!solution) continue;
    const { profile, levels, flag } = solution;
    const profileCells = quantityCells(profile);
    const levelCells = quantityCells(levels);
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
  return csvText(["cast", "level", ...QUANTITIES, "origin"], levelRows(survey, solved));
}

function* levelRows({ levels }: Pick<Survey, "levels">, solved: readonly SolvedCast[]): Generator<readonly Cell[]> {
  for (const { cast, solution } of solved) {
    if (!solution) continue;
    const cells = quantityCells(solution.levels);
    for (const [i, level] of levels.entries()) yield [cast.name, level.name, ...cells(i), solution.levels.origin[i]!];
  }
}
