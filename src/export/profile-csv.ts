import type { SolvedCast, Survey } from "../survey/index.ts";
import { PROFILE_COLUMNS } from "./columns.ts";
import { type Cell, csvText } from "./csv.ts";

const PROFILE_HEADER = ["cast", ...PROFILE_COLUMNS.map((column) => column.name), "flag", "origin"];
const LEVELS_HEADER = ["cast", "level", ...PROFILE_COLUMNS.map((column) => column.name), "origin"];

/** The integrated profiles of casts, one row a depth, in one table. Casts without a solution have no rows. */
export function profileCsv(solved: readonly SolvedCast[]): string {
  return csvText(PROFILE_HEADER, profileRows(solved));
}

function* profileRows(solved: readonly SolvedCast[]): Generator<readonly Cell[]> {
  for (const { cast, solution } of solved) {
    if (!solution) continue;
    const columns = PROFILE_COLUMNS.map((column) => column.values(solution.profile));
    for (let i = 0; i < solution.profile.n; i++)
      yield [cast.name, ...columns.map((values) => values[i]!), solution.flag[i]!, solution.profile.origin[i]!];
  }
}

/** Every level in every cast, one row each. */
export function levelsCsv(survey: Pick<Survey, "levels">, solved: readonly SolvedCast[]): string {
  return csvText(LEVELS_HEADER, levelRows(survey, solved));
}

function* levelRows({ levels }: Pick<Survey, "levels">, solved: readonly SolvedCast[]): Generator<readonly Cell[]> {
  for (const { cast, solution } of solved) {
    if (!solution) continue;
    const columns = PROFILE_COLUMNS.map((column) => column.values(solution.levels));
    for (const [i, level] of levels.entries())
      yield [cast.name, level.name, ...columns.map((values) => values[i]!), solution.levels.origin[i]!];
  }
}
