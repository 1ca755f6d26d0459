import { useEffect, useRef } from "react";
import { benchKey, type BenchKey } from "./key-map";

/** Listens for the keys of the bench; an open dialog has the keyboard to itself, except ? which shuts the keys again. */
export function useBenchKeys(act: (key: BenchKey) => void) {
  const latest = useRef(act);
  useEffect(() => {
    latest.current = act;
  });
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      const target = event.target instanceof HTMLElement ? event.target : null;
      const input = target instanceof HTMLInputElement ? { type: target.type } : {};
      const key = benchKey({
        key: event.key,
        ctrlKey: event.ctrlKey,
        metaKey: event.metaKey,
        altKey: event.altKey,
        repeat: event.repeat,
        isComposing: event.isComposing,
        target: target && { tagName: target.tagName, isContentEditable: target.isContentEditable, ...input },
      });
      if (!key || (document.querySelector("dialog[open]") && key !== "keys")) return;
      event.preventDefault();
      latest.current(key);
    };
    addEventListener("keydown", onKeyDown);
    return () => removeEventListener("keydown", onKeyDown);
  }, []);
}
