/** What has become of one column. */
import type { Issue } from "../../base/index.ts";
import type { UnitSymbol } from "../../units/index.ts";
import type { ColumnReading, Confidence, Question } from "../reading.ts";
import { type Doubt, questionOf } from "./ask.ts";
import type { Contender } from "./contender.ts";
import type { NumberStyle } from "./parse-number.ts";
import { ROLE_WORDS } from "./roles.ts";
import type { TimeForm } from "./time-form.ts";

/** How the cells of a column in use are to be read. */
export interface UsedColumn {
  readonly columnIndex: number;
  /** null for texts and times. */
  readonly unit: UnitSymbol | null;
  readonly style: NumberStyle;
  /** Its figures count the other way: depth upwards, longitude westwards. */
  readonly isNegated: boolean;
  readonly time: TimeForm | null;
  /** The user has said what it is. */
  readonly isAnswered: boolean;
}

export interface Decision {
  readonly reading: ColumnReading;
  readonly issues: readonly Issue[];
  /** null where the column is not used. */
  readonly used: UsedColumn | null;
  readonly question: Question | null;
}

export type Place = Pick<ColumnReading, "columnIndex" | "header">;

/** A column with the name by which an answer means it. */
export interface NamedPlace extends Place {
  readonly name: string;
}

const PLAIN: NumberStyle = { decimalMark: ".", groupMark: null };

export const leave = (
  { columnIndex, header }: Place,
  why: string,
  confidence: Confidence = "sure",
  ...issues: readonly Issue[]
): Decision => ({
  reading: { columnIndex, header, role: null, unit: null, confidence, reason: `Not used: ${why}.` },
  issues,
  used: null,
  question: null,
});

/** Not used until the user has said what it is. */
export function doubt(place: NamedPlace, why: string, open: Doubt): Decision {
  const issue: Issue = { severity: "warning", code: open.code, message: open.message };
  return { ...leave(place, why, "doubtful", issue), question: questionOf(place.columnIndex, place.name, open) };
}

export type Use = Partial<Omit<UsedColumn, "columnIndex" | "isAnswered">> & {
  readonly confidence?: Confidence;
  readonly issues?: readonly Issue[];
};

export function use(contender: Contender, why: string, how: Use = {}): Decision {
  const { columnIndex, header, role, answer } = contender;
  const { unit = null, style = PLAIN, isNegated = false, time = null, confidence = "sure", issues = [] } = how;
  const source = answer ? "As you said" : "Named as";
  const shownUnit = unit ?? time?.count?.name ?? null;
  return {
    reading: {
      columnIndex,
      header,
      role,
      unit: shownUnit,
      confidence: answer ? "sure" : confidence,
      reason: `${source} ${ROLE_WORDS[role]}; ${why}.`,
    },
    issues,
    used: { columnIndex, unit, style, isNegated, time, isAnswered: answer !== null },
    question: null,
  };
}
