import { alg, Graph } from "@dagrejs/graphlib";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { orderBoards, type BoardOrder, type BoardOrderInput } from "@/lib/calc/sequence";
import { anyMachine, shuffled } from "../../support/any-machine";

const CODES = ["BPL", "CON", "SIN", "SUM"];
const PLACES = ["backplane", "slot 1", "slot 2", "slot 3", "slot 4", "slot 5"];

/** Overrides that follow one order of the boards, so that they make no circle. */
const overrides = fc
  .tuple(fc.shuffledSubarray(CODES, { minLength: 4 }), fc.array(fc.tuple(fc.nat(3), fc.nat(3)), { maxLength: 2 }))
  .map(([order, pairs]) =>
    pairs.flatMap(([one, other]) => {
      const [board, before] = [order[Math.min(one, other)], order[Math.max(one, other)]];
      return board !== undefined && before !== undefined && board !== before
        ? [{ board, before, reason: "because" }]
        : [];
    }),
  );

const inputs: fc.Arbitrary<BoardOrderInput> = fc.record({
  machine: anyMachine,
  proofs: fc.subarray(PLACES).map((list) => list.map((placement) => ({ placement, proven: true }))),
  railSources: fc.subarray([
    { rail: "+5 V", board: "SUM" },
    { rail: "+12V", board: "CON" },
  ]),
  overrides,
});

function order(input: BoardOrderInput): BoardOrder {
  const answer = orderBoards(input);
  if (!answer.ok) throw new Error(answer.message);
  return answer.value;
}

function graphOf({ links, steps }: BoardOrder): Graph {
  const graph = new Graph({ directed: true });
  const unproven = steps.map(({ board }) => board);
  for (const board of unproven) graph.setNode(board);
  for (const { from, to } of links) if (unproven.includes(from) && unproven.includes(to)) graph.setEdge(from, to);
  return graph;
}

describe("The order of the boards of any machine", () => {
  test("has every unproven board once, and keeps what was said", () => {
    fc.assert(
      fc.property(inputs, (input) => {
        const { steps, proven } = order(input);
        const at = new Map(steps.map(({ board }, index) => [board, index]));
        expect([...at.keys(), ...proven].sort()).toEqual(input.machine.boards.map(({ code }) => code).sort());
        expect(at.size).toBe(steps.length);
        for (const { board, before } of input.overrides) {
          const [one, other] = [at.get(board), at.get(before)];
          if (one !== undefined && other !== undefined) expect(one).toBeLessThan(other);
        }
      }),
    );
  });

  test("never lets an unproven board reach a proven one but by a line that the extender leaves open", () => {
    fc.assert(
      fc.property(inputs, (input) => {
        const { steps, proven, links } = order(input);
        const done = new Set(proven);
        for (const { board, held, open } of steps) {
          for (const { from, to, kind, nets } of links) {
            if (kind === "said" || kind === "carries") continue;
            if (from === board && done.has(to)) for (const net of nets) expect(open?.nets).toContain(net);
            if (to === board && !done.has(from)) for (const net of nets) expect(held?.nets).toContain(net);
          }
          done.add(board);
        }
      }),
    );
  });

  test("needs the bench in a board's place only where a graph library finds both in one circle", () => {
    fc.assert(
      fc.property(inputs, (input) => {
        const found = order(input);
        const components = alg.tarjan(graphOf(found));
        const held = found.steps.flatMap((step) => (step.held?.boards ?? []).map((other) => [step.board, other]));
        for (const [board = "", other = ""] of held) {
          expect(components.find((members) => members.includes(board))).toContain(other);
        }
        if (alg.isAcyclic(graphOf(found))) expect(held).toEqual([]);
      }),
    );
  });

  test("does not depend on the order in which the machine is listed", () => {
    const both = inputs.chain((input) =>
      shuffled(input.machine).map((machine) => [input, { ...input, machine }] as const),
    );
    fc.assert(
      fc.property(both, ([one, other]) => {
        expect(order(other)).toEqual(order(one));
      }),
    );
  });

  test("is refused exactly when a graph library finds a circle in what was said", () => {
    const pairs = fc.array(fc.tuple(fc.constantFrom(...CODES), fc.constantFrom(...CODES)), { maxLength: 5 });
    fc.assert(
      fc.property(anyMachine, pairs, (machine, drawn) => {
        const said = drawn.map(([board, before]) => ({ board, before, reason: "because" }));
        const codes = machine.boards.map(({ code }) => code);
        const graph = new Graph({ directed: true });
        for (const { board, before } of said) {
          if (codes.includes(board) && codes.includes(before)) graph.setEdge(board, before);
        }
        const answer = orderBoards({ machine, proofs: [], railSources: [], overrides: said });
        expect(answer.ok).toBe(alg.isAcyclic(graph));
        if (answer.ok) return;
        answer.circle.forEach((code, at) => {
          expect(graph.hasEdge(code, answer.circle[(at + 1) % answer.circle.length] ?? "")).toBe(true);
        });
      }),
    );
  });
});
