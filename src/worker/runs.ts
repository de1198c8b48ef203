/** Equal neighbours of a long list said once, so that the list crosses between threads in no time. */
export interface Run<T> {
  readonly value: T;
  readonly count: number;
}

export function packRuns<T>(items: readonly T[], isSame: (a: T, b: T) => boolean = Object.is): readonly Run<T>[] {
  const runs: { value: T; count: number }[] = [];
  for (const value of items) {
    const last = runs.at(-1);
    if (last && isSame(last.value, value)) last.count++;
    else runs.push({ value, count: 1 });
  }
  return runs;
}

/** The list again; the items of one run are the same object. */
export function unpackRuns<T>(runs: readonly Run<T>[]): readonly T[] {
  const items = new Array<T>(runs.reduce((sum, run) => sum + run.count, 0));
  let start = 0;
  for (const { value, count } of runs) {
    items.fill(value, start, start + count);
    start += count;
  }
  return items;
}
