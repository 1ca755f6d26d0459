import fc from "fast-check";
import { expect, test } from "vitest";
import { route } from "@/lib/calc/continuity/route";

const places = (list: readonly (readonly [number, number])[]) => {
  const [x, y] = [Float64Array.from(list, ([one]) => one), Float64Array.from(list, ([, other]) => other)];
  return { startX: x, startY: y, endX: x, endY: y };
};

const place = fc.tuple(fc.integer({ min: -50, max: 50 }), fc.integer({ min: -50, max: 50 }));

test("no way is lost and none is gone twice, whether few or many, spread or all on one spot", () => {
  const some = fc.oneof(
    fc.array(place, { maxLength: 120 }),
    fc.tuple(place, fc.nat(60)).map(([one, count]) => Array.from({ length: count }, () => one)),
    fc.array(fc.tuple(fc.integer({ min: 0, max: 9 }), fc.constant(0)), { maxLength: 90 }),
    fc.array(fc.tuple(fc.constantFrom(0, 1, 90_000), fc.nat(3)), { maxLength: 90 }),
  );
  fc.assert(
    fc.property(some, some, (starts, ends) => {
      const count = Math.min(starts.length, ends.length);
      const [from, to] = [places(starts.slice(0, count)), places(ends.slice(0, count))];
      const { order } = route({ startX: from.startX, startY: from.startY, endX: to.startX, endY: to.startY });
      expect([...order].sort((a, b) => a - b)).toEqual(Array.from({ length: count }, (_, at) => at));
      expect([...route(from).order].sort((a, b) => a - b)).toEqual(Array.from({ length: count }, (_, at) => at));
    }),
    { numRuns: 300 },
  );
});

test("on a grid of 40 × 40 places the way is at most a tenth longer than the shortest one", () => {
  const shuffled = Array.from({ length: 1600 }, (_, at): [number, number] => [
    (at * 611) % 40,
    Math.floor(((at * 611) % 1600) / 40),
  ]);
  const { order } = route(places(shuffled));
  let length = 0;
  for (let at = 1; at < order.length; at += 1) {
    const [x, y] = shuffled[order[at] ?? 0] ?? [0, 0];
    const [fromX, fromY] = shuffled[order[at - 1] ?? 0] ?? [0, 0];
    length += Math.hypot(x - fromX, y - fromY);
  }
  expect(length).toBeGreaterThanOrEqual(1599);
  expect(length).toBeLessThan(1599 * 1.1);
});

test("a way with two ends is entered by the nearer one and left by the other", () => {
  const { order, isTurned } = route({
    startX: Float64Array.of(0, 20, 21),
    startY: Float64Array.of(0, 0, 0),
    endX: Float64Array.of(10, 11, 30),
    endY: Float64Array.of(0, 0, 0),
  });
  expect([...order]).toEqual([0, 1, 2]);
  expect([...isTurned]).toEqual([0, 1, 0]);
});
