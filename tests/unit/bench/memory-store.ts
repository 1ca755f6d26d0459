import type { HeldAttempt, NewAttempt } from "@/components/bench/queue/held-attempt";
import { freshly, type QueueStore } from "@/components/bench/queue/queue-store";

/** The device's store as a list, shared by the "tabs" of a test. */
export function memoryStore(): QueueStore & { rows: () => HeldAttempt[] } {
  const rows = new Map<number, HeldAttempt>();
  let order = 0;
  const all = () => [...rows.values()].sort((a, b) => a.order - b.order);
  return {
    rows: all,
    all: async () => structuredClone(all()),
    add: async (attempt) => {
      const row = { ...freshly(attempt), order: ++order };
      rows.set(row.order, row);
      return row;
    },
    put: async (attempt) => {
      if (rows.has(attempt.order)) rows.set(attempt.order, structuredClone(attempt));
    },
    remove: async (id) => {
      for (const row of all()) if (row.body.id === id) rows.delete(row.order);
    },
  };
}

/** Tabs of one device take turns, as navigator.locks makes them. */
export function turnstile() {
  let last: Promise<unknown> = Promise.resolve();
  return <T>(work: () => Promise<T>): Promise<T> => {
    const mine = last.then(work, work);
    last = mine.catch(() => undefined);
    return mine;
  };
}

export function attemptOf(id: string, checkId: string, userId = "mo"): NewAttempt {
  return {
    userId,
    project: "tide-computer",
    serial: "SIN-01",
    checkTitle: "5 V rail",
    foreseen: "conforms",
    summary: "4.983 V",
    body: {
      id,
      checkId,
      performedAt: "2026-02-03T19:40:00.000Z",
      record: { typed: "4.983" },
      note: "",
      instrumentId: null,
      attachmentIds: [],
      seenArrival: 0,
    },
    files: [],
  };
}
