import { describe, expect, it } from "vitest";
import { performedAt } from "@/lib/attempt/performed-at";
import { mayVoid } from "@/lib/attempt/void-window";

const now = new Date("2026-02-03T19:40:00Z");
const after = (seconds: number) => new Date(now.getTime() + seconds * 1000);

describe("when an attempt was carried out", () => {
  it("is what the device says, up to five minutes ahead of the server", () => {
    expect(performedAt(after(-86_400), now)).toEqual({ at: after(-86_400) });
    expect(performedAt(after(300), now)).toEqual({ at: after(300) });
  });

  it("is the server's time when the device is further ahead, and what it said is kept in words", () => {
    const found = performedAt(after(301), now);
    expect(found.at).toEqual(now);
    expect(found.sentence).toContain("2026-02-03T19:45:01.000Z");
  });
});

describe("a builder's own slip", () => {
  it("can be voided for ten minutes", () => {
    expect(mayVoid({ isOwn: true, recordedAt: after(-600) }, now)).toBe(true);
    expect(mayVoid({ isOwn: true, recordedAt: after(-601) }, now)).toBe(false);
    expect(mayVoid({ isOwn: false, recordedAt: now }, now)).toBe(false);
  });
});
