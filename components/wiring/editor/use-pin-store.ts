"use client";

import { useEffect, useState, useSyncExternalStore } from "react";
import type { ShelfOf } from "../draft/draft-shelf";
import type { KeptMap } from "../draft/pin-drafts";
import { createPinStore } from "../draft/pin-store";

/** The pins that are kept and what was typed over them; the page loaded anew brings what others saved meanwhile. */
export function usePinStore(kept: KeptMap, shelf: ShelfOf) {
  const [store] = useState(() => createPinStore(kept, shelf));
  const state = useSyncExternalStore(store.subscribe, store.read, store.readOnServer);
  useEffect(() => {
    store.receive(kept);
    store.keepOnly(Object.keys(kept));
  }, [store, kept]);
  return { store, state };
}
