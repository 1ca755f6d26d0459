import { describe, expect, test } from "vitest";
import { faultOf, fixed, linear, powerOf, railOf } from "./board";

describe("rails that a board makes itself", () => {
  const nine = { name: "+9V", volts: 9, tolerancePercent: 10 };

  test("a linear regulator passes the current on, adds its own and gets warm by the difference", () => {
    const power = powerOf({ items: [fixed(0.2, { rail: "+3.3V" }), linear("LDO", "+5V", "+3.3V", 3.3)] });
    expect(railOf(power, "+3.3V")).toMatchObject({ madeHere: true, volts: 3.3 });
    expect(railOf(power, "+5V").taken.worst).toBeCloseTo(0.205, 12);
    expect(railOf(power, "+5V").atRestA).toBeCloseTo(0.105, 12);
    expect(power.heatW.worst).toBeCloseTo(5 * 0.205, 12);
  });

  test("a switching regulator passes the power on, at worst from the lowest input", () => {
    const buck = { ...linear("Buck", "+9V", "+5V", 5), type: { kind: "switching", efficiency: 0.8 } } as const;
    const rail = railOf(powerOf({ items: [buck, fixed(0.9)], rails: [nine] }), "+9V");
    expect(rail.taken.typical).toBeCloseTo((5 * 0.45) / (0.8 * 9), 12);
    expect(rail.taken.worst).toBeCloseTo((5 * 0.9) / (0.8 * 8.1), 12);
  });

  test("regulators one behind the other add up from the last to the first, in whatever order they are written", () => {
    const chain = [
      linear("First", "+9V", "+5V", 5),
      linear("Second", "+5V", "+3.3V", 3.3),
      fixed(0.1, { rail: "+3.3V" }),
    ];
    for (const items of [chain, [...chain].reverse()])
      expect(railOf(powerOf({ items, rails: [nine] }), "+9V").taken.worst).toBeCloseTo(0.11, 12);
  });

  test("the board that feeds the others warms itself by what it keeps", () => {
    const power = powerOf({
      items: [linear("Supply", "+9V", "+5V", 5, 0), fixed(0.1)],
      rails: [nine, { name: "+5V", volts: 5, tolerancePercent: 5 }],
      elsewhere: [{ rail: "+5V", typicalA: 0.5, worstA: 0.9 }],
    });
    expect(railOf(power, "+5V")).toMatchObject({ madeHere: true, passedOn: { typical: 0.5, worst: 0.9 } });
    expect(railOf(power, "+9V").taken.worst).toBeCloseTo(1, 12);
    // computed: 9 W come in, 4.5 W go on as 0.9 A at 5 V
    expect(power.heatW.worst).toBeCloseTo(4.5, 12);
  });

  test("regulators that feed each other are named in order, and one rail has one maker", () => {
    const ring = [
      linear("A", "+7V", "+6V", 6),
      { ...linear("B", "+6V", "+7V", 7), type: { kind: "switching", efficiency: 0.9 } } as const,
    ];
    expect(faultOf({ items: ring })).toBe("items/0: Regulators feed each other: A → B → A.");
    expect(faultOf({ items: [linear("A", "+5V", "+3V", 3), linear("B", "+5V", "+3V", 3)] })).toContain("both make +3V");
  });

  test("a linear regulator cannot make more than it gets", () => {
    expect(faultOf({ items: [linear("LDO", "+5V", "+9V", 9)] })).toBe(
      "items/0: LDO is linear: it cannot make 9 V from 5 V.",
    );
  });
});
