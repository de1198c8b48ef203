import { type Signal, useSignal } from "@preact/signals";
import type { RefObject } from "preact";
import { useEffect } from "preact/hooks";
import type { Size } from "../charts/layout/index.ts";

/** The inner size of an element, kept up to date; zero until it is on the page. */
export function useElementSize(element: RefObject<HTMLElement>): Signal<Size> {
  const size = useSignal<Size>({ widthPx: 0, heightPx: 0 });
  useEffect(() => {
    const watched = element.current!;
    const observer = new ResizeObserver(() => {
      size.value = { widthPx: watched.clientWidth, heightPx: watched.clientHeight };
    });
    observer.observe(watched);
    return () => observer.disconnect();
  }, [element, size]);
  return size;
}
