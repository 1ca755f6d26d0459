import { describe, expect, test } from "vitest";
import { applyEdits } from "@/lib/calc/interconnect";
import { carries, found, input, only, openDrain, pushPull, rack } from "../../support/small-machine";

describe("levels of driver and receiver", () => {
  test("an LS output does not reach the high level of an HC input; HCT does not mind", () => {
    const machine = rack({ cards: { SIN: { c3: pushPull("SUM0", "LS") }, SUM: { c3: input("SUM0", "HC") } } });
    const finding = only(machine, "levels-high");
    expect(finding.title).toBe("SUM0: high level too low");
    expect(finding.why).toContain("An LS output gives 2.7\u202fV at worst; the HC input wants 3.5\u202fV.");
    expect(finding.mend).toBe("Use HCT on the input, or a pull-up.");
    expect(found(applyEdits(machine, finding.edits), "levels-high")).toEqual([]);
  });

  test("HC into HC, HC into LS, LS into HCT and AC into HC fit", () => {
    for (const [driver, receiver] of [
      ["HC", "HC"],
      ["HC", "LS"],
      ["LS", "HCT"],
      ["AC", "HC"],
    ]) {
      const machine = rack({ cards: { SIN: { c3: pushPull("D0", driver) }, SUM: { c3: input("D0", receiver) } } });
      expect(found(machine, "levels-high")).toEqual([]);
      expect(found(machine, "levels-low")).toEqual([]);
    }
  });

  test("a pull-up lifts an LS output to the level of an HC input", () => {
    const driver = carries("D0", "push-pull output", { family: "LS", pullUpOhm: 2200 });
    const machine = rack({ cards: { SIN: { c3: driver }, SUM: { c3: input("D0", "HC") } } });
    expect(found(machine, "levels-high")).toEqual([]);
  });

  test("eight lines of a bus with one mistake are one finding", () => {
    const lines = (what: typeof input, family: string) =>
      Object.fromEntries([0, 1, 2, 3].map((bit) => [`a${bit + 1}`, what(`D${bit}`, family)]));
    const machine = rack({
      cards: { SIN: lines((name, family) => pushPull(name, family), "LS"), SUM: lines(input, "HC") },
    });
    expect(only(machine, "levels-high").title).toBe("D0 … D3: high level too low");
  });

  test("a 5 V output into a 3.3 V input without tolerance is told", () => {
    const families = rack({ cards: {} }).families.map((family) =>
      family.name === "LVC 3.3 V" ? { ...family, inputMaxVolts: null } : family,
    );
    const machine = rack({
      cards: { SIN: { c3: pushPull("D0", "HC") }, SUM: { c3: input("D0", "LVC 3.3 V") } },
      more: { families },
    });
    expect(only(machine, "over-voltage").title).toBe("D0: more volts than the input bears");
    const tolerant = rack({ cards: { SIN: { c3: pushPull("D0", "HC") }, SUM: { c3: input("D0", "LVC 3.3 V") } } });
    expect(found(tolerant, "over-voltage")).toEqual([]);
  });

  test("a bidirectional pin does not have to fit its own input", () => {
    const machine = rack({
      cards: {
        CPU: { c3: carries("D0", "bidirectional", { family: "F", loads: 1 }) },
        MEM: { c3: carries("D0", "bidirectional", { family: "F", loads: 1 }) },
      },
    });
    expect(found(machine, "levels-high")).toEqual([]);
  });

  test("a family that is not in the table is told, and its levels are not looked at", () => {
    const machine = rack({ cards: { SIN: { c3: pushPull("D0", "XY") }, SUM: { c3: input("D0", "HC") } } });
    expect(only(machine, "unknown-family").title).toBe("The family XY is not in the table");
    expect(found(machine, "levels-high")).toEqual([]);
  });
});

describe("fan-out", () => {
  const loaded = (loads: number) =>
    rack({ cards: { TIM: { a1: pushPull("CLK") }, CON: { a1: input("CLK", "LS", loads) } } });

  test("of an HC output is ten LS inputs, and eleven are too many", () => {
    expect(found(loaded(10), "fan-out")).toEqual([]);
    const finding = only(loaded(11), "fan-out");
    expect(finding.title).toBe("CLK: more loads than the output drives");
    expect(finding.why).toContain("4.4 of 4\u202fmA");
  });

  test("counts the loads of every slot", () => {
    const machine = rack({
      cards: { TIM: { a1: pushPull("CLK") }, CON: { a1: input("CLK", "LS", 4) } },
      slots: ["TIM", "CON", "CON", "CON"],
    });
    expect(only(machine, "fan-out").why).toContain("4.8 of 4\u202fmA");
  });
});

describe("open-drain nets", () => {
  const drains = { CON: { a8: openDrain("FAULT_N") }, SUM: { a8: openDrain("FAULT_N") } };
  const listens = (pullUpOhm: number | null) => ({
    a8: carries("FAULT_N", "input", { family: "HCT", loads: 1, pullUpOhm }),
  });

  test("without a pull-up never become high; a value that fits is offered and put where it is once", () => {
    const machine = rack({ cards: { ...drains, TIM: listens(null) } });
    const finding = only(machine, "no-pull-up");
    expect(finding.title).toBe("FAULT_N has no pull-up");
    expect(finding.weight).toBe("must");
    expect(finding.why).toMatch(/Two open-drain outputs can pull it low.*A value between .* fits; E6: /);
    expect(finding.edits).toEqual([expect.objectContaining({ board: "BPL", set: { pullUpOhm: expect.any(Number) } })]);
    const mended = applyEdits(machine, finding.edits);
    for (const rule of ["no-pull-up", "several-pull-ups", "pull-up-outside"]) expect(found(mended, rule)).toEqual([]);
  });

  test("with one resistor that fits are fine", () => {
    const machine = rack({ cards: { ...drains, TIM: listens(4700) } });
    for (const rule of ["no-pull-up", "several-pull-ups", "pull-up-outside"]) expect(found(machine, rule)).toEqual([]);
  });

  test("with a resistor too small or too large are told why", () => {
    const small = only(rack({ cards: { ...drains, TIM: listens(470) } }), "pull-up-outside");
    expect(small.title).toBe("FAULT_N: pull-up too small");
    const machine = rack({ cards: { ...drains, TIM: listens(2e6) } });
    const large = only(machine, "pull-up-outside");
    expect(large.title).toBe("FAULT_N: pull-up too large");
    expect(found(applyEdits(machine, large.edits), "pull-up-outside")).toEqual([]);
  });

  test("with a resistor on several boards keep one", () => {
    const own = { a8: carries("FAULT_N", "open-drain output", { family: "HCT", pullUpOhm: 2200 }) };
    const machine = rack({ cards: { CON: own, TIM: listens(2200) }, slots: ["CON", "CON", "CON", "TIM"] });
    const finding = only(machine, "several-pull-ups");
    expect(finding.title).toBe("FAULT_N has four pull-ups");
    expect(finding.why).toContain("together 550\u202fΩ");
    const mended = applyEdits(machine, finding.edits);
    for (const rule of ["several-pull-ups", "pull-up-outside"]) expect(found(mended, rule)).toEqual([]);
  });

  test("with two resistors whose value together fits are a look", () => {
    const own = { a8: carries("FAULT_N", "open-drain output", { family: "HCT", pullUpOhm: 10_000 }) };
    const machine = rack({ cards: { CON: own, TIM: listens(10_000) } });
    expect(only(machine, "several-pull-ups").weight).toBe("look");
  });

  test("that change too often for any resistor say that no value fits", () => {
    const signals = [{ name: "FAULT_N", class: "data" as const, aliases: [], frequencyHz: 20e6 }];
    const finding = only(rack({ cards: { ...drains, TIM: listens(4700) }, more: { signals } }), "pull-up-outside");
    expect(finding.mend).toContain("No value fits");
    expect(finding.edits).toEqual([]);
  });
});
