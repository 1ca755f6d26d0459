"use client";

import { useEffect, useRef } from "react";

/** Control and S saves, wherever on the page one is; what is being typed counts, too. */
export function useSaveKey(save: () => void, isOn: boolean): void {
  const latest = useRef(save);
  useEffect(() => {
    latest.current = save;
  });
  useEffect(() => {
    if (!isOn) return;
    function onKey(event: KeyboardEvent) {
      if (event.key.toLowerCase() !== "s" || !(event.ctrlKey || event.metaKey) || event.altKey || event.shiftKey)
        return;
      event.preventDefault();
      const field = document.activeElement;
      // Leaving the field puts its text into the cell; the save comes after that.
      if (field instanceof HTMLInputElement && field.closest("[role=grid]")) field.blur();
      setTimeout(() => latest.current(), 0);
    }
    window.addEventListener("keydown", onKey, true);
    return () => window.removeEventListener("keydown", onKey, true);
  }, [isOn]);
}
