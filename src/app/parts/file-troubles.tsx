import { dispatch, state } from "../store.ts";
import { IssueList } from "./issue-list.tsx";

/** What the files added last had wrong; files that could not be read come first. */
export function FileTroubles() {
  const { troubles } = state.value;
  if (troubles.length === 0) return null;
  const refusedCount = troubles.filter((trouble) => !trouble.wasRead).length;
  const ordered = troubles.toSorted((a, b) => Number(a.wasRead) - Number(b.wasRead));
  return (
    <section class={`troubles${refusedCount > 0 ? " refused" : ""}`} aria-label="Problems in files" role="status">
      <div class="heading">
        <h2>{headline(refusedCount)}</h2>
        <button type="button" class="plain small" onClick={() => dispatch({ kind: "troubles-dismissed" })}>
          Dismiss
        </button>
      </div>
      {ordered.map(({ fileName, issues }) => (
        <IssueList key={fileName} fileName={fileName} issues={issues} />
      ))}
    </section>
  );
}

const headline = (refusedCount: number): string =>
  refusedCount === 0
    ? "Read, with remarks"
    : refusedCount === 1
      ? "One file was not read"
      : `${refusedCount} files were not read`;
