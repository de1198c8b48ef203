/** Flags of the open QARTOD manuals (IOOS 2016): 1 pass, 2 not evaluated, 3 suspect, 4 fail, 9 missing. */
export const QUALITY_FLAG = { pass: 1, notEvaluated: 2, suspect: 3, fail: 4, missing: 9 } as const;

export type QualityFlag = (typeof QUALITY_FLAG)[keyof typeof QUALITY_FLAG];

const WORST_FIRST: readonly QualityFlag[] = [
  QUALITY_FLAG.missing,
  QUALITY_FLAG.fail,
  QUALITY_FLAG.suspect,
  QUALITY_FLAG.pass,
];

/** What several flags of one sample come to: missing stays missing, then the worst; not evaluated where no test ran. */
export const worstFlag = (flags: ArrayLike<number>): QualityFlag =>
  WORST_FIRST.find((flag) => Array.prototype.includes.call(flags, flag)) ?? QUALITY_FLAG.notEvaluated;
