"use client";

import { useCallback, useSyncExternalStore } from "react";

/** Whether the media query holds; false on the server and until the page has come alive. */
export function useMedia(query: string): boolean {
  const subscribe = useCallback(
    (tell: () => void) => {
      const media = matchMedia(query);
      media.addEventListener("change", tell);
      return () => media.removeEventListener("change", tell);
    },
    [query],
  );
  return useSyncExternalStore(
    subscribe,
    () => matchMedia(query).matches,
    () => false,
  );
}
