import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { parseQuantity, unitLabel, UNITS, type Unit } from "@/lib/calc/units";

function read(text: string, expected?: Unit) {
  const parsed = parseQuantity(text, expected);
  if (!parsed.ok) throw new Error(`“${text}” was refused: ${parsed.message}`);
  return { ...parsed.value, ...parsed.digits };
}

function refusal(text: string, expected?: Unit) {
  const parsed = parseQuantity(text, expected);
  if (parsed.ok) throw new Error(`“${text}” was read as ${parsed.value.value} ${parsed.value.unit}`);
  expect(parsed.message).toMatch(new RegExp(`^Column ${parsed.column}: .+\\.$`, "u"));
  return parsed;
}

describe("a quantity is read as people write it", () => {
  it.each<[string, number, Unit]>([
    ["2.2 µF", 2.2e-6, "F"],
    ["2.2 μF", 2.2e-6, "F"],
    ["2.2 uF", 2.2e-6, "F"],
    ["100nf", 100e-9, "F"],
    ["10 uh", 10e-6, "H"],
    ["4.98 V", 4.98, "V"],
    ["4,98 V", 4.98, "V"],
    ["4,983 V", 4.983, "V"],
    ["−12 V", -12, "V"],
    ["–12 V", -12, "V"],
    ["- 12 V", -12, "V"],
    ["+5", 5, ""],
    [".5 V", 0.5, "V"],
    ["5. V", 5, "V"],
    ["1e-3", 1e-3, ""],
    ["1E−3 V", 1e-3, "V"],
    ["3.3 kΩ", 3300, "Ω"],
    ["3.3 KΩ", 3300, "Ω"],
    ["3.3 k ohm", 3300, "Ω"],
    ["10 Mohm", 10e6, "Ω"],
    ["10 meg", 10e6, ""],
    ["10 \u2126", 10, "Ω"],
    ["47R", 47, "Ω"],
    ["25 °C", 25, "°C"],
    ["25 ° C", 25, "°C"],
    ["25 \u2103", 25, "°C"],
    ["−40 degC", -40, "°C"],
    ["10 Mhz", 10e6, "Hz"],
    ["32.768 kHz", 32768, "Hz"],
    ["20 mv", 0.02, "V"],
    ["12 ns", 12e-9, "s"],
    ["1 000", 1000, ""],
    ["1\u2009000\u202f000 Hz", 1e6, "Hz"],
    ["1\u00a0000.5 Ω", 1000.5, "Ω"],
    ["50 %", 50, "%"],
    ["−3 dB", -3, "dB"],
    ["5 mm", 0.005, "m"],
    ["5 cm", 0.05, "m"],
    ["5 m", 5, "m"],
    ["  5 V \r\n", 5, "V"],
  ])("%s", (text, value, unit) => {
    expect(read(text)).toMatchObject({ value, unit });
  });

  it("takes the unit of the field when none is typed", () => {
    expect(read("4.98", "V")).toMatchObject({ value: 4.98, unit: "V" });
    expect(read("4k7", "Ω")).toMatchObject({ value: 4700, unit: "Ω" });
    expect(read("100n", "F")).toMatchObject({ value: 100e-9, unit: "F" });
    expect(read("5m", "V")).toMatchObject({ value: 0.005, unit: "V" });
    expect(read("5m", "m")).toMatchObject({ value: 5, unit: "m" });
  });

  it("tells mega from milli by its capital", () => {
    expect(read("1 MΩ").value).toBe(1e6);
    expect(read("1 mΩ").value).toBe(1e-3);
  });

  it("gives the double that is nearest to the decimals typed, prefix and all", () => {
    expect(read("0.1 mV").value).toBe(0.0001);
    expect(read("4.35 kΩ").value).toBe(4350);
    expect(read("1.1 µs").value).toBe(0.0000011);
  });

  it("says what one count of the last digit is worth", () => {
    expect(read("4.98 V")).toMatchObject({ decimals: 2, resolution: 0.01 });
    expect(read("3.30 kΩ")).toMatchObject({ decimals: 2, resolution: 10 });
    expect(read("4k7")).toMatchObject({ decimals: 1, resolution: 100 });
    expect(read("5V0")).toMatchObject({ decimals: 1, resolution: 0.1 });
    expect(read("120 mA")).toMatchObject({ decimals: 0, resolution: 0.001 });
    expect(read("1.5e-3 V")).toMatchObject({ decimals: 1, resolution: 0.0001 });
  });

  it.each(["OL", "ol", "O.L", "0L", "overload", "∞", "open", "OL Ω", "OL MΩ", "+OL"])("%s is an overload", (text) => {
    expect(read(text, "Ω")).toEqual({ value: Infinity, unit: "Ω", decimals: 0, resolution: 0 });
  });

  it("keeps the sign of an overload, and never makes a zero negative", () => {
    expect(read("−OL V").value).toBe(-Infinity);
    expect(Object.is(read("-0.00 V").value, 0)).toBe(true);
  });
});

describe("what cannot be read is refused with its column", () => {
  it.each<[string, number, RegExp]>([
    ["", 1, /nothing was typed/],
    ["   ", 1, /nothing was typed/],
    ["V", 1, /a number belongs here/],
    ["−", 2, /a number is missing/],
    ["5 Q", 3, /no unit/],
    ["5 N", 3, /write n\./],
    ["5 S", 3, /seconds write s/],
    ["1.2.3", 4, /second decimal mark/],
    ["1,000.5", 6, /second decimal mark/],
    ["4k7.5", 4, /second decimal mark/],
    ["1 00", 3, /groups of three/],
    ["12 34 V", 4, /groups of three/],
    ["5 V 3", 5, /not understood/],
    ["5 V; 6 V", 4, /not understood/],
    ["5V0 A", 5, /says volts already/],
    ["4k7k", 4, /prefix too many/],
    ["5m", 2, /metres or milli/],
    ["5 mhz", 3, /milli or mega/],
    ["10 MOHM", 4, /milli or mega/],
    ["20 MA", 4, /write mA/],
    ["5 k°C", 3, /prefix/],
    ["1e99", 2, /powers of ten/],
    ["0.1234567890123456", 1, /15 digits/],
    ["5 \uff36", 3, /U\+FF36/],
    ["５", 1, /U\+FF15/],
    ["٥", 1, /U\+0665/],
    ["5\u0000", 2, /U\+0000/],
    ["🔌5 V", 1, /U\+1F50C/],
    ["5 V\n6 V", 4, /U\+000A/],
  ])("%j", (text, column, sentence) => {
    const refused = refusal(text);
    expect(refused.column).toBe(column);
    expect(refused.message).toMatch(sentence);
  });

  it("names the unit that the field wants", () => {
    expect(refusal("5 A", "V").message).toBe("Column 3: volts are expected here, not amperes.");
    expect(refusal("5 V", "").message).toBe("Column 3: a plain number is expected here, not volts.");
  });

  it("takes no overload where no instrument shows one", () => {
    expect(refusal("OL", "%").message).toMatch(/makes no sense for percent/);
    expect(refusal("∞", "").message).toMatch(/makes no sense/);
    expect(refusal("open", "V").message).toMatch(/makes no sense for volts/);
  });

  it("takes 40 characters, not 41, and far too many without a pause", () => {
    expect(read(`5${" ".repeat(38)}V`).value).toBe(5);
    expect(refusal(`5${" ".repeat(39)}V`).message).toMatch(/longer than 40/);
    const started = performance.now();
    refusal(" ".repeat(2_000_000));
    refusal(`1${" 000".repeat(500_000)}`);
    expect(performance.now() - started).toBeLessThan(1000);
  });
});

const bench = fc.string({
  unit: fc.constantFrom(..."0123456789.,eE+-−–±…<>=/();%°ΩµμkKMmunpfGTRVAFHzscdBg \u2009\u00a0∞OLto１😀\n"),
  maxLength: 45,
});

describe("whatever is typed", () => {
  const expected = fc.constantFrom(undefined, ...UNITS.map(({ unit }) => unit));

  it("never crashes, never gives NaN or −0, and a refusal names a column of the text", () => {
    fc.assert(
      fc.property(fc.oneof(bench, fc.string({ unit: "binary", maxLength: 60 })), expected, (text, unit) => {
        const parsed = parseQuantity(text, unit);
        if (!parsed.ok) {
          expect(parsed.message.startsWith(`Column ${parsed.column}: `)).toBe(true);
          expect(parsed.column).toBeGreaterThanOrEqual(1);
          expect(parsed.column).toBeLessThanOrEqual(Math.max(text.length + 1, 41));
          return;
        }
        expect(parsed.value.value).not.toBeNaN();
        expect(Object.is(parsed.value.value, -0)).toBe(false);
        if (unit !== undefined) expect(parsed.value.unit).toBe(unit);
        if (Number.isFinite(parsed.value.value)) expect(parsed.digits.resolution).toBeGreaterThan(0);
      }),
      { numRuns: 3000 },
    );
  });

  it("reads a larger number as a larger value", () => {
    const typed = fc.integer({ min: -1e6, max: 1e6 });
    fc.assert(
      fc.property(typed, typed, fc.constantFrom("n", "µ", "m", "", "k"), (a, b, prefix) => {
        const [first, second] = [a, b].map((value) => read(`${value / 1000} ${prefix}V`).value);
        expect(Math.sign((first ?? 0) - (second ?? 0))).toBe(Math.sign(a - b));
      }),
    );
  });
});

it("every unit has a name for the forms, and no two share one", () => {
  expect(unitLabel("V")).toBe("volts (V)");
  expect(unitLabel("")).toBe("plain number");
  expect(new Set(UNITS.map(({ label }) => label)).size).toBe(UNITS.length);
});
