import { describe, expect, test } from "vitest";
import type { Machine } from "@/lib/calc/interconnect";
import { orderBoards, type BoardOrderInput } from "@/lib/calc/sequence";
import { ground, input, power, pushPull, rack, threeState } from "../../support/small-machine";

const supply = { a1: ground(), a2: power("+5V") };
const cards = {
  SUP: supply,
  TIM: { ...supply, a10: pushPull("CLK"), a11: pushPull("PHI1") },
  CON: { ...supply, a10: input("CLK"), a14: threeState("PH0"), a15: threeState("PH1"), a16: threeState("PH2") },
  SIN: { ...supply, a11: input("PHI1"), a14: input("PH0"), a15: input("PH1"), a16: input("PH2") },
};
const machine = rack({ cards, slots: ["SUP", "TIM", "CON", "CON", "SIN"] });
const railSources = [{ rail: "+5 V", board: "SUP" }];

function order(input: Partial<BoardOrderInput>) {
  const answer = orderBoards({ machine, proofs: [], railSources, overrides: [], ...input });
  if (!answer.ok) throw new Error(answer.message);
  return answer.value;
}

const codes = (input: Partial<BoardOrderInput>) => order(input).steps.map((step) => step.board);

describe("Boards that drive each other", () => {
  const circle: Machine = rack({
    cards: {
      CON: { a10: input("CLK"), a11: input("RESET_N"), b1: pushPull("CARRY_N") },
      TIM: { a10: pushPull("CLK"), a11: pushPull("RESET_N"), b1: input("CARRY_N") },
    },
  });

  test("begin with the one into which the fewest lines run, apart, with the bench in the other's place", () => {
    const { steps } = order({ machine: circle, railSources: [] });
    expect(steps.map((step) => step.board)).toEqual(["BPL", "TIM", "CON"]);
    expect(steps[1]).toMatchObject({
      held: {
        boards: ["CON"],
        nets: ["CARRY_N"],
        sentence: "CON is not proven by then: on the extender the bench gives CARRY_N instead.",
      },
      open: null,
      reason:
        "BPL carries the nets of TIM. In a circle of boards that drive each other the fewest lines run into it. CON comes after it.",
    });
    expect(steps[2]).toMatchObject({
      held: null,
      open: {
        boards: ["TIM"],
        nets: ["CARRY_N"],
        sentence: "TIM is proven by then: the extender leaves CARRY_N open until CON is.",
      },
    });
  });

  test("begin with the one that somebody said, and why", () => {
    const overrides = [{ board: "CON", before: "TIM", reason: "TIM waits for its crystal." }];
    const { steps, remarks } = order({ machine: circle, railSources: [], overrides });
    expect(steps.map((step) => step.board)).toEqual(["BPL", "CON", "TIM"]);
    expect(steps[1]?.held?.nets).toEqual(["CLK", "RESET_N"]);
    expect(steps[1]?.reason).toContain("CON is said to come before TIM: TIM waits for its crystal.");
    expect(remarks).toEqual(["CON comes before TIM by your own word, but TIM drives CLK and RESET_N into CON."]);
  });
});

describe("What somebody says", () => {
  test("is kept against the machine, with as few lines from the bench as may be", () => {
    const overrides = [{ board: "SIN", before: "TIM", reason: "It is on the bench." }];
    expect(codes({ overrides })).toEqual(["BPL", "SUP", "CON", "SIN", "TIM"]);
  });

  test("in a circle is refused by name", () => {
    const overrides = [
      { board: "SIN", before: "TIM", reason: "a" },
      { board: "TIM", before: "CON", reason: "b" },
      { board: "CON", before: "SIN", reason: "c" },
    ];
    expect(orderBoards({ machine, proofs: [], railSources, overrides })).toEqual({
      ok: false,
      circle: ["CON", "SIN", "TIM"],
      message: "By what was said CON comes before SIN, SIN before TIM and TIM before CON: no order does that.",
    });
  });

  test("of a board that is not there is not used", () => {
    const { remarks, steps } = order({ overrides: [{ board: "XYZ", before: "TIM", reason: "a" }] });
    expect(remarks).toEqual(["There is no board XYZ."]);
    expect(steps).toHaveLength(5);
  });
});
