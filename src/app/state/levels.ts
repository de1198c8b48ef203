import type { Level, LevelId } from "../../survey/index.ts";

/** Adds a level, named and numbered by the first number that is free. */
export function addLevel(levels: readonly Level[], depthM: number): readonly Level[] {
  const isTaken = (number: number) =>
    levels.some((level) => level.id === idOf(number) || level.name === nameOf(number));
  let number = 1;
  while (isTaken(number)) number++;
  return inOrder([...levels, { id: idOf(number), name: nameOf(number), depthM }]);
}

const idOf = (number: number): LevelId => `level-${number}` as LevelId;
const nameOf = (number: number): string => `Level ${number}`;

export function changeLevel(
  levels: readonly Level[],
  levelId: LevelId,
  change: Partial<Pick<Level, "name" | "depthM">>,
): readonly Level[] {
  return inOrder(levels.map((level) => (level.id === levelId ? { ...level, ...change } : level)));
}

export const removeLevel = (levels: readonly Level[], levelId: LevelId): readonly Level[] =>
  levels.filter((level) => level.id !== levelId);

/** Shallow first, as in the water. */
const inOrder = (levels: readonly Level[]): readonly Level[] => levels.toSorted((a, b) => a.depthM - b.depthM);
