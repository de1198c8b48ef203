import type { Finding } from "./finding.ts";
import { QUALITY_FLAG, worstFlag } from "./quality-flag.ts";

/** What all findings and the user's word on samples come to, one entry a sample as read. */
export interface Verdicts {
  readonly flag: Uint8Array;
  readonly reasons: readonly (readonly string[])[];
  /** 1 where the sample goes into the column. */
  readonly use: Uint8Array;
}

/** Whether a finding alone keeps its sample out of the column. */
export const takesOut = ({ flag, leftOut }: Finding): boolean =>
  leftOut === true || flag === QUALITY_FLAG.fail || flag === QUALITY_FLAG.missing;

/** Lists of one reason each; of a raw record a million samples may have the same. */
function sharedLists(): (reason: string) => readonly string[] {
  const known = new Map<string, readonly string[]>();
  return (reason) => {
    const list = known.get(reason) ?? [reason];
    known.set(reason, list);
    return list;
  };
}

/**
 * Weighs the findings on each sample: its flag is the worst of them, and pass where there is none.
 * @param words the user's own, which win over all findings
 */
export function verdictsOn(n: number, findings: readonly Finding[], words: readonly Finding[]): Verdicts {
  const flag = new Uint8Array(n).fill(QUALITY_FLAG.pass);
  const use = new Uint8Array(n).fill(1);
  const reasons = new Array<readonly string[]>(n).fill([]);
  const alone = sharedLists();
  for (const finding of findings) {
    const i = finding.sampleIndex;
    if (finding.flag !== null) flag[i] = worstFlag([flag[i]!, finding.flag]);
    if (takesOut(finding)) use[i] = 0;
    reasons[i] = reasons[i]!.length === 0 ? alone(finding.reason) : [...reasons[i]!, finding.reason];
  }
  for (const word of words) {
    const i = word.sampleIndex;
    flag[i] = word.flag!;
    use[i] = takesOut(word) ? 0 : 1;
    reasons[i] = [word.reason, ...reasons[i]!];
  }
  return { flag, reasons, use };
}
