import type { Evidence } from "../evidence.ts";
import type { Finding, NeighbourCheck } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";
import { densityInversion } from "./density-inversion.ts";
import { drySensor } from "./dry-sensor.ts";
import { flatLine } from "./flat-line.ts";
import { rate } from "./rate.ts";
import { spike } from "./spike.ts";
import { stuckSensor } from "./stuck-sensor.ts";

/** Those that know the culprit best come first, so that its neighbours are not blamed by the next. */
const IN_TURN: readonly NeighbourCheck[] = [drySensor, spike, flatLine, densityInversion, rate, stuckSensor];

/** A cast that is still not clean after so many rounds is noise throughout; what is left of it is flagged as it stands. */
const MOST_ROUNDS_COUNT = 50;

/**
 * Holds samples against their neighbours, by every check in turn. As soon as samples fail they are taken away and all
 * begins anew: a good sample must not be blamed for its neighbour, and what is left passes when it is checked again.
 * @param order indices of samples from the top down
 */
export function checkNeighbours(evidence: Evidence, order: readonly number[]): readonly Finding[] {
  let failed: readonly Finding[] = [];
  let left = order;
  for (let round = 0; round < MOST_ROUNDS_COUNT && left.length > 0; round++) {
    const found = firstFailure(evidence, left);
    if (found.failing.length === 0) return [...failed, ...found.suspects];
    const gone = new Set(found.failing.map(({ sampleIndex }) => sampleIndex));
    failed = [...failed, ...found.suspects.filter(({ sampleIndex }) => gone.has(sampleIndex)), ...found.failing];
    left = left.filter((i) => !gone.has(i));
  }
  return failed;
}

/** What the checks find until one of them fails samples. */
function firstFailure(
  evidence: Evidence,
  order: readonly number[],
): { readonly failing: readonly Finding[]; readonly suspects: readonly Finding[] } {
  let suspects: readonly Finding[] = [];
  for (const check of IN_TURN) {
    const found = check(evidence, order);
    const failing = found.filter(({ flag }) => flag === QUALITY_FLAG.fail);
    if (failing.length > 0) return { failing, suspects };
    suspects = [...suspects, ...found];
  }
  return { failing: [], suspects };
}
