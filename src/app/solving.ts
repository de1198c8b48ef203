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
  for (const kept of stillValid(solved.peek(), wanted)) results.set(kept.cast.id, kept);
  if (solved.peek().survey.levels !== wanted.levels) await moveLevels(results, wanted, isCalledOff);
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
    packed.forEach((answer, k) => {
      results.set(share[k]!.id, unpackCast(answer, share[k]!));
    });
    waiting = waiting.slice(share.length);
  }
  if (isCalledOff()) return;
  progress.value = null;
  solvingTrouble.value = "";
  solved.value = { survey: wanted, casts: wanted.casts.map((cast) => results.get(cast.id)!) };
}

/** Longer than this without a pause would be felt. */
const MOST_AT_ONCE_MS = 12;

/** Reads the levels off columns that stand. */
async function moveLevels(
  results: Map<string, AnsweredCast>,
  wanted: Survey,
  isCalledOff: () => boolean,
): Promise<void> {
  let pauseAtMs = performance.now() + MOST_AT_ONCE_MS;
  for (const [id, { drawn, marked, ...solvedCast }] of results) {
    results.set(id, { ...solveLevels(wanted, solvedCast), drawn, marked });
    if (performance.now() < pauseAtMs) continue;
    await new Promise((resolve) => setTimeout(resolve));
    if (isCalledOff()) return;
    pauseAtMs = performance.now() + MOST_AT_ONCE_MS;
  }
}
