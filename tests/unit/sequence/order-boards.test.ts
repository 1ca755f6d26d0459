import { describe, expect, test } from "vitest";
import { orderBoards, type BoardOrderInput } from "@/lib/calc/sequence";
import {
  board,
  ground,
  input,
  openDrain,
  passive,
  power,
  pushPull,
  rack,
  threeState,
} from "../../support/small-machine";

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

const proven = (...placements: string[]) => placements.map((placement) => ({ placement, proven: true }));

describe("The order of the boards", () => {
  test("begins with the copper that all meet in, then the supply, then who drives, then who listens", () => {
    const { steps, risks, remarks } = order({});
    expect(steps.map((step) => step.board)).toEqual(["BPL", "SUP", "TIM", "CON", "SIN"]);
    expect(steps.map(({ reason }) => reason)).toEqual([
      "No other board drives or supplies it. CON, SIN, SUP and TIM come after it.",
      "BPL carries the nets of SUP. CON, SIN and TIM come after it.",
      "BPL carries the nets of TIM and SUP supplies TIM with +5V. CON and SIN come after it.",
      "BPL carries the nets of CON, SUP supplies CON with +5V and TIM drives CLK into CON. SIN comes after it.",
      "BPL carries the nets of SIN, CON drives PH0 … PH2 into SIN, SUP supplies SIN with +5V and TIM drives PHI1 into SIN. Nothing comes after it.",
    ]);
    expect(steps.every(({ held, open }) => held === null && open === null)).toBe(true);
    expect({ risks, remarks }).toEqual({ risks: [], remarks: [] });
  });

  test("leaves out what is proven, with each of its units", () => {
    const some = order({ proofs: proven("backplane", "slot 1", "slot 2", "slot 3") });
    expect(some.proven).toEqual(["BPL", "SUP", "TIM"]);
    expect(some.steps.map((step) => step.board)).toEqual(["CON", "SIN"]);
    expect(some.steps[0]?.units).toEqual([
      { label: "CON-01", proven: true },
      { label: "CON-02", proven: false },
    ]);
    expect(some.steps[0]?.reason).toContain("CON-01 is proven already, CON-02 is not.");
    expect(some.steps[0]?.after).toEqual(["BPL", "SUP", "TIM"]);
  });

  test("knows a supply by the rail's source, however the rail is written, and open-drain outputs as drivers", () => {
    const two = { SUP: { ...supply, b8: openDrain("FAULT_N") }, OUT: { ...supply, b8: input("FAULT_N") } };
    const { links } = order({ machine: rack({ cards: two }), railSources: [{ rail: "+5V", board: "OUT" }] });
    expect(links.map(({ sentence }) => sentence)).toEqual([
      "BPL carries the nets of OUT.",
      "BPL carries the nets of SUP.",
      "OUT supplies SUP with +5V.",
      "SUP drives FAULT_N into OUT.",
    ]);
  });

  test("says of a board that stands nowhere that it does", () => {
    const boards = [...machine.boards, board("SPA", { a1: passive("X") })];
    const last = order({ machine: { ...machine, boards } }).steps.find((step) => step.board === "SPA");
    expect(last).toMatchObject({ units: [] });
    expect(last?.reason).toContain("It stands nowhere in the machine yet.");
  });
});

describe("A proven board", () => {
  test("is warned of the unproven one that would drive it, and the extender leaves these lines open", () => {
    const { risks, steps } = order({ proofs: proven("backplane", "slot 1", "slot 3", "slot 4", "slot 5") });
    expect(risks).toEqual([
      {
        unproven: "TIM",
        proven: "CON",
        nets: ["CLK"],
        sentence:
          "TIM is not proven and gives CLK to CON, which is: keep TIM out of the machine, or these lines open, until it is proven.",
      },
      expect.objectContaining({ proven: "SIN", nets: ["PHI1"] }),
    ]);
    expect(steps).toHaveLength(1);
    expect(steps[0]?.open).toEqual({
      boards: ["CON", "SIN"],
      nets: ["CLK", "PHI1"],
      sentence: "CON and SIN are proven by then: the extender leaves CLK and PHI1 open until TIM is.",
    });
  });
});
