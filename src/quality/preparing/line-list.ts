const MOST_RUNS_COUNT = 5;

/** Lines of a file in words, runs drawn together: `line 12`, `lines 78 to 85, 91 and 3 more`. */
export function lineList(lines: readonly number[]): string {
  const sorted = [...lines].sort((a, b) => a - b);
  const runs: { firstIndex: number; lastIndex: number }[] = [];
  for (const line of sorted) {
    const run = runs.at(-1);
    if (run && line === run.lastIndex + 1) run.lastIndex = line;
    else runs.push({ firstIndex: line, lastIndex: line });
  }
  const shown = runs
    .slice(0, MOST_RUNS_COUNT)
    .map(({ firstIndex, lastIndex }) => (firstIndex === lastIndex ? `${firstIndex}` : `${firstIndex} to ${lastIndex}`));
  const moreCount = runs
    .slice(MOST_RUNS_COUNT)
    .reduce((sum, { firstIndex, lastIndex }) => sum + lastIndex - firstIndex + 1, 0);
  const more = moreCount === 0 ? "" : ` and ${moreCount} more`;
  return `line${sorted.length === 1 ? "" : "s"} ${shown.join(", ")}${more}`;
}
