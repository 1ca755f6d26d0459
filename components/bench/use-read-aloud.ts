import { useEffect, useSyncExternalStore } from "react";
import { canReadAloud, readAloud, readsAloud, setReadsAloud, stopReading } from "./read-aloud";

const watchers = new Set<() => void>();
const watch = (changed: () => void) => {
  watchers.add(changed);
  return () => void watchers.delete(changed);
};

/** Speaks the text whenever it changes, if the person switched it on. Off by default. */
export function useReadAloud(text: string) {
  const on = useSyncExternalStore(watch, readsAloud, () => false);
  const possible = useSyncExternalStore(
    () => () => undefined,
    canReadAloud,
    () => false,
  );

  useEffect(() => {
    if (on && text) readAloud(text);
    return stopReading;
  }, [on, text]);

  const toggle = () => {
    setReadsAloud(!on);
    for (const changed of watchers) changed();
  };
  return { on, possible, toggle };
}
