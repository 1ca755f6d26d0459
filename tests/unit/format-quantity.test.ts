import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { formatQuantity, parseQuantity, UNITS, type Digits, type Unit } from "@/lib/calc/units";

/** The written quantity with plain blanks, for reading here. */
const write = (value: number, unit: Unit, options?: Digits) =>
  formatQuantity({ value, unit }, options).replaceAll("\u202f", " ");

describe("a quantity is written with an engineering prefix", () => {
  it.each<[number, Unit, string]>([
    [4.98, "V", "4.98 V"],
    [1240, "Ω", "1.24 kΩ"],
    [0.12, "A", "120 mA"],
    [-12, "V", "−12 V"],
    [2.2e-6, "F", "2.2 µF"],
    [100e-9, "F", "100 nF"],
    [3.6864e6, "Hz", "3.6864 MHz"],
    [1e6, "Ω", "1 MΩ"],
    [999.9999996, "Ω", "1 kΩ"],
    [0, "V", "0 V"],
    [-0, "V", "0 V"],
    [1500, "°C", "1500 °C"],
    [12_345_678, "", "12345678"],
    [0.3 + 0.6, "V", "900 mV"],
    [20e6, "A", "20000 kA"],
    [1.5e22, "Ω", "1.5e22 Ω"],
    [Infinity, "Ω", "OL Ω"],
    [-Infinity, "V", "−OL V"],
    [NaN, "V", "—"],
  ])("%d %s is %s", (value, unit, text) => {
    expect(write(value, unit)).toBe(text);
  });

  it("writes significant digits, rolled over to the next prefix when they round up", () => {
    expect(write(0.053116, "V", { significant: 2 })).toBe("53 mV");
    expect(write(999.96, "Ω", { significant: 4 })).toBe("1.000 kΩ");
    expect(write(5, "V", { significant: 3 })).toBe("5.00 V");
  });

  it("writes digits after the mark", () => {
    expect(write(5, "V", { digits: 2 })).toBe("5.00 V");
    expect(write(-0.001, "°C", { digits: 1 })).toBe("0.0 °C");
  });

  it("ends where the instrument's digits ended, and writes no zero that was not read", () => {
    expect(write(5.2, "V", { resolution: 0.01 })).toBe("5.20 V");
    expect(write(0.5, "V", { resolution: 0.01 })).toBe("0.50 V");
    expect(write(0.5, "V", { resolution: 0.001 })).toBe("500 mV");
    expect(write(1200, "Ω", { resolution: 10 })).toBe("1.20 kΩ");
    expect(write(0.9999, "V", { resolution: 0.001 })).toBe("1.000 V");
    expect(write(0, "V", { resolution: 0.001 })).toBe("0.000 V");
  });
});

describe("writing and reading agree", () => {
  const units = fc.constantFrom(...UNITS.map(({ unit }) => unit));
  const decimals = fc
    .tuple(fc.integer({ min: -999_999, max: 999_999 }), fc.integer({ min: -20, max: 16 }))
    .map(([coefficient, exponent]) => (coefficient === 0 ? 0 : Number(`${coefficient}e${exponent}`)));

  it("six digits come back as they were, whatever the unit", () => {
    fc.assert(
      fc.property(decimals, units, (value, unit) => {
        const back = parseQuantity(formatQuantity({ value, unit }), unit);
        expect(back).toMatchObject({ ok: true, value: { value, unit } });
      }),
      { numRuns: 2000 },
    );
  });

  it("what was typed is shown with the digits that were typed", () => {
    const typed = fc.tuple(fc.integer({ min: -99_999, max: 99_999 }), fc.integer({ min: 0, max: 4 }));
    fc.assert(
      fc.property(typed, fc.constantFrom("n", "µ", "m", ""), ([count, places], prefix) => {
        const parsed = parseQuantity(`${(count / 10 ** places).toFixed(places)} ${prefix}V`);
        if (!parsed.ok) throw new Error(parsed.message);
        const back = parseQuantity(
          formatQuantity(parsed.value, parsed.digits.resolution > 0 ? { resolution: parsed.digits.resolution } : {}),
        );
        expect(back).toMatchObject({ ok: true, value: parsed.value });
        if (back.ok) expect(back.digits.resolution).toBe(parsed.digits.resolution);
      }),
    );
  });

  it("never writes NaN, −0, a hyphen for a minus, or nothing", () => {
    fc.assert(
      fc.property(
        fc.double(),
        units,
        fc.record({ digits: fc.double(), significant: fc.double(), resolution: fc.double() }, { requiredKeys: [] }),
        (value, unit, options) => {
          const text = formatQuantity({ value, unit }, options);
          expect(text).not.toMatch(/NaN|undefined|-/);
          expect(text).not.toMatch(/^−[0.]*(\u202f|$)/u);
          expect(text.length).toBeGreaterThan(0);
        },
      ),
      { numRuns: 2000 },
    );
  });
});
