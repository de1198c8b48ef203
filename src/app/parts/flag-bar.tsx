import type { FlagEdit } from "../../survey/index.ts";
import { MOST_SELECTED_COUNT, selectSamples } from "../show/flag-selection.ts";
import { shownValue } from "../show/shown.ts";
import { castInHand, dispatch, flagRange, isFlagging, state } from "../store.ts";
import { toggleFlagging } from "../use-flag-key.ts";

const CHOICES: readonly { readonly flag: FlagEdit["flag"] | null; readonly label: string }[] = [
  { flag: 4, label: "Do not use" },
  { flag: 1, label: "Use" },
  { flag: null, label: "Undo my flags" },
];

/** Over the charts: what the marks mean, and the user's own word on samples. */
export function FlagBar() {
  const inHand = castInHand.value;
  if (!inHand) return null;
  const { flaggedCount, leftOutCount, areAllMarked } = inHand.marked;
  return (
    <div class="flag-bar">
      {flaggedCount + leftOutCount > 0 ? (
        <span class="legend">
          {flaggedCount > 0 ? "◇ suspect, in use" : ""}
          {flaggedCount > 0 && leftOutCount > 0 ? " · " : ""}
          {leftOutCount > 0 ? "× left out" : ""}
          {areAllMarked ? "" : " (some of them shown)"}
        </span>
      ) : null}
      {isFlagging.value ? <Selection /> : null}
      <button type="button" class="small" aria-pressed={isFlagging.value} title="F" onClick={toggleFlagging}>
        Flag samples
      </button>
    </div>
  );
}

function Selection() {
  const inHand = castInHand.value;
  const range = flagRange.value;
  if (!inHand || !range)
    return <span class="legend">Drag over a range of depth, or hold Shift and use the arrow keys in the charts</span>;
  const { system } = state.value;
  const { count, ranges } = selectSamples(inHand, range);
  const [topM, bottomM] = range.fromM < range.toM ? [range.fromM, range.toM] : [range.toM, range.fromM];
  const isTooMany = count > MOST_SELECTED_COUNT;
  return (
    <>
      <span role="status">
        {count} {count === 1 ? "sample" : "samples"} from {shownValue(topM, "depth", system)} to{" "}
        {shownValue(bottomM, "depth", system)}
        {isTooMany ? `; at most ${MOST_SELECTED_COUNT} at once` : ""}
      </span>
      {CHOICES.map(({ flag, label }) => (
        <button
          key={label}
          type="button"
          class="small"
          disabled={count === 0 || isTooMany}
          onClick={() => dispatch({ kind: "samples-flagged", ranges, flag })}
        >
          {label}
        </button>
      ))}
    </>
  );
}
