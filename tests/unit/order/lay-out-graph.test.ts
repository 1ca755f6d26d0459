import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { layOutGraph } from "@/lib/order/lay-out-graph";

const box = (id: string) => ({ id, width: 100, height: 40 });

const graphs = fc.integer({ min: 1, max: 12 }).chain((size) =>
  fc.uniqueArray(fc.tuple(fc.nat(size - 1), fc.nat(size - 1)), { maxLength: 24, selector: String }).map((pairs) => ({
    boxes: Array.from({ length: size }, (_, index) => box(`B${index}`)),
    lines: pairs.filter(([from, to]) => from !== to).map(([from, to]) => ({ from: `B${from}`, to: `B${to}` })),
  })),
);

describe("the drawing of an order", () => {
  it("runs from left to right along what comes first", () => {
    const { boxes } = layOutGraph(
      [box("A"), box("B"), box("C")],
      [
        { from: "A", to: "B" },
        { from: "B", to: "C" },
      ],
    );
    const xs = boxes.map(({ x }) => x);
    expect(xs).toEqual([...xs].sort((a, b) => a - b));
    expect(new Set(xs).size).toBe(3);
  });

  it("lets a line back run beside the one forth without turning the order round", () => {
    const { boxes, lines } = layOutGraph(
      [box("B"), box("A")],
      [
        { from: "B", to: "A", back: true },
        { from: "A", to: "B" },
      ],
    );
    const [b, a] = boxes;
    expect(a?.x).toBeLessThan(b?.x ?? 0);
    const startOf = (path: string) => Number(/^M(-?[\d.]+)/.exec(path)?.[1]);
    const [back, forth] = lines.map(({ path }) => startOf(path));
    expect(back).toBeGreaterThan(forth ?? Infinity);
  });

  it("lays no box over another, keeps all inside, and draws every line, also where they go in a circle", () => {
    fc.assert(
      fc.property(graphs, ({ boxes, lines }) => {
        const drawn = layOutGraph(boxes, lines);
        expect(drawn.lines).toHaveLength(lines.length);
        for (const { path } of drawn.lines) expect(path).toMatch(/^M-?[\d.]+ -?[\d.]+[QL]/);
        for (const one of drawn.boxes) {
          expect(one.x).toBeGreaterThanOrEqual(0);
          expect(one.y + one.height).toBeLessThanOrEqual(drawn.height);
          for (const other of drawn.boxes) {
            if (one.id === other.id) continue;
            const isApart =
              one.x + one.width <= other.x ||
              other.x + other.width <= one.x ||
              one.y + one.height <= other.y ||
              other.y + other.height <= one.y;
            expect(isApart).toBe(true);
          }
        }
      }),
      { numRuns: 60 },
    );
  });

  it("of nothing is nothing", () => {
    expect(layOutGraph([], [])).toEqual({ width: 0, height: 0, boxes: [], lines: [] });
  });
});
