"use client";

import { useRef, type MouseEvent, type PointerEvent } from "react";
import { at, moveTo } from "../grid/selection";
import type { usePinGrid } from "./use-pin-grid";

/** Pressing, dragging and double pressing in the table; a second touch of a cell types into it. */
export function useGridPointer(grid: ReturnType<typeof usePinGrid>, onHold: () => void) {
  const isDragging = useRef(false);
  const { selection, size } = grid;
  const { focus } = selection;

  return {
    onPointerDown(event: PointerEvent) {
      const place = event.button === 0 ? pointedAt(event) : undefined;
      if (!place) return;
      onHold();
      const isSame = place.row === focus.row && place.column === focus.column;
      if (isSame && !event.shiftKey && event.pointerType === "touch") return grid.begin(undefined);
      isDragging.current = event.pointerType === "mouse";
      grid.go(event.shiftKey ? moveTo(selection, place, size, true) : at(place.row, place.column));
    },
    onPointerMove(event: PointerEvent) {
      if (!isDragging.current || event.buttons !== 1) return;
      const place = pointedAt(event);
      if (place && (place.row !== focus.row || place.column !== focus.column)) {
        grid.go(moveTo(selection, place, size, true));
      }
    },
    onPointerUp() {
      isDragging.current = false;
    },
    onDoubleClick(event: MouseEvent) {
      if (pointedAt(event)) grid.begin(undefined);
    },
  };
}

/** The cell under the pointer; none where a field or a list lies over it. */
function pointedAt({ target }: { target: EventTarget }) {
  if (!(target instanceof Element) || target instanceof HTMLInputElement || target.closest("[role=listbox]"))
    return undefined;
  const { row, place } = target.closest<HTMLElement>("[data-place]")?.dataset ?? {};
  return row === undefined || place === undefined ? undefined : { row: Number(row), column: Number(place) };
}
