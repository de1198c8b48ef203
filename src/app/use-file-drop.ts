import { type Signal, useSignal } from "@preact/signals";
import { useEffect } from "preact/hooks";
import { readFiles } from "./reading-files.ts";

/** The whole page takes dropped files; the signal says whether some hang over it. */
export function useFileDrop(): Signal<boolean> {
  const isDropping = useSignal(false);
  useEffect(() => {
    const over = (event: DragEvent): void => {
      if (!event.dataTransfer?.types.includes("Files")) return;
      event.preventDefault();
      isDropping.value = true;
    };
    const leave = (event: DragEvent): void => {
      if (event.relatedTarget === null) isDropping.value = false;
    };
    const drop = (event: DragEvent): void => {
      if (!event.dataTransfer?.files.length) return;
      event.preventDefault();
      isDropping.value = false;
      void readFiles([...event.dataTransfer.files]);
    };
    document.addEventListener("dragover", over);
    document.addEventListener("dragleave", leave);
    document.addEventListener("drop", drop);
    return () => {
      document.removeEventListener("dragover", over);
      document.removeEventListener("dragleave", leave);
      document.removeEventListener("drop", drop);
    };
  }, [isDropping]);
  return isDropping;
}
