import { describe, expect, test } from "vitest";
import { applyEdits } from "@/lib/calc/interconnect";
import { bidirectional, found, input, only, openDrain, pushPull, rack, threeState } from "../../support/small-machine";

describe("outputs that work against each other", () => {
  test("two cards that both push PH6 are found, with their pins and the group of their neighbours", () => {
    const machine = rack({
      cards: {
        CON: { a10: pushPull("PH6"), a11: threeState("PH7", "SUM_SEL") },
        SUM: { a10: input("PH6"), a11: input("PH7") },
      },
      slots: ["CON", "CON", "SUM"],
    });
    const finding = only(machine, "two-push-pull");
    expect(finding.weight).toBe("must");
    expect(finding.title).toBe("Two push-pull outputs drive PH6");
    expect(finding.why).toContain("CON-01 a10 and CON-02 a10");
    expect(finding.mend).toBe("Make them three-state, in the group SUM_SEL like their neighbours.");
    expect(finding.pins.map(({ label, pin }) => `${label} ${pin}`)).toEqual(["CON-01 a10", "CON-02 a10"]);
    expect(finding.boards).toEqual(["CON"]);
    expect(found(applyEdits(machine, finding.edits), "two-push-pull")).toEqual([]);
    expect(found(applyEdits(machine, finding.edits), "enable-groups")).toEqual([]);
  });

  test("one design in three slots makes the mistake once", () => {
    const machine = rack({ cards: { CON: { a10: pushPull("PH6") } }, slots: ["CON", "CON", "CON"] });
    const finding = only(machine, "two-push-pull");
    expect(finding.title).toBe("Three push-pull outputs drive PH6");
    expect(finding.edits).toHaveLength(1);
  });

  test("the lines of a bus are told together", () => {
    const pins = Object.fromEntries([4, 5, 6, 7].map((bit) => [`a${bit}`, pushPull(`D${bit}`)]));
    const finding = only(rack({ cards: { CON: pins, SUM: pins } }), "two-push-pull");
    expect(finding.title).toBe("Two push-pull outputs drive D4 … D7");
    expect(finding.why).toContain("The same on 3 more.");
  });

  test("one push-pull output with its loads is fine", () => {
    const machine = rack({ cards: { TIM: { a1: pushPull("STB") }, CON: { a1: input("STB") } } });
    expect(found(machine, "two-push-pull")).toEqual([]);
    expect(found(machine, "mixed-outputs")).toEqual([]);
  });

  test("an output that a card brings out on two pins is one output", () => {
    const machine = rack({ cards: { TIM: { a1: pushPull("STB"), c1: pushPull("STB") }, CON: { a1: input("STB") } } });
    expect(found(machine, "two-push-pull")).toEqual([]);
  });

  test("a push-pull output among three-state ones is to join their group", () => {
    const machine = rack({ cards: { CON: { a1: pushPull("D0") }, SIN: { a1: threeState("D0", "SEL") } } });
    const finding = only(machine, "mixed-outputs");
    expect(finding.title).toBe("A push-pull output shares D0 with three-state outputs");
    expect(finding.mend).toBe("Make it three-state, in the group SEL.");
    expect(found(applyEdits(machine, finding.edits), "mixed-outputs")).toEqual([]);
  });

  test("a push-pull output on a wired AND is to become open-drain", () => {
    const machine = rack({ cards: { CON: { a1: pushPull("BUSY_N") }, SIN: { a1: openDrain("BUSY_N") } } });
    const finding = only(machine, "mixed-outputs");
    expect(finding.mend).toBe("Make it open-drain like the others.");
    expect(found(applyEdits(machine, finding.edits), "mixed-outputs")).toEqual([]);
  });

  test("open-drain with three-state outputs is found, and nothing is changed unasked", () => {
    const machine = rack({ cards: { CON: { a1: openDrain("D0") }, SIN: { a1: threeState("D0", "SEL") } } });
    expect(only(machine, "mixed-outputs").edits).toEqual([]);
  });

  test("a push-pull output with bidirectional pins alone should be looked into: they may only listen", () => {
    const machine = rack({ cards: { CON: { a1: pushPull("D0") }, SIN: { a1: bidirectional("D0") } } });
    expect(only(machine, "mixed-outputs").weight).toBe("should");
  });
});

describe("outputs that take turns", () => {
  test("in one group are fine", () => {
    const machine = rack({ cards: { CON: { a1: threeState("D0", "SEL") }, SIN: { a1: threeState("D0", "SEL") } } });
    expect(found(machine, "enable-groups")).toEqual([]);
  });

  test("in two groups, or in none, are found and put into one", () => {
    for (const group of ["SINE", ""]) {
      const machine = rack({ cards: { CON: { a1: threeState("D0", "SEL") }, SIN: { a1: threeState("D0", group) } } });
      const finding = only(machine, "enable-groups");
      expect(finding.title).toBe("Outputs that take turns on D0 are not in one group");
      expect(found(applyEdits(machine, finding.edits), "enable-groups")).toEqual([]);
    }
  });

  test("a single three-state output needs no group", () => {
    const machine = rack({ cards: { CON: { a1: threeState("D0") }, SIN: { a1: input("D0") } } });
    expect(found(machine, "enable-groups")).toEqual([]);
  });

  test("bidirectional pins without a group are worth a look, not more: their bus may have a protocol", () => {
    const machine = rack({ cards: { CON: { a1: bidirectional("D0") }, SIN: { a1: bidirectional("D0") } } });
    expect(only(machine, "enable-groups").weight).toBe("look");
  });
});
