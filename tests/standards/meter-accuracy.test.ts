import { describe, expect, it } from "vitest";
import {
  expandedUncertainty,
  maximumError,
  pickRange,
  standardUncertainty,
  type Accuracy,
} from "@/lib/calc/conformity";

const accuracy = (percentOfReading: number, counts: number, resolution: number): Accuracy => ({
  percentOfReading,
  counts,
  resolution,
  percentOfRange: 0,
});
const volts = (value: number) => ({ value, unit: "V" }) as const;

describe("a meter's ± (% of reading + counts)", () => {
  it.each<[string, number, Accuracy, number]>([
    ["read in a maker's note: 1 % + 3 counts, 120 V on the 600.0 V range", 120, accuracy(1, 3, 0.1), 1.5],
    ["read in a maker's note: 1 % + 2 counts, 100.0 V", 100, accuracy(1, 2, 0.1), 1.2],
    ["read in a maker's note: 0.5 % + 1 count, 1.755 V at 1 mV", 1.755, accuracy(0.5, 1, 0.001), 0.009775],
    ["computed: 0.5 % + 2 counts, 5.20 V at 10 mV", 5.2, accuracy(0.5, 2, 0.01), 0.046],
    ["computed: 0.5 % + 2 counts, 5.247 V at 1 mV", 5.247, accuracy(0.5, 2, 0.001), 0.028235],
    ["computed: 0.5 % + 2 counts, 0.050 V at 1 mV", 0.05, accuracy(0.5, 2, 0.001), 0.00225],
    ["computed: the same below zero", -0.05, accuracy(0.5, 2, 0.001), 0.00225],
  ])("%s", (_, value, meter, limit) => {
    expect(maximumError(volts(value), meter)).toBeCloseTo(limit, 12);
  });

  it("read in a maker's note: 100.0 V is between 98.8 and 101.2 V (a web page that prints 99.8 is in error)", () => {
    const limit = maximumError(volts(100), accuracy(1, 2, 0.1));
    expect(100 - limit).toBeCloseTo(98.8, 12);
    expect(100 + limit).toBeCloseTo(101.2, 12);
    expect(100 - limit).not.toBeCloseTo(99.8, 1);
  });

  it("read in a maker's note: 1.755 V is good to 0.010 V when rounded to its digits", () => {
    expect(maximumError(volts(1.755), accuracy(0.5, 1, 0.001)).toFixed(3)).toBe("0.010");
  });

  it("computed: 5.20 V is between 5.154 and 5.246 V", () => {
    const limit = maximumError(volts(5.2), accuracy(0.5, 2, 0.01));
    expect([5.2 - limit, 5.2 + limit].map((end) => end.toFixed(3))).toEqual(["5.154", "5.246"]);
  });

  it("computed: counts weigh most on small readings, 4.5 % of 0.050 V", () => {
    expect(maximumError(volts(0.05), accuracy(0.5, 2, 0.001)) / 0.05).toBeCloseTo(0.045, 12);
  });

  it("common practice: a count is that of the range in use, not of the reading as typed", () => {
    const ranges = [6, 60, 600].map((fullScale) => ({
      ...accuracy(1, 3, fullScale / 6000),
      unit: "V" as const,
      fullScale,
    }));
    const typedAs120 = pickRange(ranges, volts(120));
    expect(typedAs120?.resolution).toBeCloseTo(0.1, 12);
    expect(typedAs120 && maximumError(volts(120), typedAs120)).toBeCloseTo(1.5, 12);
  });
});

describe("GUM (JCGM 100:2008) §4.3.7, section from memory: a limit without a distribution is rectangular", () => {
  const meter = accuracy(0.5, 2, 0.01);

  it("computed: a limit of 0.046 V has u = 0.026558 V and U (k = 2) = 0.053116 V, more than the limit", () => {
    expect(standardUncertainty(volts(5.2), meter)).toBeCloseTo(0.026558, 6);
    expect(expandedUncertainty(volts(5.2), meter)).toBeCloseTo(0.053116, 6);
    expect(expandedUncertainty(volts(5.2), meter)).toBeGreaterThan(maximumError(volts(5.2), meter));
  });

  it("computed: taking the limit itself as U is another model and gives less", () => {
    expect(expandedUncertainty(volts(5.2), meter, "limit")).toBeCloseTo(0.046, 12);
    expect(standardUncertainty(volts(5.2), meter, "limit")).toBeCloseTo(0.023, 12);
  });
});
