import type { HeldAttempt, NewAttempt } from "./held-attempt";
import type { QueueStore } from "./queue-store";
import type { Outcome } from "./send-attempt";
import { sendNext } from "./send-next";

export type QueueState = {
  /** False until the device's store has been read. */
  read: boolean;
  /** This person's attempts on this device, oldest first, over all units. */
  held: HeldAttempt[];
  /** Id of the attempt that is on its way just now. */
  sending: string | null;
  signedOut: boolean;
};

export type QueueEvent =
  { kind: "sent"; attempt: HeldAttempt; answer: unknown } | { kind: "refused"; attempt: HeldAttempt };

/** What the browser gives and a test replaces. */
export type Surroundings = {
  store: QueueStore;
  send: (attempt: HeldAttempt) => Promise<Outcome>;
  now: () => number;
  /** Runs `work` while no other tab of this device does. */
  exclusively: <T>(work: () => Promise<T>) => Promise<T>;
  /** Calls back after so many milliseconds; returns how to cancel. */
  later: (work: () => void, ms: number) => () => void;
  /** Tells the other tabs that the store changed. */
  tellOthers: () => void;
};

export type AttemptQueue = ReturnType<typeof createQueue>;

/**
 * The outgoing queue of one person on this device: laid down first, then sent in order, each once. One attempt is sent
 * per turn of the lock, so another tab may send the next one, and taking one back never races with sending it.
 */
export function createQueue(userId: string, around: Surroundings) {
  let state: QueueState = { read: false, held: [], sending: null, signedOut: false };
  let running = false;
  let again = false;
  let cancelTimer: (() => void) | undefined;
  const watchers = new Set<() => void>();
  const listeners = new Set<(event: QueueEvent) => void>();

  function show(next: Partial<QueueState>) {
    state = { ...state, ...next };
    for (const watch of watchers) watch();
  }

  async function look() {
    const all = await around.store.all();
    const held = all.filter((attempt) => attempt.userId === userId);
    show({ read: true, held, signedOut: held.some((attempt) => attempt.trouble?.kind === "signed-out") });
  }

  const send = async (attempt: HeldAttempt) => {
    show({ sending: attempt.body.id });
    return around.send(attempt);
  };

  async function turn() {
    const step = await around.exclusively(() => sendNext({ store: around.store, userId, now: around.now(), send }));
    show({ sending: null });
    await look();
    if (step.kind !== "done") around.tellOthers();
    if (step.kind === "sent" || step.kind === "refused") for (const listen of listeners) listen(step);
    return step;
  }

  /** Sends what may go, until nothing may. Calls while it runs make it look once more. */
  async function run() {
    if (running) {
      again = true;
      return;
    }
    running = true;
    cancelTimer?.();
    try {
      for (;;) {
        again = false;
        const step = await turn();
        if (step.kind === "sent" || step.kind === "refused" || again) continue;
        if (step.kind === "later") cancelTimer = around.later(() => void run(), Math.max(0, step.at - around.now()));
        return;
      }
    } finally {
      running = false;
      show({ sending: null });
    }
  }

  async function change(attempt: HeldAttempt) {
    await around.store.put(attempt);
    await look();
    around.tellOthers();
  }

  return {
    state: () => state,
    watch: (watch: () => void) => {
      watchers.add(watch);
      return () => void watchers.delete(watch);
    },
    /** Called for each attempt that the server took or refused. */
    listen: (listen: (event: QueueEvent) => void) => {
      listeners.add(listen);
      return () => void listeners.delete(listen);
    },
    look,
    run,
    /** Lays the attempt down on the device. When this returns it is safe; sending begins by itself. */
    async add(attempt: NewAttempt) {
      await around.store.add(attempt);
      await look();
      around.tellOthers();
      void run();
    },
    /** Try now: the network is back, or the person asks. */
    async runNow() {
      await around.exclusively(async () => {
        for (const attempt of await around.store.all()) {
          if (attempt.userId === userId && attempt.notBefore > 0) await around.store.put({ ...attempt, notBefore: 0 });
        }
      });
      await run();
    },
    /** Takes an attempt back if it has not gone: true when the server will never see it. */
    async withdraw(id: string) {
      const taken = await around.exclusively(async () => {
        const there = (await around.store.all()).some((attempt) => attempt.body.id === id);
        if (there) await around.store.remove(id);
        return there;
      });
      await look();
      around.tellOthers();
      if (taken) void run();
      return taken;
    },
    /** Sends a refused attempt again as it is, e.g. after the hold point in its way was passed. */
    async retry(attempt: HeldAttempt) {
      await change({ ...attempt, trouble: null, notBefore: 0 });
      await run();
    },
  };
}
