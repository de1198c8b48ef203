export type Severity = "error" | "warning" | "note";

/**
 * One thing a user must or may want to know about what they gave us. Problems in data are values, collected to the
 * end of the file; only misuse of the library throws (see ToolError).
 */
export interface Issue {
  readonly severity: Severity;
  /** Stable, kebab-case; what programs test for. */
  readonly code: string;
  /** Where, what was found, what was expected, what to do. No full stop. */
  readonly message: string;
  /** 1-based line in the file, where there is one. */
  readonly line?: number;
}

/** A value with the issues met on the way to it, or only the issues when there is no value to give. */
export type Outcome<T> =
  | { readonly ok: true; readonly value: T; readonly issues: readonly Issue[] }
  | { readonly ok: false; readonly issues: readonly Issue[] };

export const failed = (...issues: readonly Issue[]): { readonly ok: false; readonly issues: readonly Issue[] } => ({
  ok: false,
  issues,
});

export const succeeded = <T>(value: T, issues: readonly Issue[] = []): Outcome<T> => ({ ok: true, value, issues });
