/** Columns of one name and one role: where they hold different values, only the user can say which it is. */
import type { ColumnRole } from "../reading.ts";
import { choose } from "./ask.ts";
import type { Contender } from "./contender.ts";
import { type Decision, doubt } from "./decision.ts";
import { ROLE_WORDS } from "./roles.ts";

function whichTwin(winner: Contender, contenders: readonly Contender[]): Decision | null {
  const isTwin = ({ role, header, filled }: Contender): boolean =>
    role === winner.role && header === winner.header && filled.length > 0;
  const twins = winner.answer === null ? contenders.filter(isTwin) : [];
  const isSame = ({ filled }: Contender): boolean => filled.join("\n") === winner.filled.join("\n");
  if (twins.length < 2 || twins.every(isSame)) return null;
  const words = ROLE_WORDS[winner.role];
  const why = `${twins.length} columns of this name hold different values`;
  const unit = winner.written?.unit?.symbol ?? null;
  return doubt(winner, why, {
    code: "same-name-twice",
    message: `"${winner.header}": ${why}; say which is ${words}`,
    choices: twins.map(({ name, columnIndex }) =>
      choose(name, winner.role, unit, `column ${columnIndex + 1} is ${words}`),
    ),
  });
}

/** What is asked about the winner of a role, by role. */
export function askAboutTwins(
  winners: ReadonlyMap<ColumnRole, Contender>,
  contenders: readonly Contender[],
): ReadonlyMap<ColumnRole, Decision> {
  return new Map(
    [...winners].flatMap(([role, winner]) => {
      const asked = whichTwin(winner, contenders);
      return asked === null ? [] : [[role, asked]];
    }),
  );
}
