import { describe, expect, test } from "vitest";
import { applyEdits } from "@/lib/calc/interconnect";
import { board, carries, clock, found, ground, input, only, pushPull, rack } from "../../support/small-machine";

describe("fast edges", () => {
  test("far from ground are found with the family and the distance, once for the connector", () => {
    const machine = rack({ cards: { TIM: { a1: ground(), a10: pushPull("D0", "AC"), a11: pushPull("D1", "AC") } } });
    const finding = only(machine, "far-ground");
    expect(finding.title).toBe("Fast edges without a ground pin nearby on TIM J1");
    expect(finding.why).toContain("AC edges of about 2.0\u202fns on a10 and a11");
    expect(finding.why).toContain("from a11 the nearest ground is 25.4\u202fmm away");
  });

  test("within two places of a ground pin are fine, and slow edges may be far", () => {
    expect(found(rack({ cards: { TIM: { a1: ground(), a3: pushPull("D0", "AC") } } }), "far-ground")).toEqual([]);
    expect(found(rack({ cards: { TIM: { a1: ground(), a4: pushPull("D0", "AC") } } }), "far-ground")).toHaveLength(1);
    expect(found(rack({ cards: { TIM: { a1: ground(), a20: pushPull("D0", "HC") } } }), "far-ground")).toEqual([]);
  });
});

describe("clock lines", () => {
  const more = { signals: [clock("PHI1"), clock("PHI2")] };

  test("on neighbouring pins are found once for all boards", () => {
    const cards = {
      TIM: { a10: pushPull("PHI1"), a11: pushPull("PHI2") },
      CON: { a10: input("PHI1"), a11: input("PHI2") },
    };
    const finding = only(rack({ cards, more }), "clock-beside-clock");
    expect(finding.title).toBe("PHI1 runs beside PHI2");
    expect(finding.why).toBe("a10 next to a11 on BPL, CON and TIM, with no ground between.");
    expect(finding.weight).toBe("should");
  });

  test("with a ground pin between them are fine", () => {
    const cards = { TIM: { a10: pushPull("PHI1"), a11: ground(), a12: pushPull("PHI2") } };
    const machine = rack({ cards, more });
    expect(found(machine, "clock-beside-clock")).toEqual([]);
    expect(found(machine, "clock-beside-line")).toEqual([]);
  });

  test("beside a bus line are worth a look; the same clock on two pins is not beside itself", () => {
    const cards = { TIM: { a20: pushPull("PHI1"), a21: pushPull("PHI1"), a19: pushPull("D7") } };
    expect(only(rack({ cards, more }), "clock-beside-line").weight).toBe("look");
    expect(
      found(rack({ cards: { TIM: { a20: pushPull("PHI1"), a21: pushPull("PHI1") } }, more }), "clock-beside-line"),
    ).toEqual([]);
  });

  test("in rows a and c of a type C stand too far apart to matter", () => {
    const machine = rack({ cards: { TIM: { a10: pushPull("PHI1"), c10: pushPull("PHI2") } }, more });
    expect(found(machine, "clock-beside-clock")).toEqual([]);
  });
});

describe("CMOS inputs that carry nothing", () => {
  test("are found once for the connector and tied by a resistor", () => {
    const machine = rack({ cards: { CON: { a5: input(""), a6: input("") } } });
    const finding = only(machine, "open-inputs");
    expect(finding.title).toBe("Unused CMOS inputs on CON J1 are not tied");
    expect(found(applyEdits(machine, finding.edits), "open-inputs")).toEqual([]);
  });

  test("are let be when a resistor ties them or when they are bipolar", () => {
    const tied = carries("", "input", { loads: 1, pullUpOhm: 10_000 });
    expect(found(rack({ cards: { CON: { a5: tied, a6: input("", "LS") } } }), "open-inputs")).toEqual([]);
  });

  test("of spare gates are found by board and tied", () => {
    const spare = { ...board("CON", {}), untiedSpares: [{ part: "74HC00", gates: 2, inputs: 4, family: "HC" }] };
    const machine = { ...rack({ cards: {} }), boards: [spare] };
    const finding = only(machine, "spare-gates");
    expect(finding.why).toContain("2 of 74HC00 with 4 inputs");
    expect(found(applyEdits(machine, finding.edits), "spare-gates")).toEqual([]);
    const bipolar = { ...spare, untiedSpares: [{ part: "74LS00", gates: 2, inputs: 4, family: "LS" }] };
    expect(found({ ...machine, boards: [bipolar] }, "spare-gates")).toEqual([]);
  });
});
