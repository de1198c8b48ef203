import { effect, signal } from "@preact/signals";
import type { Layering } from "../worker/index.ts";
import { castInHand } from "./store.ts";
import { threads } from "./threads.ts";

/** The layering of the cast in hand; null while it is worked out, and where nothing can be said of it. */
export const layering = signal<Layering | null>(null);

/** Keeps the layering up to date with the cast in hand, in the background. */
export function keepLayering(): void {
  effect(() => {
    const column = castInHand.value?.solution?.column ?? null;
    layering.value = null;
    if (column === null) return;
    threads.solver.layering(column).then(
      (found) => {
        if (castInHand.peek()?.solution?.column === column) layering.value = found;
      },
      () => undefined,
    );
  });
}
