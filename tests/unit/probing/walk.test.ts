import { describe, expect, it } from "vitest";
import { HALVES, nextOpen, placeOf, walkOf } from "@/components/probing/bench/walk";

const probesOf = (count: number, half: (typeof HALVES)[number]) => {
  const { length, at } = walkOf(count, half);
  return Array.from({ length }, (_, place) => at(place));
};

describe("Walking the probes of a round", () => {
  it("two people on different halves make every probe once, each from an end", () => {
    expect(probesOf(5, "first")).toEqual([0, 1, 2]);
    expect(probesOf(5, "second")).toEqual([4, 3]);
    for (const count of [0, 1, 2, 9, 10]) {
      const both = [...probesOf(count, "first"), ...probesOf(count, "second")];
      expect(both.sort((a, b) => a - b)).toEqual(probesOf(count, "all"));
    }
  });

  it("a probe's place leads back to it, and a probe of the other half has none", () => {
    for (const half of HALVES) {
      const own = probesOf(7, half);
      for (let probe = 0; probe < 7; probe += 1) {
        const place = placeOf(7, half, probe);
        expect(place === undefined ? undefined : own[place]).toBe(own.includes(probe) ? probe : undefined);
      }
    }
  });

  it("after an answer comes the next open probe, from the beginning again at the end, and none when all are answered", () => {
    const answered = new Set([0, 2, 4]);
    const isAnswered = (probe: number) => answered.has(probe);
    expect(nextOpen(5, "all", isAnswered, -1)).toBe(1);
    expect(nextOpen(5, "all", isAnswered, 1)).toBe(3);
    expect(nextOpen(5, "all", isAnswered, 3)).toBe(1);
    expect(nextOpen(5, "second", isAnswered, -1)).toBe(3);
    expect(nextOpen(5, "all", () => true, 0)).toBeUndefined();
  });
});
