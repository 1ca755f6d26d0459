import { useSyncExternalStore } from "react";
import type { AttemptQueue, QueueState } from "./attempt-queue";
import { browserQueue } from "./browser-queue";

const ON_THE_SERVER: QueueState = { read: false, held: [], sending: null, signedOut: false };

/** The queue of this person, created on first use in the browser. */
export function useQueue(userId: string): { queue: () => AttemptQueue; state: QueueState } {
  const state = useSyncExternalStore(
    (changed) => browserQueue(userId).watch(changed),
    () => browserQueue(userId).state(),
    () => ON_THE_SERVER,
  );
  return { queue: () => browserQueue(userId), state };
}
