"use client";

import { useLayoutEffect, type FocusEvent, type RefObject } from "react";
import type { Place } from "../grid/selection";

/**
 * One cell of all takes the keyboard, and takes it along when one moves. A field that goes away takes the focus with it
 * and leaves nothing in its place: then the table still holds the keyboard.
 */
export function useGridFocus(scroller: RefObject<HTMLDivElement | null>, { row, column }: Place, isTyping: boolean) {
  function hold(isHeld: boolean) {
    scroller.current?.setAttribute("data-held", String(isHeld));
  }

  useLayoutEffect(() => {
    const table = scroller.current;
    const cell = table?.querySelector<HTMLElement>(`[data-row="${row}"][data-place="${column}"]`);
    const focused = document.activeElement;
    if (!table || !cell || table.dataset.held !== "true") return;
    if (focused !== document.body && !table.contains(focused)) return;
    if (!isTyping) cell.focus({ preventScroll: true });
    cell.scrollIntoView({ block: "nearest", inline: "nearest" });
  }, [row, column, isTyping, scroller]);

  return {
    hold: () => hold(true),
    onFocus: () => hold(true),
    onBlur({ relatedTarget, currentTarget }: FocusEvent) {
      if (relatedTarget !== null && !currentTarget.contains(relatedTarget)) hold(false);
    },
  };
}
