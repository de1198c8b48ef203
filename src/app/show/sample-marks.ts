import type { MarkInput } from "../../charts/layout/index.ts";
import type { DisplaySystem } from "../../units/index.ts";
import type { AnsweredCast } from "../../worker/index.ts";
import { columnValuesAt, inShownUnitOne } from "./profile-sheet.ts";

/**
 * The flagged samples of a cast as the charts mark them. Temperature and salinity are the sample's own; what follows from
 * the whole column is the column's at that depth.
 */
export function sampleMarks({ marked, solution, drawn }: AnsweredCast, system: DisplaySystem): readonly MarkInput[] {
  const { depthM, inSituTempC, practicalSalinity, isUsed } = marked.marks;
  if (!solution || !drawn) return [];
  const ofColumn = columnValuesAt(solution, Array.from(depthM), system);
  return Array.from(depthM, (at, k) => ({
    kind: isUsed[k] === 1 ? "suspect" : "left-out",
    depth: inShownUnitOne(at, "depth", system),
    values: {
      ...ofColumn(k),
      temperature: inShownUnitOne(inSituTempC[k]!, "temperature", system),
      salinity: inShownUnitOne(practicalSalinity[k]!, "practicalSalinity", system),
    },
  }));
}

/** Why the flagged sample nearest to a depth is flagged; empty where none is within reach. */
export function reasonsNear({ marked, prepared }: AnsweredCast, depthM: number, reachM: number): string {
  const { marks } = marked;
  let nearest = -1;
  let leastM = reachM;
  marks.depthM.forEach((at, k) => {
    const awayM = Math.abs(at - depthM);
    if (awayM <= leastM) {
      nearest = k;
      leastM = awayM;
    }
  });
  if (nearest < 0) return "";
  const reasons = prepared.reasons[marks.sampleIndex[nearest]!]!.join("; ");
  return `${marks.isUsed[nearest] === 1 ? "◇ flagged" : "× left out"}: ${reasons}`;
}
