import type { Issue } from "../../base/index.ts";

/** Problems as they were found: line, message. Text from files stays text. */
export function IssueList({ issues, fileName }: { readonly issues: readonly Issue[]; readonly fileName?: string }) {
  return (
    <ul class="issues">
      {issues.map((issue, k) => (
        <li key={k} class={issue.severity}>
          <b>{issue.severity}</b> {place(fileName, issue.line)}
          {issue.message}
        </li>
      ))}
    </ul>
  );
}

const place = (fileName: string | undefined, line: number | undefined): string => {
  const parts = [...(fileName ? [fileName] : []), ...(line === undefined ? [] : [`line ${line}`])];
  return parts.length > 0 ? `${parts.join(", ")}: ` : "";
};
