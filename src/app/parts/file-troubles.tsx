import type { FileTrouble } from "../state/app-state.ts";
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
      <details open={refusedCount > 0}>
        <summary>{headline(troubles)}</summary>
        {ordered.map(({ fileName, issues }) => (
          <IssueList key={fileName} fileName={fileName} issues={issues} />
        ))}
      </details>
      <button type="button" class="plain small" onClick={() => dispatch({ kind: "troubles-dismissed" })}>
        Dismiss
      </button>
    </section>
  );
}

function headline(troubles: readonly FileTrouble[]): string {
  const refused = troubles.filter((trouble) => !trouble.wasRead);
  if (refused.length > 0)
    return refused.length === 1 ? `${refused[0]!.fileName} was not read` : `${refused.length} files were not read`;
  const remarksCount = troubles.reduce((count, trouble) => count + trouble.issues.length, 0);
  const what = troubles.length === 1 ? troubles[0]!.fileName : `${troubles.length} files`;
  return `${what} read, with ${remarksCount === 1 ? "one remark" : `${remarksCount} remarks`}`;
}
