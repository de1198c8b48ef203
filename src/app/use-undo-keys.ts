import { useEffect } from "preact/hooks";
import { dispatch } from "./store.ts";

/** Ctrl or Cmd with Z undoes, with Shift+Z or Y redoes; a text field keeps these keys for its own text. */
export function useUndoKeys(): void {
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent): void => {
      const key = event.key.toLowerCase();
      if (!(event.ctrlKey || event.metaKey) || event.altKey || (key !== "z" && key !== "y")) return;
      if (event.target instanceof HTMLInputElement && event.target.type === "text") return;
      event.preventDefault();
      dispatch({ kind: key === "y" || event.shiftKey ? "redone" : "undone" });
    };
    document.addEventListener("keydown", onKeyDown);
    return () => document.removeEventListener("keydown", onKeyDown);
  }, []);
}
