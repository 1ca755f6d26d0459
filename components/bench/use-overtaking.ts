import { useEffect, useState } from "react";
import type { CheckView } from "@/lib/traveler/traveler-view";
import { overtakenSince, type OwnAttempt } from "./overtaken-by";

/** For so long after recording, somebody else's attempt counts as made at the same time. */
const AT_ONCE_MS = 120_000;
const LOOK_EVERY_MS = 5_000;

/**
 * Whether somebody recorded a check just after this person did. The later one is told by the server's answer; the
 * earlier one learns it from the traveler, which is asked for again for two minutes.
 */
export function useOvertaking(checks: readonly CheckView[], viewerId: string, refresh: () => void) {
  const [own, setOwn] = useState<readonly OwnAttempt[]>([]);

  useEffect(() => {
    if (own.length === 0) return;
    const timer = setInterval(() => {
      const recent = own.filter(({ at }) => Date.now() - at < AT_ONCE_MS);
      if (recent.length < own.length) setOwn(recent);
      if (document.visibilityState === "visible") refresh();
    }, LOOK_EVERY_MS);
    return () => clearInterval(timer);
  }, [own, refresh]);

  return {
    sentence: overtakenSince(checks, own, viewerId),
    arrived: (attempt: OwnAttempt) => setOwn((before) => [...before, attempt]),
    dismiss: () => setOwn([]),
  };
}
