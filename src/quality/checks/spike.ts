import { median } from "simple-statistics";
import type { Evidence, Quantity } from "../evidence.ts";
import type { Finding, NeighbourCheck } from "../finding.ts";
import { QUALITY_FLAG } from "../quality-flag.ts";
import type { InOwnUnit } from "../resolution.ts";
import { hampelScore } from "./hampel-score.ts";
import { residualsFromLine } from "./robust-line.ts";

/** Samples on either side that a sample is held against; fewer at the ends. */
const HALF_WINDOW_COUNT = 3;

/** Neighbours further off than this many ordinary spacings tell nothing about a sample. */
const WIDE_GAP_FACTOR = 3;

/** What sticks out by less, in degC or salinity, moves no pressure that anybody reads. */
const LEAST_HEIGHT: InOwnUnit = 0.05;

const SUSPECT_SCORE = 3;
const FAIL_SCORE = 20;

/** Spike value of the QARTOD manual: how far a value lies from the mean of its two neighbours. */
export const spikeValue = (above: InOwnUnit, at: InOwnUnit, below: InOwnUnit): InOwnUnit =>
  Math.abs(at - (above + below) / 2);

/** How far a value lies beyond both its neighbours; 0 between them. A step or a layer's edge is never beyond. */
const beyondBoth = (above: InOwnUnit, at: InOwnUnit, below: InOwnUnit): InOwnUnit =>
  Math.max(0, at - Math.max(above, below), Math.min(above, below) - at);

/**
 * Samples that stick out of both their neighbours and of the local robust line in depth. The line takes the gradient
 * away, and a pycnocline runs between its neighbours: neither is a spike. It fails where it is far out and the
 * neighbours agree with each other that it is.
 */
export const spike: NeighbourCheck = (evidence, order) => {
  const spacingM = medianSpacingM(evidence, order);
  return evidence.quantities.flatMap((quantity) => spikesOf(quantity, evidence, order, spacingM));
};

function spikesOf(quantity: Quantity, { depthM }: Evidence, order: readonly number[], spacingM: number): Finding[] {
  const { name, values, resolution, write } = quantity;
  const findings: Finding[] = [];
  for (let k = 1; k + 1 < order.length; k++) {
    const [upper, here, lower] = [order[k - 1]!, order[k]!, order[k + 1]!];
    const [above, at, below] = [values[upper]!, values[here]!, values[lower]!];
    const height = beyondBoth(above, at, below);
    if (height < Math.max(LEAST_HEIGHT, 3 * resolution)) continue;
    const widestM = Math.max(depthM[here]! - depthM[upper]!, depthM[lower]! - depthM[here]!);
    if (widestM > WIDE_GAP_FACTOR * spacingM) continue;
    const start = Math.max(0, k - HALF_WINDOW_COUNT);
    const around = order.slice(start, k + HALF_WINDOW_COUNT + 1);
    const residuals = residualsFromLine(
      around.map((i) => depthM[i]!),
      around.map((i) => values[i]!),
    );
    const score = hampelScore(residuals, k - start, resolution);
    if (score < SUSPECT_SCORE) continue;
    const isCertain = score >= FAIL_SCORE && height > 2 * Math.abs(above - below);
    findings.push({
      check: "spike",
      sampleIndex: here,
      flag: isCertain ? QUALITY_FLAG.fail : QUALITY_FLAG.suspect,
      reason: `${name} ${write(at)} sticks out by ${write(spikeValue(above, at, below))} from ${write(above)} above and ${write(below)} below`,
    });
  }
  return findings;
}

function medianSpacingM({ depthM }: Evidence, order: readonly number[]): number {
  const stepsM = order.slice(1).map((i, k) => depthM[i]! - depthM[order[k]!]!);
  return stepsM.length === 0 ? 0 : median(stepsM);
}
