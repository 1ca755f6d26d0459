import { describe, expect, it } from "vitest";
import { parseQuantity, type Unit } from "@/lib/calc/units";

/** IEC 60062, letter and digit code; examples from memory, not re-read. */
describe("IEC 60062, from memory: a letter stands for the decimal mark", () => {
  it.each<[string, Unit, number]>([
    ["R47", "Ω", 0.47],
    ["0R5", "Ω", 0.5],
    ["4R7", "Ω", 4.7],
    ["47R", "Ω", 47],
    ["4K7", "Ω", 4700],
    ["4k7", "Ω", 4700],
    ["3k3 ohm", "Ω", 3300],
    ["47K", "Ω", 47_000],
    ["4M7", "Ω", 4.7e6],
    ["2G2", "Ω", 2.2e9],
    ["1T0", "Ω", 1e12],
    ["p33", "F", 0.33e-12],
    ["3p3", "F", 3.3e-12],
    ["n33", "F", 0.33e-9],
    ["2n2", "F", 2.2e-9],
    ["100n", "F", 100e-9],
    ["2u2", "F", 2.2e-6],
    ["4µ7", "F", 4.7e-6],
    ["4m7", "F", 4.7e-3],
  ])("%s in %s is %d", (text, unit, value) => {
    expect(parseQuantity(text, unit)).toMatchObject({ ok: true, value: { value, unit } });
  });

  it("common practice, no source: the same with V and A, as on schematics", () => {
    expect(parseQuantity("5V0")).toMatchObject({ ok: true, value: { value: 5, unit: "V" } });
    expect(parseQuantity("3V3")).toMatchObject({ ok: true, value: { value: 3.3, unit: "V" } });
    expect(parseQuantity("1A5")).toMatchObject({ ok: true, value: { value: 1.5, unit: "A" } });
  });
});
