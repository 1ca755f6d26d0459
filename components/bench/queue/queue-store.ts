import type { HeldAttempt, NewAttempt } from "./held-attempt";

/** Where held attempts lie: IndexedDB on the bench, a list in tests. All are in the order they were made. */
export type QueueStore = {
  all: () => Promise<HeldAttempt[]>;
  add: (attempt: NewAttempt) => Promise<HeldAttempt>;
  put: (attempt: HeldAttempt) => Promise<void>;
  remove: (id: string) => Promise<void>;
};

/** An attempt as it is first laid down. */
export function freshly(attempt: NewAttempt): Omit<HeldAttempt, "order"> {
  return { ...attempt, tries: 0, notBefore: 0, trouble: null };
}
