import { describe, expect, test } from "vitest";
import { machinePower, type MachinePowerInput, type MachineRail, type PoweredPlacement } from "@/lib/calc/power";
import { card, FIVE, LINE, machine, powerOf } from "./machine";

describe("the margin of a supply", () => {
  const verdictAt = (worst: number, capacityA: number | null) =>
    powerOf({ rails: [{ ...FIVE, capacityA }], placements: [card(1, worst)] }).margins[0];

  test("says what is left at worst", () => {
    expect(verdictAt(3, 5)).toMatchObject({ verdict: "enough", sum: { typical: 1.5, worst: 3 } });
    expect(verdictAt(3, 5)?.leftPercent).toBeCloseTo(40, 9);
    expect(verdictAt(3, 5)?.sentence).toBe("+5V: 3\u202fA at worst of 5\u202fA, 40\u202f% left.");
  });
  test("a fifth is enough, less is scant, more than there is too little", () => {
    expect(verdictAt(4, 5)?.verdict).toBe("enough");
    expect(verdictAt(4.1, 5)?.verdict).toBe("scant");
    expect(verdictAt(5.5, 5)).toMatchObject({ verdict: "too little" });
    expect(verdictAt(5.5, 5)?.sentence).toContain("500\u202fmA more than the 5\u202fA of its supply");
    expect(verdictAt(5.5, null)).toMatchObject({ verdict: "unknown", leftPercent: null });
  });
});

describe("the current per contact", () => {
  const loads = (placements: PoweredPlacement[], rails = [FIVE]) =>
    powerOf({ placements, rails }).contacts.map(({ label, rail, perContactA, verdict }) => [
      label,
      rail,
      perContactA,
      verdict,
    ]);

  test("is judged against the rating at the ambient temperature, 1.6 A at 40 °C", () => {
    expect(powerOf({ placements: [card(1, 3.1)] }).contacts[0]).toMatchObject({
      ratedA: 1.6,
      perContactA: 1.55,
      verdict: "fits",
    });
    expect(loads([card(1, 3.3)])).toEqual([
      ["Slot 1", "+5V", 1.65, "too much"],
      ["Slot 1", "ground", 0.825, "fits"],
    ]);
  });

  test("the card that feeds a rail carries what all others take", () => {
    const source = { ...FIVE, sourcePlacement: "card-1" };
    expect(loads([card(1, 0.5), card(2, 1), card(3, 2)], [source])[0]).toEqual(["Slot 1", "+5V", 1.5, "fits"]);
  });

  test("positive and negative rails relieve each other in ground", () => {
    const minus: MachineRail = { ...FIVE, name: "−5V", volts: -5 };
    const both = card(1, 1, {
      draws: [
        { rail: "+5V", typicalA: 1, worstA: 1 },
        { rail: "−5V", typicalA: 0.4, worstA: 0.4 },
      ],
      contacts: {
        rails: [
          { rail: "+5V", count: 1 },
          { rail: "−5V", count: 1 },
        ],
        ground: 2,
      },
    });
    expect(loads([both], [FIVE, minus]).at(-1)).toEqual(["Slot 1", "ground", 0.5, "fits"]);
  });

  test("a card without a contact for its rail is told, one without a pin map is not", () => {
    const bare = card(1, 1, { contacts: { rails: [], ground: 1 } });
    expect(loads([bare])[0]).toEqual(["Slot 1", "+5V", null, "no contact"]);
    expect(loads([card(1, 1, { contacts: null })])).toEqual([]);
  });
});

test("heat adds up over the boards whose heat is known", () => {
  const { heat, heatTotalW } = powerOf({ placements: [card(1, 1), card(2, 1, { heatW: null })] });
  expect(heat).toHaveLength(1);
  expect(heatTotalW).toEqual({ typical: 2.5, worst: 5 });
});

describe("a machine that cannot be added up names its row", () => {
  const faultOf = (change: Partial<MachinePowerInput>) => {
    const result = machinePower(machine(change));
    return result.ok ? "" : `${result.field}: ${result.message}`;
  };
  test.each([
    [
      "an unknown rail",
      { placements: [card(1, 1, { draws: [{ rail: "+9V", typicalA: 0, worstA: 1 }] })] },
      "placements/0",
    ],
    ["half a contact", { placements: [card(1, 1, { contacts: { rails: [], ground: 0.5 } })] }, "placements/0"],
    ["a supply of nothing", { rails: [{ ...FIVE, capacityA: 0 }] }, "rails/0"],
    ["a rail of 0 V", { rails: [{ ...FIVE, volts: 0 }] }, "rails/0: +5V has no voltage"],
    ["air too hot for any contact", { ambientC: 130 }, "ambientC"],
    ["copper of negative resistance", { backplane: [{ ...LINE, supplyOhm: -1 }] }, "backplane"],
    ["a drop of no rail", { backplane: [{ ...LINE, rail: "+9V" }] }, "backplane: There is no rail +9V"],
    ["half a slot", { backplane: [{ ...LINE, sourceSlot: 0.5 }] }, "whole number"],
  ])("%s", (_, change, message) => expect(faultOf(change)).toContain(message));
});
