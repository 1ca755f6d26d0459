import { useEffect } from "react";
import { isTyping } from "@/components/ui/is-typing";

const STEPS: Record<string, 1 | -1> = { j: 1, ArrowDown: 1, k: -1, ArrowUp: -1 };

/** j and k, or the arrows on a row, go from check to check and open it. */
export function useRowWalk(ids: readonly string[], openId: string | undefined, open: (id: string) => void) {
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      const step = STEPS[event.key];
      if (!step || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return;
      const onRow = event.target instanceof HTMLElement && event.target.closest("[data-check-row]") !== null;
      // Arrows scroll the page unless a row has the focus.
      if (event.key.startsWith("Arrow") && !onRow) return;
      const at = openId ? ids.indexOf(openId) : -1;
      const next = ids[at < 0 ? (step > 0 ? 0 : ids.length - 1) : at + step];
      if (!next) return;
      event.preventDefault();
      open(next);
      document.querySelector<HTMLElement>(`#check-${CSS.escape(next)} [data-check-row]`)?.focus();
    };
    addEventListener("keydown", onKeyDown);
    return () => removeEventListener("keydown", onKeyDown);
  }, [ids, openId, open]);
}
