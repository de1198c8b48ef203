import type { Issue } from "../base/index.ts";

/** `file:line: severity: message`, as editors and terminals know it; an error goes without the word. */
export function issueLine(where: string, issue: Issue): string {
  const place = issue.line === undefined ? where : `${where}:${issue.line}`;
  return `${place}: ${issue.severity === "error" ? "" : `${issue.severity}: `}${issue.message}\n`;
}

interface CastIssues {
  readonly castName: string;
  readonly issues: readonly Issue[];
}

/** The issues of a file's casts, a line each; what is the same for several casts is said once. */
export function castIssueLines(fileName: string, casts: readonly CastIssues[]): string {
  const alike = new Map<string, { readonly issue: Issue; readonly castNames: string[] }>();
  for (const { castName, issues } of casts)
    for (const issue of issues) {
      const key = JSON.stringify([issue.severity, issue.message, issue.line]);
      const known = alike.get(key);
      if (known) known.castNames.push(castName);
      else alike.set(key, { issue, castNames: [castName] });
    }
  return [...alike.values()].map(({ issue, castNames }) => issueLine(fileName, said(issue, castNames))).join("");
}

const said = (issue: Issue, castNames: readonly string[]): Issue => {
  const [first = "", ...others] = castNames;
  const whose = others.length === 0 ? first : `${first} and ${others.length} more casts`;
  return { ...issue, message: `${whose}: ${issue.message}` };
};
