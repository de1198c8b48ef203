/** What a command needs of the machine; tests bring their own. */
export interface Host {
  readonly out: (text: string) => void;
  readonly err: (text: string) => void;
  /** Bytes of a file; rejects with the system's error (its `code` says why). */
  readonly readFile: (path: string) => Promise<Uint8Array>;
  readonly readStandardInput: () => Promise<Uint8Array>;
  /** Shows a line that the next one overwrites; null where nobody is watching (no terminal). */
  readonly showStatus: ((line: string) => void) | null;
  /** Writes a file, making the folders it needs. */
  readonly writeFile: (path: string, text: string) => Promise<void>;
}

export const EXIT = { done: 0, fault: 1, badInput: 2, badUsage: 64 } as const;
export type ExitCode = (typeof EXIT)[keyof typeof EXIT];

/** The command line itself is wrong: said in one line, exit 64. */
export class UsageError extends Error {
  override readonly name = "UsageError";
}
