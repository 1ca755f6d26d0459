import { describe, expect, it } from "vitest";
import { judge, probabilityInside, probabilityOutside, upperTail, type Accuracy } from "@/lib/calc/conformity";
import { parseLimits } from "@/lib/calc/units";

/** An instrument whose U (k = 2) is known as such. */
const uncertainty = (U: number): Accuracy => ({ percentOfReading: 0, counts: 1, resolution: U, percentOfRange: 0 });

describe("ILAC-G8:09/2019 §4.2: the guard band and the risk at the acceptance limit", () => {
  it.each([
    [0, 0.5],
    [1, 0.158655],
    [1.645, 0.049985],
    [1.96, 0.024998],
    [2, 0.02275],
    [3, 0.00135],
  ])("computed: a guard band of %d u lets %d pass falsely at most", (z, risk) => {
    expect(upperTail(z)).toBeCloseTo(risk, 6);
    expect(probabilityOutside(-z, 1, { upper: 0 })).toBeCloseTo(risk, 6);
    expect(probabilityOutside(z, 1, { lower: 0 })).toBeCloseTo(risk, 6);
  });

  it("computed: a guard band of 6 u lets 9.87e-10 pass, below the 1 ppm that its table gives for w = 3 U (table from memory)", () => {
    expect(upperTail(6) / 9.87e-10).toBeCloseTo(1, 3);
    expect(upperTail(6)).toBeLessThan(1e-6);
  });

  it("its table, from memory: w = 1.5 U keeps the risk under 0.16 %, w = 0.83 U (ISO 14253-1) under 5 %", () => {
    expect(upperTail(2 * 1.5)).toBeLessThan(0.0016);
    expect(upperTail(2 * 0.83)).toBeLessThan(0.05);
  });

  it("§4.2, as laboratories quote it: simple acceptance risks up to 50 %, w = U at most 2.5 %", () => {
    const limits = { unit: "V", upper: 5.25 } as const;
    const onLimit = {
      reading: { value: 5.25, unit: "V" },
      limits,
      accuracy: uncertainty(0.05),
      model: "limit",
    } as const;
    const simple = judge({ ...onLimit, rule: "simple" });
    expect(simple).toMatchObject({ verdict: "conforms", guardBand: 0, probabilityOfFalseAcceptance: 0.5 });
    const guarded = judge({ ...onLimit, rule: "guarded" });
    expect(guarded).toMatchObject({ verdict: "guard-band", guardBand: 0.05 });
    const onAcceptance = judge({ ...onLimit, reading: { value: 5.2, unit: "V" }, rule: "guarded" });
    expect(onAcceptance.verdict).toBe("conforms");
    expect(onAcceptance.probabilityOfFalseAcceptance).toBeCloseTo(0.02275, 6);
    expect(onAcceptance.probabilityOfFalseAcceptance).toBeLessThanOrEqual(0.025);
  });
});

describe("JCGM 106:2012: conformance probability", () => {
  it.each([
    [80, 0.8416],
    [90, 1.2816],
    [95, 1.6449],
    [99, 2.3263],
    [99.9, 3.0902],
  ])("Table 1 (computed; its rounded values from memory): %d %% conformance at z = %d", (percent, z) => {
    expect(probabilityInside(0, 1, { upper: z })).toBeCloseTo(percent / 100, 4);
  });

  it("ISO 14253-1:2017 (factor from memory): 1.65 u on one side gives 95 %", () => {
    expect(probabilityInside(0, 1, { upper: 1.65 })).toBeCloseTo(0.95, 2);
    expect(probabilityInside(0, 1, { upper: 1.65 })).toBeGreaterThanOrEqual(0.95);
    expect(probabilityInside(0, 1, { upper: 1.64 })).toBeLessThan(0.95);
  });

  it("§7.4 (inputs from memory, computed): TU −5.40 V, reading −5.47 V, u 0.05 V conforms with 92 %", () => {
    expect(probabilityInside(-5.47, 0.05, { upper: -5.4 })).toBeCloseTo(0.9192, 4);
  });

  it("lower limit (inputs from memory, computed): TL 490 kPa, reading 507 kPa, u 8.6 kPa conforms with 0.976", () => {
    expect(probabilityInside(507, 8.6, { lower: 490 })).toBeCloseTo(0.976, 4);
  });

  it("§7.5 (inputs from memory, computed): 12.5 … 16.3 mm²/s, reading 13.6, u 1.8 conforms with 0.6626: both tails count", () => {
    expect(probabilityInside(13.6, 1.8, { lower: 12.5, upper: 16.3 })).toBeCloseTo(0.6626, 4);
    const oneTail = probabilityInside(13.6, 1.8, { lower: 12.5 });
    expect(oneTail).toBeGreaterThan(0.72);
  });

  it.each([
    [5.15, 0.99991],
    [5.2, 0.96993],
    [5.22, 0.8703],
    [5.25, 0.5],
    [5.28, 0.1297],
  ])("computed: a rail of 4.75 … 5.25 V, u 0.0266 V, read as %d V conforms with %d", (value, probability) => {
    expect(probabilityInside(value, 0.0266, { lower: 4.75, upper: 5.25 })).toBeCloseTo(probability, 4);
    expect(probabilityOutside(value, 0.0266, { lower: 4.75, upper: 5.25 })).toBeCloseTo(1 - probability, 4);
  });

  it("computed: a tolerance narrower than the uncertainty has risk from both sides, even in its middle", () => {
    expect(probabilityOutside(5, 0.1, { lower: 4.9, upper: 5.1 })).toBeCloseTo(2 * 0.158655, 5);
  });

  it("guarded acceptance: a guard band above T/2 leaves an empty acceptance zone", () => {
    const limits = { unit: "V", lower: 4.9, upper: 5.1 } as const;
    const judged = judge({
      reading: { value: 5, unit: "V" },
      limits,
      rule: "guarded",
      accuracy: uncertainty(0.11),
      model: "limit",
    });
    expect(judged).toMatchObject({ verdict: "guard-band", acceptance: { empty: true } });
  });
});

describe("a published guide's example of the guarded rule: MPE 0.003 mm, U 0.001 mm", () => {
  const decide = (text: number) => {
    const parsed = parseLimits("≤ 0.003 mm");
    if (!parsed.ok) throw new Error(parsed.message);
    return judge({
      reading: { value: text, unit: "m" },
      limits: parsed.value,
      rule: "guarded",
      accuracy: uncertainty(1e-6),
      model: "limit",
    });
  };

  it("the acceptance limit is 0.002 mm", () => {
    expect(decide(0).acceptance.upper).toBeCloseTo(2e-6, 15);
    expect(decide(2e-6).verdict).toBe("conforms");
  });

  it("0.0017 mm conforms and 0.0025 mm is undecided", () => {
    expect(decide(1.7e-6).verdict).toBe("conforms");
    expect(decide(2.5e-6).verdict).toBe("guard-band");
    expect(decide(3.1e-6).verdict).toBe("does-not-conform");
  });
});
