import type { Host } from "./host.ts";

/** Smaller files are read before a bar could be looked at. */
const LEAST_BYTES = 8 * 2 ** 20;
const WIDTH = 30;

/** A bar on the terminal for a long file; `end` takes it away. */
export function progressBar(
  host: Host,
  path: string,
  bytes: number,
): { readonly onShare: (doneFrac: number) => void; readonly end: () => void } {
  const { showStatus } = host;
  if (showStatus === null || bytes < LEAST_BYTES) return { onShare: () => {}, end: () => {} };
  let shownPercent = -1;
  return {
    onShare: (doneFrac) => {
      const percent = Math.floor(doneFrac * 100);
      if (percent <= shownPercent) return;
      shownPercent = percent;
      const done = Math.round(doneFrac * WIDTH);
      showStatus(`${path} [${"#".repeat(done)}${".".repeat(WIDTH - done)}] ${percent} %`);
    },
    end: () => showStatus(""),
  };
}
