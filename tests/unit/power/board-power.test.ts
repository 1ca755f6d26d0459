import { describe, expect, test } from "vitest";
import { packageItem, type LedItem, type PackageItem, type PullUpItem } from "@/lib/calc/power";
import { faultOf, fixed, linear, partNumbered, powerOf, railOf } from "./board";

const PLAN = {
  rail: "+5V",
  family: { name: "HC", technology: "CMOS" },
  clockHz: 2e6,
  activity: 0.25,
  loadPf: 50,
} as const;
const led: LedItem = {
  kind: "led",
  label: "Power LED",
  rail: "+5V",
  count: 2,
  forwardVolts: 2,
  ohm: 1000,
  lit: { typical: 1, worst: 1 },
};
const pullUp: PullUpItem = {
  kind: "pull-up",
  label: "Bus",
  rail: "+5V",
  count: 8,
  ohm: 4700,
  lowVolts: 0.3,
  lowShare: { typical: 0.5, worst: 1 },
};

describe("what the parts of a board take", () => {
  test("a package: Cpd and loads at half the clock, typically a quarter of it; at worst everything, on the highest supply", () => {
    const item = packageItem(partNumbered("283"), 2, 2, PLAN);
    const { computed } = railOf(powerOf({ items: [item] }), "+5V");
    // computed: 2 × (88 + 5 · 50) pF × 5 V × 1 MHz × 0.25, and × 5.25 V × 1 MHz with 80 µA at rest
    expect(computed.typical).toBeCloseTo(2 * 338e-12 * 5 * 0.25e6, 9);
    expect(computed.worst).toBeCloseTo(2 * (338e-12 * 5.25 * 1e6 + 80e-6), 9);
  });

  test("Cpd per gate counts for the gates in use and every bit of a register, Cpd per package once", () => {
    expect(packageItem(partNumbered("00"), 3, 10, PLAN).switching).toBeCloseTo(10 / 3, 12);
    expect(packageItem(partNumbered("574"), 1, 1, PLAN)).toMatchObject({ switching: 8, outputs: 8 });
    expect(packageItem(partNumbered("138"), 1, 1, PLAN)).toMatchObject({ switching: 1, outputs: 8 });
  });

  test("a bipolar part takes most of its current at rest, a CMOS part next to none", () => {
    const bipolar = packageItem(partNumbered("00"), 1, 4, { ...PLAN, family: { name: "LS", technology: "bipolar" } });
    expect(bipolar.staticA?.worst).toBeCloseTo(4.4e-3, 12);
    expect(railOf(powerOf({ items: [bipolar] }), "+5V").atRestA).toBeCloseTo(0.6 * 4.4e-3, 12);
    expect(railOf(powerOf({ items: [packageItem(partNumbered("00"), 1, 4, PLAN)] }), "+5V").atRestA).toBe(0);
  });

  test("TTL highs at HCT inputs cost current without any clock, but not surely", () => {
    const still: PackageItem = {
      ...packageItem(partNumbered("08"), 1, 4, { ...PLAN, clockHz: 0 }),
      staticA: null,
      ttlInputs: { count: 4, extraA: 216e-6, highShare: 0.5 },
    };
    const rail = railOf(powerOf({ items: [still] }), "+5V");
    expect(rail.computed.typical).toBeCloseTo(432e-6, 12);
    expect(rail.computed.worst).toBeCloseTo(864e-6, 12);
    expect(rail.atRestA).toBe(0);
  });

  test("LEDs and pull-ups by Ohm's law, at rest only what is always lit", () => {
    const rail = railOf(powerOf({ items: [led, pullUp] }), "+5V");
    expect(rail.computed.typical).toBeCloseTo(2 * 0.003 + (8 * 0.5 * 4.7) / 4700, 9);
    expect(rail.computed.worst).toBeCloseTo(2 * 0.00325 + (8 * 4.95) / 4700, 9);
    expect(rail.atRestA).toBeCloseTo(0.006, 9);
  });

  test("an LED that needs more than the rail takes nothing", () => {
    expect(railOf(powerOf({ items: [{ ...led, forwardVolts: 9 }] }), "+5V").computed.worst).toBe(0);
  });

  test("what is not known is left out and told", () => {
    const { notes } = powerOf({ items: [packageItem(partNumbered("05"), 1, 6, PLAN), { ...led }] });
    expect(notes).toEqual(["No Cpd is known of 74HC05: what switches inside is left out."]);
    const unknown = powerOf({
      items: [packageItem(partNumbered("299"), 1, 1, { ...PLAN, family: { name: "LS", technology: "bipolar" } })],
    });
    expect(unknown.notes.join(" ")).toContain("No current at rest is known of 74LS299");
  });
});

describe("figures typed in for the whole board", () => {
  test("stand instead of the computed sum, which stays beside them", () => {
    const rail = railOf(powerOf({ items: [fixed(0.2)], typed: [{ rail: "+5V", typicalA: 0.15, worstA: 0.3 }] }), "+5V");
    expect(rail).toMatchObject({
      source: "typed",
      computed: { typical: 0.1, worst: 0.2 },
      taken: { typical: 0.15, worst: 0.3 },
    });
    expect(rail.atRestA).toBeCloseTo(0.15, 12);
  });

  test("say nothing of the current at rest where nothing is computed", () => {
    const rail = railOf(powerOf({ typed: [{ rail: "+5V", typicalA: 0.15, worstA: 0.3 }] }), "+5V");
    expect(rail).toMatchObject({ atRestA: 0, taken: { worst: 0.3 } });
  });
});

test("a negative rail heats as much as a positive one", () => {
  const minus = { name: "−12V", volts: -12, tolerancePercent: 5 };
  expect(powerOf({ items: [fixed(0.1, { rail: "−12V" })], rails: [minus] }).heatW.worst).toBeCloseTo(1.2, 12);
});

describe("a board that cannot be added up names its row", () => {
  test.each([
    ["an unknown rail", { items: [fixed(1), fixed(1, { rail: "+12V" })] }, "items/1: Display: there is no rail +12V"],
    ["a current below zero", { items: [fixed(-1)] }, "items/0"],
    ["a typical current above the worst", { items: [fixed(1, { typicalA: 2 })] }, "typical current is above the worst"],
    ["half a piece", { items: [fixed(1, { count: 0.5 })] }, "must be a whole number"],
    [
      "an LED without resistor",
      { items: [{ ...led, ohm: 0 }] },
      "items/0: The resistor of Power LED must be more than 0",
    ],
    ["an LED lit more than always", { items: [{ ...led, lit: { typical: 1, worst: 2 } }] }, "lit share is above 1"],
    ["a pull-up of no number", { items: [{ ...pullUp, ohm: NaN }] }, "is no number"],
    [
      "an efficiency of 0",
      { items: [{ ...linear("B", "+5V", "+3V", 3), type: { kind: "switching", efficiency: 0 } as const }] },
      "efficiency",
    ],
    ["a rail of 0 V", { rails: [{ name: "X", volts: 0, tolerancePercent: 5 }] }, "rails/0: X has no voltage"],
    ["a tolerance of 100 %", { rails: [{ name: "X", volts: 5, tolerancePercent: 100 }] }, "leaves no voltage"],
    ["a typed figure upside down", { typed: [{ rail: "+5V", typicalA: 2, worstA: 1 }] }, "typed/0"],
    ["a typed figure for no rail", { typed: [{ rail: "+6V", typicalA: 1, worstA: 1 }] }, "no rail +6V"],
  ])("%s", (_, change, message) => expect(faultOf(change)).toContain(message));
});
