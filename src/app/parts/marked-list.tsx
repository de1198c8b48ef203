import type { MarkedRun, MarkedSamples } from "../../worker/index.ts";

const MOST_SHOWN_COUNT = 100;

/** Flagged and left-out samples with their reasons, by the lines of the file. */
export function MarkedList({ marked }: { readonly marked: MarkedSamples }) {
  const { flaggedCount, leftOutCount, runs } = marked;
  if (flaggedCount + leftOutCount === 0) return null;
  const hiddenCount = runs.length - MOST_SHOWN_COUNT;
  return (
    <details>
      <summary>
        {flaggedCount} flagged, {leftOutCount} left out
      </summary>
      <ul class="issues">
        {runs.slice(0, MOST_SHOWN_COUNT).map((run) => (
          <li key={run.fromLineIndex}>
            <b>{run.isUsed ? "◇ flagged" : "× left out"}</b> {lines(run)}: {run.reasons.join("; ") || "no reason given"}
          </li>
        ))}
        {hiddenCount > 0 ? <li>and {hiddenCount} more</li> : null}
      </ul>
    </details>
  );
}

const lines = ({ fromLineIndex, toLineIndex, count }: MarkedRun): string =>
  count === 1 ? `line ${fromLineIndex}` : `lines ${fromLineIndex} to ${toLineIndex} (${count})`;
