import { describe, expect, it } from "vitest";
import { formatLimits, formatQuantity, parseLimits, parseQuantity, type Unit } from "@/lib/calc/units";

/** ISO 80000-1 and the SI Brochure (9th edition); clauses from memory, not re-read. */
describe("ISO 80000-1 and the SI Brochure, from memory: quantities are written with", () => {
  it.each<[number, Unit, string]>([
    [1e-15, "F", "1\u202ffF"],
    [1e-12, "F", "1\u202fpF"],
    [1e-9, "F", "1\u202fnF"],
    [1e-6, "F", "1\u202f\u00b5F"],
    [1e-3, "F", "1\u202fmF"],
    [1, "Ω", "1\u202fΩ"],
    [1e3, "Ω", "1\u202fkΩ"],
    [1e6, "Ω", "1\u202fMΩ"],
    [1e9, "Ω", "1\u202fGΩ"],
    [1e12, "Ω", "1\u202fTΩ"],
  ])("the SI prefix: %d %s as %s", (value, unit, text) => {
    expect(formatQuantity({ value, unit })).toBe(text);
  });

  it("a space before the unit, °C and % included", () => {
    expect(formatQuantity({ value: 25, unit: "°C" })).toBe("25\u202f°C");
    expect(formatQuantity({ value: 5, unit: "%" })).toBe("5\u202f%");
  });

  it("a minus sign, not a hyphen", () => {
    expect(formatQuantity({ value: -12, unit: "V" })).toBe("\u221212\u202fV");
  });

  it("a comma or a point as decimal mark, and digits grouped by a small space only", () => {
    expect(parseQuantity("4,983 V")).toMatchObject({ ok: true, value: { value: 4.983 } });
    expect(parseQuantity("4.983 V")).toMatchObject({ ok: true, value: { value: 4.983 } });
    expect(parseQuantity("1\u202f000\u202f000 Hz")).toMatchObject({ ok: true, value: { value: 1e6 } });
    expect(parseQuantity("1,000,000 Hz").ok).toBe(false);
  });

  it("the unit after the parenthesis for both the value and its tolerance", () => {
    const parsed = parseLimits("(5,00 ± 0,25) V");
    expect(parsed).toMatchObject({ ok: true, value: { lower: 4.75, upper: 5.25 } });
    expect(parsed.ok && formatLimits(parsed.value)).toBe("5\u202fV ± 0.25\u202fV");
  });
});
