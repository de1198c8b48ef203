/** Questions to the user, with the answers that they can choose from. */
import type { UnitSymbol } from "../../units/index.ts";
import type { ColumnAnswer, ColumnRole, Question } from "../reading.ts";
import { ROLE_WORDS } from "./roles.ts";

export type Choice = Question["choices"][number];

/** "depth in ft" */
export function choose(header: string, role: ColumnRole, unit: UnitSymbol | null, words?: string): Choice {
  const inUnit = unit === null || unit === "1" ? "" : ` in ${unit}`;
  return { label: words ?? `${ROLE_WORDS[role]}${inUnit}`, answer: { header, role, unit } };
}

/** As `choose`, where the unit is a form such as "day-first". */
export const chooseForm = (header: string, role: ColumnRole, form: string, label: string): Choice => ({
  label,
  answer: { header, role, unit: form },
});

const leaveOut = (header: string): Choice => ({
  label: "not used",
  answer: { header, role: "unused", unit: null } satisfies ColumnAnswer,
});

/** What is open about one column; to leave the column out is always one of the answers. */
export interface Doubt {
  readonly code: string;
  readonly message: string;
  readonly choices: readonly Choice[];
}

export const questionOf = (columnIndex: number, name: string, doubt: Doubt): Question => ({
  ...doubt,
  columnIndex,
  choices: [...doubt.choices, leaveOut(name)],
});
