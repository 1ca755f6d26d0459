import { alg, Graph } from "@dagrejs/graphlib";
import fc from "fast-check";
import { expect, test } from "vitest";
import { doubtfulAfter, REWORK_KINDS, type BoardMap, type CoveringCheck, type Rework } from "@/lib/calc/doubt";
import { covers, travelers } from "../../support/standing-checks";

const MAPS: BoardMap[] = ["SUM", "PSU"].map((board) => ({
  board,
  pins: [
    { connector: "J1", pin: "a4", signal: "PH6" },
    { connector: "J1", pin: "a5", signal: board === "SUM" ? "+5V" : "CLK" },
  ],
  parts: [{ part: "U7", signals: ["CLK"], blocks: ["adder"] }],
  aliases: [],
}));

const parts = fc.uniqueArray(fc.constantFrom("U7", "U8", "J1"), { maxLength: 2 });
const rework: fc.Arbitrary<Rework> = fc
  .record({
    unitId: fc.constantFrom("SUM-01", "PSU-01"),
    kind: fc.constantFrom(...REWORK_KINDS),
    touches: fc.tuple(covers, parts).map(([touches, some]) => ({ ...touches, parts: some })),
    neighbours: fc.subarray(["SUM-01", "SUM-02", "PSU-01"]),
  })
  .map((one) => ({ ...one, board: one.unitId.slice(0, 3) }));

const doubtful = (one: Rework, checks: readonly CoveringCheck[]) =>
  new Set(doubtfulAfter(one, checks, { maps: MAPS }).doubtful);

test("a larger rework never gives fewer doubtful checks", () => {
  fc.assert(
    fc.property(rework, rework, travelers, (small, more, checks) => {
      const both = (name: keyof Rework["touches"]) => [...small.touches[name], ...more.touches[name]];
      const large: Rework = {
        ...small,
        touches: {
          signals: both("signals"),
          pins: both("pins"),
          parts: both("parts"),
          blocks: both("blocks"),
          rails: both("rails"),
        },
        neighbours: [...small.neighbours, ...more.neighbours],
      };
      const found = doubtful(large, checks);
      for (const id of doubtful(small, checks)) expect(found).toContain(id);
    }),
  );
});

test("more checks added by hand never give fewer doubtful checks, and sparing takes away that check alone", () => {
  fc.assert(
    fc.property(rework, travelers, fc.nat(19), (one, checks, at) => {
      const before = doubtful(one, checks);
      const checkId = `c${at}`;
      const choose = (choices: { added?: string[]; spared?: string[] }) =>
        doubtfulAfter(one, checks, {
          maps: MAPS,
          choices: {
            added: (choices.added ?? []).map((id) => ({ checkId: id, reason: "because" })),
            spared: (choices.spared ?? []).map((id) => ({ checkId: id, reason: "because" })),
          },
        }).doubtful;
      const added = choose({ added: [checkId] });
      for (const id of before) expect(added).toContain(id);
      expect(new Set(choose({ spared: [checkId] }))).toEqual(new Set([...before].filter((id) => id !== checkId)));
    }),
  );
});

/** What relies on whom, told as simply as possible: every earlier hold, every prerequisite, and nothing shortened. */
function dependence(checks: readonly CoveringCheck[]): Graph {
  const graph = new Graph({ directed: true });
  for (const check of checks) {
    graph.setNode(check.id);
    for (const need of check.needs) graph.setEdge(need, check.id);
    for (const hold of checks) {
      if (!hold.holdPoint || hold.lifted || hold.unitId !== check.unitId || hold.position >= check.position) continue;
      graph.setEdge(hold.id, check.id);
    }
  }
  return graph;
}

test("it is the passed ones among what is touched and everything behind it, as a graph library walks it", () => {
  fc.assert(
    fc.property(rework, travelers, (one, checks) => {
      const { lines } = doubtfulAfter(one, checks, { maps: MAPS });
      const touched = lines.flatMap((line) =>
        line.outcome !== "untouched" && line.reasons.some(({ why }) => why === "touched" || why === "implied")
          ? [line.checkId]
          : [],
      );
      const reached = new Set(touched.length === 0 ? [] : alg.preorder(dependence(checks), touched));
      const expected = checks.filter(({ id, state }) => state === "passed" && reached.has(id)).map(({ id }) => id);
      expect(doubtful(one, checks)).toEqual(new Set(expected));
    }),
  );
});

test("each check has one line, in the same order however the checks came, and every way is a real one", () => {
  fc.assert(
    fc.property(rework, travelers, (one, checks) => {
      const after = doubtfulAfter(one, checks, { maps: MAPS });
      expect(after.lines.map(({ checkId }) => checkId).sort()).toEqual(checks.map(({ id }) => id).sort());
      expect(doubtfulAfter(one, [...checks].reverse(), { maps: MAPS })).toEqual(after);
      const graph = dependence(checks);
      for (const line of after.lines) {
        if (line.outcome === "untouched") continue;
        for (const { through } of line.reasons) {
          [line.checkId, ...through].forEach((id, step, way) => {
            const next = way[step + 1];
            if (next !== undefined) expect(graph.hasEdge(next, id)).toBe(true);
          });
        }
      }
    }),
  );
});

test("many of the reworks and travelers drawn here meet, and some do not", () => {
  const hits = fc.sample(fc.tuple(rework, travelers), { numRuns: 300, seed: 7 });
  const counts = hits.map(([one, checks]) => doubtful(one, checks).size);
  expect(counts.filter((count) => count > 0).length).toBeGreaterThan(100);
  expect(counts.filter((count) => count === 0).length).toBeGreaterThan(10);
});
