/** A value with its past and future. Every change to the user's work goes through `remember`, so every change can be undone. */
export interface History<T> {
  readonly past: readonly T[];
  readonly present: T;
  readonly future: readonly T[];
}

const LONGEST_PAST_COUNT = 200;

export const startHistory = <T>(present: T): History<T> => ({ past: [], present, future: [] });

export const remember = <T>(history: History<T>, next: T): History<T> =>
  next === history.present
    ? history
    : { past: [...history.past, history.present].slice(-LONGEST_PAST_COUNT), present: next, future: [] };

export function undo<T>(history: History<T>): History<T> {
  const previous = history.past.at(-1);
  if (previous === undefined) return history;
  return { past: history.past.slice(0, -1), present: previous, future: [history.present, ...history.future] };
}

export function redo<T>(history: History<T>): History<T> {
  const [next, ...future] = history.future;
  if (next === undefined) return history;
  return { past: [...history.past, history.present], present: next, future };
}
