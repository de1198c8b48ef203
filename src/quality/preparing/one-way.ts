import { max, min } from "simple-statistics";
import { type Evidence, written } from "../evidence.ts";
import type { Finding } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";
import { withoutDeck } from "./deck.ts";
import { soakEnd } from "./soak.ts";

/** Nearer to the deepest sample than this the probe was still at the bottom of its way. */
const BOTTOM_M = 0.2;

/** Going back by less is standing still, and no mark against a sample (QARTOD; in dbar, from memory). */
const STILL_M = 0.02;

/** Of the depths a lowering covers, the share that the way down must have for `auto` to take it. */
const LEAST_SHARE_RATIO = 0.5;

/**
 * Takes one way of a raw record: without the deck, without the soak, and of the rest only samples deeper (on the way up:
 * shallower) than every earlier one, so that each depth is counted once.
 * @param inTime indices of the samples with a depth, in the order they were recorded
 * @returns what is said of those that do not belong to the way
 */
export function oneWay(evidence: Evidence, inTime: readonly number[], way: "auto" | "down" | "up"): readonly Finding[] {
  const { depthM, samples } = evidence;
  const { wet, findings: onDeck } = withoutDeck(evidence, inTime);
  if (wet.length === 0) return onDeck;
  const depthsM = wet.map((i) => depthM[i]!);
  const deepestM = max(depthsM);
  const isAtBottom = (depthM: number): boolean => depthM >= deepestM - BOTTOM_M;
  const taken = way === "auto" ? betterWay(depthsM, deepestM) : way;

  const findings: Finding[] = [...onDeck];
  const leaveOut = (check: Finding["check"], k: number, flag: Finding["flag"], reason: string): void =>
    void findings.push({ check, sampleIndex: wet[k]!, flag, leftOut: true, reason });
  const soakEndIndex = taken === "down" ? soakEnd(depthsM.slice(0, depthsM.indexOf(deepestM) + 1)) : 0;
  const startIndex = taken === "down" ? soakEndIndex : depthsM.findIndex(isAtBottom);
  const lastIndex = taken === "down" ? depthsM.findLastIndex(isAtBottom) : depthsM.length - 1;
  /** The sample that the next one has to pass, and what is said of those that do not. */
  let furthest = startIndex;
  let reason: string | null = null;
  const reasonNow = (): string => {
    const passed = `${written(depthsM[furthest]!)} m at line ${samples.lineIndex[wet[furthest]!]}`;
    const words = taken === "down" ? `not deeper than ${passed}` : `not shallower than ${passed}`;
    return `${words}: the probe had turned or stood still`;
  };
  const passOn = (k: number): void => {
    furthest = k;
    reason = null;
  };
  depthsM.forEach((depth, k) => {
    if (k < soakEndIndex) leaveOut("soak", k, null, "recorded while the probe waited near the surface");
    else if (k < startIndex) leaveOut("other-way", k, null, "recorded on the way down; the way up is used");
    else if (k > lastIndex) leaveOut("other-way", k, null, "recorded on the way up; the way down is used");
    else if (k === startIndex) passOn(k);
    else if (taken === "down" ? depth > depthsM[furthest]! : depth < depthsM[furthest]!) passOn(k);
    else {
      const backM = Math.abs(depthsM[furthest]! - depth);
      const flag = backM > STILL_M ? QUALITY_FLAG.suspect : null;
      reason ??= reasonNow();
      leaveOut("pressure-reversal", k, flag, reason);
    }
  });
  return findings;
}

/** Down, unless the record of it is missing most of the depths. */
function betterWay(depthsM: readonly number[], deepestM: number): "down" | "up" {
  const deepestIndex = depthsM.indexOf(deepestM);
  const shallowestM = min(depthsM);
  const coveredM = deepestM - min(depthsM.slice(0, deepestIndex + 1));
  return coveredM >= LEAST_SHARE_RATIO * (deepestM - shallowestM) ? "down" : "up";
}
