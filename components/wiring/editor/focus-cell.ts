import type { RefObject } from "react";

/** Gives a cell the keyboard once it is drawn, from wherever the focus is now. */
export function focusCell(scroller: RefObject<HTMLDivElement | null>, row: number, place: number): void {
  requestAnimationFrame(() => {
    const table = scroller.current;
    if (table?.offsetParent === null) {
      // On a phone the pins are a list.
      document.querySelector<HTMLElement>(`[data-list-row="${row}"]`)?.focus();
      return;
    }
    const cell = table?.querySelector<HTMLElement>(`[data-row="${row}"][data-place="${place}"]`);
    if (!table || !cell) return;
    table.dataset.held = "true";
    cell.focus({ preventScroll: true });
    cell.scrollIntoView({ block: "nearest", inline: "nearest" });
  });
}
