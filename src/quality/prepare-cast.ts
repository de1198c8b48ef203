import { ToolError } from "../base/index.ts";
import type { Cast } from "../cast/index.ts";
import { freezing } from "./checks/freezing.ts";
import { grossRange } from "./checks/gross-range.ts";
import { missing } from "./checks/missing.ts";
import { checkNeighbours } from "./checks/neighbour-checks.ts";
import { statedDensity } from "./checks/stated-density.ts";
import { statedFlag } from "./checks/stated-flag.ts";
import { type Evidence, evidenceOf } from "./evidence.ts";
import type { Finding } from "./finding.ts";
import { findingsAsIssues } from "./findings-as-issues.ts";
import { type FlagEdit, wordsAsFindings, wordsOn } from "./flag-edit.ts";
import type { Preparation } from "./preparation.ts";
import type { PreparedCast } from "./prepared-cast.ts";
import { depthBins } from "./preparing/depth-bins.ts";
import { depthJumps } from "./preparing/depth-jump.ts";
import { duplicates } from "./preparing/duplicates.ts";
import { oneWay } from "./preparing/one-way.ts";
import { goesBothWays, isRawRecord } from "./preparing/raw-record.ts";
import { selectSamples } from "./preparing/select-samples.ts";
import { QUALITY_FLAG, worstFlag } from "./quality-flag.ts";
import { takesOut, verdictsOn } from "./verdicts.ts";

/**
 * Runs every check on a cast, takes out what does not belong into a column, and says why of each sample. Samples that
 * fail are not used, suspect ones are; the user's own flags win over both. Samples without depth, temperature or
 * salinity, or above the surface, can not be used whatever anybody says. Where nothing has to be done, the cast that
 * comes out is the one that went in.
 * @param edits of any casts; those of other casts are passed over
 * @param unmeasuredPracticalSalinity what the basis says where the probe measured none
 */
export function prepareCast(
  cast: Cast,
  preparation: Preparation,
  edits: readonly FlagEdit[],
  unmeasuredPracticalSalinity: number,
): PreparedCast {
  const { binM } = preparation;
  if (binM !== null && !(binM > 0))
    throw new ToolError("DomainError", `binM is ${binM}, expected more than 0 m or null`);
  const { samples } = cast;
  const evidence = evidenceOf(cast, unmeasuredPracticalSalinity);
  const byHand = wordsOn(cast, edits);
  const unusable = missing(evidence);
  const isUsable = inNone(unusable);
  const alone = [...grossRange(evidence, preparation.waterKind), ...freezing(evidence), ...statedFlag(evidence)];
  const density = statedDensity(evidence);
  const usable = [...samples.lineIndex.keys()].filter((i) => isUsable(i) && byHand.get(i) !== QUALITY_FLAG.fail);
  const { placing, isOneWay } = placeInWay(evidence, usable, preparation.way);

  const isGood = inNone([...alone, ...placing].filter(takesOut));
  const order = usable.filter((i) => byHand.get(i) === QUALITY_FLAG.pass || isGood(i));
  const neighbours = checkNeighbours(evidence, fromTheTopDown(evidence, order));

  const words = wordsAsFindings(byHand).filter(({ sampleIndex }) => isUsable(sampleIndex));
  const findings = [...unusable, ...alone, ...density.findings, ...placing, ...neighbours];
  const verdicts = verdictsOn(samples.n, findings, words);
  const used = [...verdicts.use.keys()].filter((i) => verdicts.use[i] === 1);
  const chosen = grouped(evidence, used, { isOneWay, binM });
  return {
    ...verdicts,
    cast: isWhole(chosen, samples.n) ? cast : { ...cast, samples: selectSamples(samples, chosen) },
    sampleIndexOf: Int32Array.from(chosen, (group) => group[0]!),
    preparedFlag: Uint8Array.from(chosen, (group) => worstFlag(group.map((i) => verdicts.flag[i]!))),
    binCount: binM === null ? null : Int32Array.from(chosen, (group) => group.length),
    issues: [...density.issues, ...findingsAsIssues([...words, ...findings], samples, verdicts.use)],
  };
}

const inNone = (findings: readonly Finding[]): ((sampleIndex: number) => boolean) => {
  const indices = new Set(findings.map(({ sampleIndex }) => sampleIndex));
  return (sampleIndex) => !indices.has(sampleIndex);
};

/** What the choice of a way and repeated rows leave out; with `auto` only of a raw record. */
function placeInWay(
  evidence: Evidence,
  usable: readonly number[],
  way: Preparation["way"],
): { readonly placing: readonly Finding[]; readonly isOneWay: boolean } {
  if (way === "all") return { placing: [], isOneWay: false };
  const repeats = duplicates(evidence.samples, usable);
  const once = usable.filter(inNone(repeats));
  const { timeS } = evidence.samples;
  const depthsM = once.map((i) => evidence.depthM[i]!);
  const isToBeCut = way === "auto" ? isRawRecord(depthsM, timeS && once.map((i) => timeS[i]!)) : goesBothWays(depthsM);
  if (!isToBeCut) return { placing: repeats, isOneWay: false };
  const jumps = depthJumps(evidence, once);
  return { placing: [...repeats, ...jumps, ...oneWay(evidence, once.filter(inNone(jumps)), way)], isOneWay: true };
}

const fromTheTopDown = ({ depthM }: Evidence, indices: readonly number[]): readonly number[] =>
  indices.every((i, k) => k === 0 || depthM[i]! >= depthM[indices[k - 1]!]!)
    ? indices
    : [...indices].sort((a, b) => depthM[a]! - depthM[b]! || a - b);

/** The samples that each prepared sample is made of. Without a way or bins the order of the file is kept. */
function grouped(
  evidence: Evidence,
  used: readonly number[],
  { isOneWay, binM }: { readonly isOneWay: boolean; readonly binM: number | null },
): readonly (readonly number[])[] {
  if (binM !== null) return depthBins(evidence.depthM, fromTheTopDown(evidence, used), binM);
  return (isOneWay ? fromTheTopDown(evidence, used) : used).map((i) => [i]);
}

/** Whether every sample is there, alone and in its place. */
const isWhole = (groups: readonly (readonly number[])[], n: number): boolean =>
  groups.length === n && groups.every((group, i) => group.length === 1 && group[0] === i);
