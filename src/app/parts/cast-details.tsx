import { type KeptReading, readingsOf } from "../state/app-state.ts";
import { castInHand, openReading, state } from "../store.ts";
import { IssueList } from "./issue-list.tsx";
import { MarkedList } from "./marked-list.tsx";

/** What was met on the way to the cast in hand, and how its file was understood: every decision can be checked. */
export function CastDetails() {
  const inHand = castInHand.value;
  if (!inHand) return null;
  const reading = readingsOf(state.value).find(({ fileName }) => fileName === inHand.cast.fileName);
  const { issues } = inHand;
  return (
    <section aria-label="About this cast">
      {issues.length > 0 ? (
        <details open={inHand.solution === null}>
          <summary>
            {issues.length} {issues.length === 1 ? "remark" : "remarks"} on this cast
          </summary>
          <IssueList issues={issues} />
        </details>
      ) : null}
      <MarkedList marked={inHand.marked} />
      {reading ? <HowReadButton reading={reading} /> : null}
    </section>
  );
}

function HowReadButton({ reading: { fileName } }: { readonly reading: KeptReading }) {
  const isOpen = openReading.value === fileName;
  return (
    <p class="how-read">
      <button
        type="button"
        aria-expanded={isOpen}
        onClick={() => {
          openReading.value = isOpen ? null : fileName;
        }}
      >
        How the file was read
      </button>
    </p>
  );
}
