import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { nearestValue, nextDown, nextUp, SERIES_NAMES, valuesBetween } from "@/lib/calc/preferred-values";

const series = fc.constantFrom(...SERIES_NAMES);
const value = fc.double({ min: 1e-14, max: 1e14, noNaN: true });
/** Noise of computing that is taken off before comparing. */
const NOISE = 1e-11;

function found(answer: ReturnType<typeof nextUp>): number {
  if (!answer.ok) throw new Error(answer.message);
  return answer.value;
}

describe("a value of a series", () => {
  it("is never below the wanted one when taken upwards, never above it when taken downwards", () => {
    fc.assert(
      fc.property(series, value, (name, wanted) => {
        expect(found(nextUp(name, wanted))).toBeGreaterThanOrEqual(wanted * (1 - NOISE));
        expect(found(nextDown(name, wanted))).toBeLessThanOrEqual(wanted * (1 + NOISE));
      }),
    );
  });

  it("is the nearer of the two neighbours by ratio", () => {
    fc.assert(
      fc.property(series, value, (name, wanted) => {
        const [down, up, nearest] = [nextDown(name, wanted), nextUp(name, wanted), nearestValue(name, wanted)].map(
          found,
        );
        const away = (other = 0) => Math.abs(Math.log(other / wanted));
        expect([down, up]).toContain(nearest);
        expect(away(nearest)).toBeLessThanOrEqual(Math.min(away(down), away(up)) + NOISE);
      }),
    );
  });

  it("stays as it is when looked up again, in every decade", () => {
    fc.assert(
      fc.property(series, value, (name, wanted) => {
        const once = found(nearestValue(name, wanted));
        expect(found(nearestValue(name, once))).toBe(once);
        expect(found(nextUp(name, once))).toBe(once);
        expect(found(nextDown(name, once))).toBe(once);
        expect(valuesBetween(name, once, once)).toEqual([once]);
      }),
    );
  });

  it("is written as one types it: 0.47, not 0.47000000000000003", () => {
    expect(found(nearestValue("E24", 0.1 + 0.37))).toBe(0.47);
    expect(found(nextUp("E24", 0.1 + 0.2))).toBe(0.3);
    expect(found(nearestValue("E24", 4.7e-9))).toBe(4.7e-9);
  });

  it("between two limits is every one that upward steps meet", () => {
    fc.assert(
      fc.property(series, fc.integer({ min: 1, max: 1_000_000 }), (name, low) => {
        const high = low * 30;
        const stepped = [];
        for (let at = found(nextUp(name, low)); at <= high; at = found(nextUp(name, at * 1.0001))) stepped.push(at);
        expect(valuesBetween(name, low, high)).toEqual(stepped);
      }),
    );
  });
});

describe("no value", () => {
  it.each([
    [0, "The value must be more than 0."],
    [-4700, "The value must be more than 0."],
    [Number.NaN, "The value is no number."],
    [Infinity, "The value is no number."],
    [1e300, "The value lies outside what parts are made for."],
  ])("is there for %d", (wanted, message) => {
    for (const look of [nearestValue, nextUp, nextDown]) {
      expect(look("E24", wanted)).toEqual({ ok: false, field: "value", message });
    }
  });

  it("lies between limits that are crossed, zero or no numbers", () => {
    expect(valuesBetween("E24", 2000, 1000)).toEqual([]);
    expect(valuesBetween("E24", 0, 1000)).toEqual([]);
    expect(valuesBetween("E24", Number.NaN, 1000)).toEqual([]);
    expect(valuesBetween("E24", 1010, 1090)).toEqual([]);
  });
});
