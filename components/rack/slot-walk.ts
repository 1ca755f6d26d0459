"use client";

import { useState, type KeyboardEvent } from "react";

const FORWARD = new Set(["ArrowDown", "ArrowRight"]);
const BACK = new Set(["ArrowUp", "ArrowLeft"]);

/**
 * One tab stop for the whole rack; arrows walk from slot to slot, Home and End go to the outermost. Works in the
 * drawing's own order, so it holds for a tower and for a rack.
 */
export function useSlotWalk(count: number, first = 0) {
  const [current, setCurrent] = useState(first);
  const shown = Math.min(current, Math.max(count - 1, 0));

  function onKeyDown(event: KeyboardEvent<HTMLElement>) {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    const next = FORWARD.has(event.key)
      ? Math.min(shown + 1, count - 1)
      : BACK.has(event.key)
        ? Math.max(shown - 1, 0)
        : event.key === "Home"
          ? 0
          : event.key === "End"
            ? count - 1
            : undefined;
    if (next === undefined) return;
    event.preventDefault();
    setCurrent(next);
    event.currentTarget.querySelector<HTMLElement>(`[data-walk="${next}"]`)?.focus();
  }

  const stop = (index: number) => ({
    "data-walk": index,
    tabIndex: index === shown ? 0 : -1,
    onFocus: () => setCurrent(index),
  });
  return { onKeyDown, stop };
}
