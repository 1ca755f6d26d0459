"use client";

import { useSyncExternalStore } from "react";

const never = () => () => undefined;

/**
 * False on the server and until the page has come alive. A form that is sent before that would be sent by the browser
 * itself, with what was typed in the address.
 */
export function useIsReady(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}
