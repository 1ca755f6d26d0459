import { describe, expect, it } from "vitest";
import { createQueue, type Surroundings } from "@/components/bench/queue/attempt-queue";
import type { HeldAttempt } from "@/components/bench/queue/held-attempt";
import type { Outcome } from "@/components/bench/queue/send-attempt";
import { attemptOf, memoryStore, turnstile } from "./memory-store";

const accepted: Outcome = { kind: "accepted", answer: null };
const noNetwork: Outcome = { kind: "later", sentence: "No network." };

/** A device with a clock of its own; `answers` decides what the server says to each attempt. */
function device(answers: (attempt: HeldAttempt, nth: number) => Outcome | Promise<Outcome>) {
  const store = memoryStore();
  const exclusively = turnstile();
  const sent: string[] = [];
  const timers: { work: () => void; at: number }[] = [];
  let now = 0;
  const around: Surroundings = {
    store,
    exclusively,
    now: () => now,
    tellOthers: () => undefined,
    send: async (attempt) => {
      sent.push(attempt.body.id);
      return answers(attempt, sent.length);
    },
    later: (work, ms) => {
      const timer = { work, at: now + ms };
      timers.push(timer);
      return () => void timers.splice(timers.indexOf(timer), 1);
    },
  };
  return {
    store,
    sent,
    timers,
    tab: (userId = "mo") => createQueue(userId, around),
    pass: (ms: number) => {
      now += ms;
    },
  };
}

describe("the queue of the bench", () => {
  it("sends attempts in the order in which they were made, each once", async () => {
    const shed = device(() => accepted);
    const tab = shed.tab();
    for (const id of ["a", "b", "c"]) await shed.store.add(attemptOf(id, `check-${id}`));
    await tab.run();
    expect(shed.sent).toEqual(["a", "b", "c"]);
    expect(tab.state().held).toEqual([]);
  });

  it("does not send one twice when two tabs empty the same queue at once", async () => {
    const shed = device(async () => {
      await Promise.resolve();
      return accepted;
    });
    for (const id of ["a", "b", "c", "d"]) await shed.store.add(attemptOf(id, `check-${id}`));
    await Promise.all([shed.tab().run(), shed.tab().run()]);
    expect(shed.sent).toEqual(["a", "b", "c", "d"]);
  });

  it("keeps everything while there is no network and sends the same ids when it is back", async () => {
    let online = false;
    const shed = device(() => (online ? accepted : noNetwork));
    const tab = shed.tab();
    await shed.store.add(attemptOf("a", "one"));
    await shed.store.add(attemptOf("b", "two"));
    await tab.run();
    expect(tab.state().held.map((held) => held.body.id)).toEqual(["a", "b"]);
    online = true;
    await tab.runNow();
    expect(shed.sent).toEqual(["a", "a", "b"]);
    expect(tab.state().held).toEqual([]);
  });

  it("waits longer after every failed try and never asks before the time is up", async () => {
    const shed = device(() => noNetwork);
    const tab = shed.tab();
    await shed.store.add(attemptOf("a", "one"));
    const waits: number[] = [];
    for (let round = 0; round < 4; round += 1) {
      await tab.run();
      const wait = shed.timers.at(-1)?.at ?? 0;
      const before = shed.sent.length;
      await tab.run();
      expect(shed.sent.length).toBe(before);
      waits.push(wait);
      shed.pass(60_000);
    }
    expect(shed.sent).toHaveLength(4);
    const [first = 0, second = 0, third = 0] = waits.map((wait, round) => wait - round * 60_000);
    expect(first).toBeGreaterThan(0);
    expect(second).toBeGreaterThan(first);
    expect(third).toBeGreaterThan(second);
  });

  it("keeps what the server refused, with its sentence, and goes on with the other checks", async () => {
    const shed = device((attempt) =>
      attempt.body.id === "a"
        ? { kind: "refused", sentence: "Hold point 3 is not passed.", fields: { record: "Look again." } }
        : accepted,
    );
    const tab = shed.tab();
    await shed.store.add(attemptOf("a", "one"));
    await shed.store.add(attemptOf("b", "two"));
    const refused: string[] = [];
    tab.listen((event) => event.kind === "refused" && refused.push(event.attempt.body.id));
    await tab.run();
    expect(shed.sent).toEqual(["a", "b"]);
    expect(refused).toEqual(["a"]);
    expect(tab.state().held).toMatchObject([
      {
        body: { id: "a" },
        trouble: { kind: "refused", sentence: "Hold point 3 is not passed.", fields: { record: "Look again." } },
      },
    ]);
  });

  it("never lets a later attempt of the same check overtake one that was refused", async () => {
    const shed = device((attempt) => (attempt.body.id === "a" ? { kind: "refused", sentence: "No." } : accepted));
    const tab = shed.tab();
    await shed.store.add(attemptOf("a", "one"));
    await shed.store.add(attemptOf("b", "one"));
    await tab.run();
    expect(shed.sent).toEqual(["a"]);
    await tab.withdraw("a");
    await tab.run();
    expect(shed.sent).toEqual(["a", "b"]);
  });

  it("sends a refused attempt again when the person says so", async () => {
    const shed = device((_, nth) => (nth === 1 ? { kind: "refused", sentence: "No." } : accepted));
    const tab = shed.tab();
    await shed.store.add(attemptOf("a", "one"));
    await tab.run();
    const [refused] = tab.state().held;
    if (!refused) throw new Error("it was dropped");
    await tab.retry(refused);
    expect(shed.sent).toEqual(["a", "a"]);
    expect(tab.state().held).toEqual([]);
  });

  it("says that one is signed out, keeps everything, and asks nothing more until told", async () => {
    const shed = device(() => ({ kind: "signed-out", sentence: "You are signed out." }));
    const tab = shed.tab();
    await shed.store.add(attemptOf("a", "one"));
    await shed.store.add(attemptOf("b", "two"));
    await tab.run();
    expect(tab.state().signedOut).toBe(true);
    expect(tab.state().held).toHaveLength(2);
    expect(shed.sent).toEqual(["a"]);
    expect(shed.timers).toEqual([]);
  });

  it("neither shows nor sends what another person made on the same device", async () => {
    const shed = device(() => accepted);
    await shed.store.add(attemptOf("a", "one", "ines"));
    const tab = shed.tab("mo");
    await tab.run();
    expect(shed.sent).toEqual([]);
    expect(tab.state().held).toEqual([]);
    expect(shed.store.rows()).toHaveLength(1);
  });

  it("takes an attempt back only while it has not gone", async () => {
    const shed = device(() => noNetwork);
    const tab = shed.tab();
    await tab.add(attemptOf("a", "one"));
    expect(await tab.withdraw("a")).toBe(true);
    expect(await tab.withdraw("a")).toBe(false);
    expect(tab.state().held).toEqual([]);
  });

  it("does not bring a discarded attempt back when its sending ends later", async () => {
    let answer: (outcome: Outcome) => void = () => undefined;
    const shed = device(() => new Promise((resolve) => (answer = resolve)));
    const tab = shed.tab();
    await shed.store.add(attemptOf("a", "one"));
    const running = tab.run();
    await expect.poll(() => shed.sent).toEqual(["a"]);
    await shed.store.remove("a");
    answer(noNetwork);
    await running;
    expect(shed.store.rows()).toEqual([]);
  });
});
