import { effect } from "@preact/signals";
import type { SolvedCast, Survey } from "../survey/index.ts";
import { nextShare, stillValid } from "./state/solved-share.ts";
import { progress, solved, solvingTrouble, survey } from "./store.ts";
import { thread } from "./thread.ts";

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
  const results = new Map<string, SolvedCast>();
  for (const kept of stillValid(solved.peek(), wanted)) results.set(kept.cast.id, kept);
  let waiting = wanted.casts.filter((cast) => !results.has(cast.id));
  while (waiting.length > 0) {
    const share = nextShare(waiting);
    if (share.length < waiting.length || results.size > share.length)
      progress.value = { doneCount: results.size, allCount: wanted.casts.length };
    const answer = await thread.solve({ ...wanted, casts: share });
    if (survey.peek() !== wanted) return;
    answer.forEach((result, k) => {
      results.set(share[k]!.id, { ...result, cast: share[k]! });
    });
    waiting = waiting.slice(share.length);
  }
  progress.value = null;
  solvingTrouble.value = "";
  solved.value = { survey: wanted, casts: wanted.casts.map((cast) => results.get(cast.id)!) };
}
