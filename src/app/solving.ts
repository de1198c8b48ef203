import { effect } from "@preact/signals";
import { type Survey, solveLevels } from "../survey/index.ts";
import { type AnsweredCast, onShelf, unpackCast } from "../worker/index.ts";
import { samplesKeyOf } from "./samples-keys.ts";
import { editsByCast, nextShare, stillValid } from "./state/solved-share.ts";
import { progress, solved, solvingTrouble, survey } from "./store.ts";
import { threads } from "./threads.ts";

/** Keeps the results up to date with the survey, in the background; work that a newer change outdates is called off. */
export function keepSolved(): void {
  effect(() => {
    const wanted = survey.value;
    solveInShares(wanted).catch((cause: unknown) => {
      progress.value = null;
      solvingTrouble.value = `The results are not up to date: ${cause instanceof Error ? cause.message : String(cause)}.`;
    });
  });
}

async function solveInShares(wanted: Survey): Promise<void> {
  const results = new Map<string, AnsweredCast>();
  const isCalledOff = (): boolean => survey.peek() !== wanted;
  const breath = breathing();
  for (const kept of stillValid(solved.peek(), wanted)) results.set(kept.cast.id, kept);
  if (solved.peek().survey.levels !== wanted.levels) {
    for (const [id, result] of results) {
      if (isCalledOff()) return;
      results.set(id, atLevels(wanted, result));
      await breath();
    }
  }
  let waiting = wanted.casts.filter((cast) => !results.has(cast.id));
  const { casts: _, name: __, ...terms } = wanted;
  const edits = editsByCast(wanted.flagEdits);
  while (waiting.length > 0 && !isCalledOff()) {
    const share = nextShare(waiting);
    progress.value = { doneCount: results.size, allCount: wanted.casts.length };
    const packed = await threads.solver.solve(
      { ...terms, flagEdits: share.flatMap((cast) => edits.get(cast.id) ?? []) },
      share.map((cast) => onShelf(cast, samplesKeyOf(cast.samples))),
    );
    for (const [k, answer] of packed.entries()) {
      results.set(share[k]!.id, unpackCast(answer, share[k]!));
      await breath();
    }
    waiting = waiting.slice(share.length);
  }
  if (isCalledOff()) return;
  progress.value = null;
  solvingTrouble.value = "";
  solved.value = { survey: wanted, casts: wanted.casts.map((cast) => results.get(cast.id)!) };
}

/** Reads the levels off a column that stands. */
function atLevels(wanted: Survey, { drawn, marked, bottomBudget, ...solvedCast }: AnsweredCast): AnsweredCast {
  return { ...solveLevels(wanted, solvedCast), drawn, marked, bottomBudget };
}

/** Longer than this without a pause would be felt. */
const MOST_AT_ONCE_MS = 12;

/** A pause for the page whenever much has been done since the last. */
function breathing(): () => Promise<void> {
  let pauseAtMs = performance.now() + MOST_AT_ONCE_MS;
  return async () => {
    if (performance.now() < pauseAtMs) return;
    await new Promise((resolve) => setTimeout(resolve));
    pauseAtMs = performance.now() + MOST_AT_ONCE_MS;
  };
}
