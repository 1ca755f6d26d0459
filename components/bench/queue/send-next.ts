import { backOff } from "./back-off";
import type { HeldAttempt } from "./held-attempt";
import type { QueueStore } from "./queue-store";
import type { Outcome } from "./send-attempt";

export type Step =
  /** One left the device; look again at once. */
  | { kind: "sent"; attempt: HeldAttempt; answer: unknown }
  /** One was refused and is kept for the person; look again at once. */
  | { kind: "refused"; attempt: HeldAttempt }
  /** Nothing can go before this instant (milliseconds since 1970). */
  | { kind: "later"; at: number }
  | { kind: "signed-out" }
  /** Nothing is left that could go by itself. */
  | { kind: "done" };

type Given = {
  store: QueueStore;
  userId: string;
  now: number;
  send: (attempt: HeldAttempt) => Promise<Outcome>;
  random?: number;
};

/**
 * The oldest attempt of this person that may go. One that was refused stays for the person to decide, and with it the
 * later ones of the same check, since the later attempt counts and must not overtake.
 */
export function nextToSend(all: HeldAttempt[], userId: string): HeldAttempt | undefined {
  const stuck = new Set<string>();
  for (const attempt of all) {
    if (attempt.userId !== userId || stuck.has(attempt.body.checkId)) continue;
    if (attempt.trouble?.kind !== "refused") return attempt;
    stuck.add(attempt.body.checkId);
  }
  return undefined;
}

/** One step of emptying the queue. The caller holds the lock of the device, so that two tabs never send the same one. */
export async function sendNext({ store, userId, now, send, random }: Given): Promise<Step> {
  const attempt = nextToSend(await store.all(), userId);
  if (!attempt) return { kind: "done" };
  if (attempt.notBefore > now) return { kind: "later", at: attempt.notBefore };
  const outcome = await send(attempt);
  if (outcome.kind === "accepted") {
    await store.remove(attempt.body.id);
    return { kind: "sent", attempt, answer: outcome.answer };
  }
  // Sending may have written down files that have arrived: go on from what is there now.
  const kept = (await store.all()).find((one) => one.order === attempt.order) ?? attempt;
  switch (outcome.kind) {
    case "refused": {
      const { sentence, fields } = outcome;
      const refused: HeldAttempt = { ...kept, trouble: { kind: "refused", sentence, ...(fields ? { fields } : {}) } };
      await store.put(refused);
      return { kind: "refused", attempt: refused };
    }
    case "signed-out":
      await store.put({ ...kept, trouble: { kind: "signed-out", sentence: outcome.sentence } });
      return { kind: "signed-out" };
    case "later": {
      const tries = attempt.tries + 1;
      const at = now + Math.max(outcome.afterMs ?? 0, backOff(tries, random));
      await store.put({ ...kept, tries, notBefore: at, trouble: { kind: "waiting", sentence: outcome.sentence } });
      return { kind: "later", at };
    }
  }
}
