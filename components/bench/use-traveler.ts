import { useCallback, useEffect, useRef, useState } from "react";
import type { TravelerView } from "@/lib/traveler/traveler-view";

const QUIET_MS = 250;

function isTraveler(value: unknown): value is TravelerView {
  return (
    typeof value === "object" && value !== null && "checks" in value && "unit" in value && Array.isArray(value.checks)
  );
}

/**
 * The traveler as the server last gave it. Asked for again after something arrived, when the page is looked at again,
 * and once at the start, because a page that was opened without network may be old. Failing leaves what is there.
 */
export function useTraveler(project: string, initial: TravelerView) {
  const [traveler, setTraveler] = useState(initial);
  const serial = initial.unit.serial;
  const running = useRef<AbortController | undefined>(undefined);
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);

  const refresh = useCallback(() => {
    clearTimeout(timer.current);
    timer.current = setTimeout(async () => {
      running.current?.abort();
      const mine = new AbortController();
      running.current = mine;
      try {
        const address = `/api/projects/${encodeURIComponent(project)}/units/${encodeURIComponent(serial)}/traveler`;
        const response = await fetch(address, { signal: mine.signal, headers: { accept: "application/json" } });
        if (!response.ok) return;
        const fresh: unknown = await response.json();
        if (isTraveler(fresh)) setTraveler(fresh);
      } catch {
        // No network, or a newer question took over: the picture stays.
      }
    }, QUIET_MS);
  }, [project, serial]);

  useEffect(() => {
    refresh();
    const seen = () => document.visibilityState === "visible" && refresh();
    document.addEventListener("visibilitychange", seen);
    addEventListener("online", refresh);
    return () => {
      clearTimeout(timer.current);
      running.current?.abort();
      document.removeEventListener("visibilitychange", seen);
      removeEventListener("online", refresh);
    };
  }, [refresh]);

  return { traveler, refresh };
}
