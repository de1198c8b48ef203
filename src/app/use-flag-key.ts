import { useEffect } from "preact/hooks";
import { flagRange, isFlagging } from "./store.ts";

/** Starts or ends flagging; with the end the selected range goes. */
export function toggleFlagging(): void {
  isFlagging.value = !isFlagging.value;
  flagRange.value = null;
}

/** F starts and ends flagging, wherever it does not mean a letter of some entry. */
export function useFlagKey(): void {
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent): void => {
      if (event.key.toLowerCase() !== "f" || event.ctrlKey || event.metaKey || event.altKey) return;
      if ((event.target as Element).closest?.("input, select")) return;
      toggleFlagging();
    };
    document.addEventListener("keydown", onKeyDown);
    return () => document.removeEventListener("keydown", onKeyDown);
  }, []);
}
