import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { formatLimits, parseLimits, UNITS, type Limits, type Unit } from "@/lib/calc/units";

function read(text: string, expected?: Unit): Limits {
  const parsed = parseLimits(text, expected);
  if (!parsed.ok) throw new Error(`“${text}” was refused: ${parsed.message}`);
  return parsed.value;
}

function refusal(text: string, expected?: Unit) {
  const parsed = parseLimits(text, expected);
  if (parsed.ok) throw new Error(`“${text}” was read as ${formatLimits(parsed.value)}`);
  expect(parsed.message).toMatch(new RegExp(`^Column ${parsed.column}: .+\\.$`, "u"));
  return parsed;
}

const written = (text: string, expected?: Unit) => formatLimits(read(text, expected)).replaceAll("\u202f", " ");

describe("limits are read as people write them", () => {
  it.each<[string, number, number, Unit]>([
    ["5 V ± 5 %", 4.75, 5.25, "V"],
    ["5 V ±5%", 4.75, 5.25, "V"],
    ["5V0 +/- 5%", 4.75, 5.25, "V"],
    ["5 V +10 % −5 %", 4.75, 5.5, "V"],
    ["5 V -5% +10%", 4.75, 5.5, "V"],
    ["5 V +10/−5 %", 4.75, 5.5, "V"],
    ["5 V +10 % −0", 5, 5.5, "V"],
    ["5 V ± 0.25 V", 4.75, 5.25, "V"],
    ["5 ± 0.25 V", 4.75, 5.25, "V"],
    ["(5 ± 0.25) V", 4.75, 5.25, "V"],
    ["5 V ± 250 mV", 4.75, 5.25, "V"],
    ["3.3 ± 0.1 kΩ", 3200, 3400, "Ω"],
    ["3.6864 MHz ± 50 ppm", 3_686_215.68, 3_686_584.32, "Hz"],
    ["−12 V ± 5 %", -12.6, -11.4, "V"],
    ["−12 V +10 % −5 %", -13.2, -11.4, "V"],
    ["−12 V +0.5 V −0.25 V", -12.25, -11.5, "V"],
    ["0 V ± 5 mV", -0.005, 0.005, "V"],
    ["4.75 … 5.25 V", 4.75, 5.25, "V"],
    ["4.75..5.25 V", 4.75, 5.25, "V"],
    ["4.75...5.25 V", 4.75, 5.25, "V"],
    ["4.75 - 5.25 V", 4.75, 5.25, "V"],
    ["4.75–5.25 V", 4.75, 5.25, "V"],
    ["4.75 to 5.25 V", 4.75, 5.25, "V"],
    ["4,75 … 5,25 V", 4.75, 5.25, "V"],
    ["5 V … 6", 5, 6, "V"],
    ["1 … 2 kΩ", 1000, 2000, "Ω"],
    ["200 Ω … 2 kΩ", 200, 2000, "Ω"],
    ["-12 - -10 V", -12, -10, "V"],
    ["1e-3 - 2e-3 A", 0.001, 0.002, "A"],
    ["40 % - 60 %", 40, 60, "%"],
    ["20 … 30 °C", 20, 30, "°C"],
    ["200m … 1.2 V", 0.2, 1.2, "V"],
    ["at least 3 V and at most 4 V", 3, 4, "V"],
    ["8 … 8", 8, 8, ""],
  ])("%s", (text, lower, upper, unit) => {
    expect(read(text)).toMatchObject({ lower, upper, unit });
  });

  it("keeps whether the limit itself is allowed", () => {
    expect(read("< 0.5 Ω")).toEqual({ unit: "Ω", upper: 0.5, upperInclusive: false });
    expect(read("<= 0.5 Ω")).toEqual({ unit: "Ω", upper: 0.5 });
    expect(read("0.5 Ω max")).toEqual({ unit: "Ω", upper: 0.5 });
    expect(read("> 1 MΩ")).toEqual({ unit: "Ω", lower: 1e6, lowerInclusive: false });
    expect(read("≥ 200", "Ω")).toEqual({ unit: "Ω", lower: 200 });
    expect(read("> 4.75 V, ≤ 5.25 V")).toEqual({ unit: "V", lower: 4.75, lowerInclusive: false, upper: 5.25 });
  });

  it("takes the unit of the field on both sides and in the tolerance", () => {
    expect(read("4.75 … 5.25", "V")).toMatchObject({ lower: 4.75, upper: 5.25, unit: "V" });
    expect(read("5 ± 0.25", "V")).toMatchObject({ lower: 4.75, upper: 5.25, unit: "V" });
    expect(read("10k..100k", "Ω")).toMatchObject({ lower: 10e3, upper: 100e3, unit: "Ω" });
  });

  it("works out bounds in decimal: 5 V ± 5 % ends at 5.25 and 3.3 V ± 10 % at 3.63", () => {
    expect(read("3.3 V ± 10 %")).toMatchObject({ lower: 2.97, upper: 3.63 });
    expect(read("0.1 V ± 0.2 V").upper).toBe(0.3);
    expect(read("1.1 V ± 3 %")).toMatchObject({ lower: 1.067, upper: 1.133 });
  });
});

describe("limits that mean nothing, or two things, are refused with their column", () => {
  it.each<[string, number, RegExp]>([
    ["", 1, /nothing was typed/],
    ["x", 1, /a number belongs here/],
    ["5 V", 4, /one value alone/],
    ["5 … 4 V", 1, /lower limit lies above/],
    ["200 … 2 kΩ", 1, /Write the unit after both/],
    ["1 kΩ … 2", 8, /write the unit after this value/],
    ["0 V ± 5 %", 7, /percentage of zero/],
    ["25 °C ± 5 %", 9, /two things/],
    ["50 % ± 5 %", 8, /two things/],
    ["10 kΩ ± 5", 9, /needs % or a unit/],
    ["5 V ± −5 %", 7, /no sign of its own/],
    ["5 V ±", 6, /a number is missing/],
    ["5 V +5 %", 9, /needs both sides/],
    ["5 V +5 % +10 %", 10, /needs both sides/],
    ["< OL Ω", 3, /a limit needs a number/],
    ["> 5 V, > 6 V", 8, /a lower limit already/],
    ["> 5 V, < 5 V", 3, /leave it out/],
    ["1 A … 2 V", 9, /amperes are expected here, not volts/],
    ["4 … 5 V … 6 V", 9, /not understood/],
    ["< ４ V", 3, /U\+FF14/],
  ])("%j", (text, column, sentence) => {
    const refused = refusal(text);
    expect(refused.message).toMatch(sentence);
    expect(refused.column).toBe(column);
  });

  it("takes 120 characters, not 121", () => {
    expect(read(`< 5${" ".repeat(116)}V`)).toMatchObject({ upper: 5 });
    expect(refusal(`< 5${" ".repeat(117)}V`).message).toMatch(/longer than 120/);
  });
});

describe("limits are written short, the way they were meant", () => {
  it.each([
    ["4.75..5.25 V", "4.75 … 5.25 V"],
    ["5.0 - 5.5 V", "5.0 … 5.5 V"],
    ["< 0.5 Ω", "< 0.5 Ω"],
    ["<= 500 mΩ", "≤ 0.5 Ω"],
    ["> 1 Mohm", "> 1 MΩ"],
    ["0.2 … 2 kΩ", "200 Ω … 2 kΩ"],
    ["0.4 … 2.4 V", "0.4 … 2.4 V"],
    ["5 V ±5%", "5 V ± 5 %"],
    ["5 V -5% +10%", "5 V +10 % −5 %"],
    ["5 V ± 5 mV", "5 V ± 5 mV"],
    ["5 V ± 250 mV", "5 V ± 0.25 V"],
    ["3.6864 MHz ± 50 ppm", "3.6864 MHz ± 50 ppm"],
    ["> 4.75 V and < 5.25 V", "> 4.75 V, < 5.25 V"],
    ["0 … 5 V", "0 … 5 V"],
    ["120 … 160 mA", "120 … 160 mA"],
  ])("%s is written %s", (typed, short) => {
    expect(written(typed)).toBe(short);
  });

  it("says so when there are none", () => {
    expect(formatLimits({ unit: "V" })).toBe("no limits");
  });
});

const number = fc
  .tuple(fc.integer({ min: -99_999, max: 99_999 }), fc.integer({ min: -14, max: 8 }))
  .map(([coefficient, exponent]) => (coefficient === 0 ? 0 : Number(`${coefficient}e${exponent}`)));
const amount = fc
  .tuple(fc.integer({ min: 0, max: 9999 }), fc.integer({ min: -3, max: 0 }))
  .map(([c, e]) => `${c}e${e}`);

/** Texts of every form of limits in a unit. */
function texts(unit: Unit) {
  const one = number.map((value) => `${value} ${unit}`);
  const share = unit === "°C" || unit === "dB" || unit === "%" ? fc.constant(unit) : fc.constantFrom("%", "ppm", unit);
  const deviation = fc.tuple(amount, share).map(([size, of]) => `${size} ${of}`);
  return fc.oneof(
    fc.tuple(fc.constantFrom("<", ">", "≤", "≥", "max"), one).map(([sign, value]) => `${sign} ${value}`),
    fc.tuple(one, one).map(([a, b]) => `${a} … ${b}`),
    fc
      .tuple(fc.constantFrom(">", "≥"), one, fc.constantFrom("<", "≤"), one)
      .map(([l, a, u, b]) => `${l} ${a}, ${u} ${b}`),
    fc.tuple(one, deviation).map(([nominal, both]) => `${nominal} ± ${both}`),
    fc.tuple(one, deviation, deviation).map(([nominal, plus, minus]) => `${nominal} +${plus} −${minus}`),
  );
}

const anyLimits = fc
  .constantFrom(...UNITS.map(({ unit }) => unit))
  .chain((unit) => texts(unit).map((text) => ({ text, unit })));

describe("whatever limits are typed", () => {
  it("are the same after being written and read again", () => {
    let kept = 0;
    fc.assert(
      fc.property(anyLimits, ({ text, unit }) => {
        const first = parseLimits(text, unit);
        if (!first.ok) return;
        kept += 1;
        expect(read(formatLimits(first.value), unit)).toEqual(first.value);
        expect(read(formatLimits(first.value))).toEqual(first.value);
      }),
      { numRuns: 3000 },
    );
    expect(kept).toBeGreaterThan(1000);
  });

  it("never have the lower limit above the upper one, nor a limit that is no number", () => {
    fc.assert(
      fc.property(anyLimits, ({ text, unit }) => {
        const parsed = parseLimits(text, unit);
        if (!parsed.ok) return;
        const { lower = -Infinity, upper = Infinity } = parsed.value;
        expect(lower <= upper).toBe(true);
        expect(parsed.value.unit).toBe(unit);
      }),
    );
  });

  it("never crash, and a refusal names a column", () => {
    const alphabet = [..."0123456789.,eE+-−–±…<>=≤≥/();%°ΩµkMmnRVAz to and max ppm\u202f∞OL😀"];
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom(...alphabet), maxLength: 130 }), (text) => {
        const parsed = parseLimits(text);
        if (!parsed.ok) expect(parsed.message.startsWith(`Column ${parsed.column}: `)).toBe(true);
        else expect([parsed.value.lower ?? 0, parsed.value.upper ?? 0].every(Number.isFinite)).toBe(true);
      }),
      { numRuns: 3000 },
    );
  });
});
