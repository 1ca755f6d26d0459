import { describe, expect, it } from "vitest";
import type { Computed } from "@/lib/calc/computed";
import {
  type Line,
  ohmForRise,
  pullUpBehaviour,
  pullUpWindow,
  RISE_DEFINITIONS,
  type RiseDefinition,
  riseTimeS,
} from "@/lib/calc/pull-up";

function value<T>(answer: Computed<T>): T {
  if (!answer.ok) throw new Error(answer.message);
  return answer.value;
}

const plain = (text: string) => text.replaceAll("\u202f", " ");

/** A bus of UM10204: no leakage counted, levels of 0.7 VDD and 0.4 V. */
const bus = (volts: number, part: Partial<Line>): Line => ({
  supply: { minVolts: volts, maxVolts: volts },
  highVolts: 0.7 * volts,
  lowVolts: 0.4,
  sinkA: 3e-3,
  leakageA: 0,
  inputsHighA: 0,
  inputsLowA: 0,
  capacitancePf: 0,
  definition: "30–70 %",
  riseLimitS: null,
  tolerancePercent: 0,
  ...part,
});

describe("UM10204 §7.1, rise time of a bus line", () => {
  it("equation 1: from t1 = 0.3566749 RC to t2 = 1.2039729 RC is 0.8473 RC", () => {
    expect(value(riseTimeS(1000, 1000, "30–70 %"))).toBeCloseTo(0.8473e-6, 10);
    expect(1.2039729 - 0.3566749).toBeCloseTo(value(riseTimeS(1000, 1000, "30–70 %")) * 1e6, 6);
  });

  it("a data sheet that prints 0.4873 for 0.8473 is in error", () => {
    expect(value(riseTimeS(1000, 1000, "30–70 %")) * 1e6).not.toBeCloseTo(0.4873, 1);
  });

  it.each<[string, number, number, number]>([
    ["read in SLVA689 §4 as 1.77 kΩ: 300 ns, 200 pF", 300e-9, 200, 1770.33],
    ["computed: standard mode, 1000 ns (from memory), 400 pF", 1000e-9, 400, 2950.55],
    ["computed: fast mode, 300 ns (read in SLVA689), 400 pF", 300e-9, 400, 885.16],
    ["computed: fast mode plus, 120 ns (from memory), 550 pF", 120e-9, 550, 257.5],
  ])("Rp(max) = tr / (0.8473 Cb); %s", (_, riseS, pf, ohm) => {
    expect(value(ohmForRise(riseS, pf, "30–70 %"))).toBeCloseTo(ohm, 1);
    const window = value(pullUpWindow(bus(5, { sinkA: 20e-3, capacitancePf: pf, riseLimitS: riseS })));
    expect(window.maxBinds).toBe("rise time");
    expect(window.maxOhm).toBeCloseTo(ohm, 1);
  });

  it.each<[string, number, number, number]>([
    ["read in SLVA689 §4: 3.3 V, 3 mA", 3.3, 3e-3, 966.667],
    ["computed: 5 V, 3 mA", 5, 3e-3, 1533.33],
    ["computed: 5 V, 20 mA", 5, 20e-3, 230],
  ])("Rp(min) = (VDD − VOL) / IOL; %s", (_, volts, sinkA, ohm) => {
    expect(value(pullUpWindow(bus(volts, { sinkA }))).minOhm).toBeCloseTo(ohm, 2);
  });

  it("SLVA689's bus has 1 k, 1.2 k and 1.5 kΩ of E12 in its window", () => {
    const window = value(pullUpWindow(bus(3.3, { capacitancePf: 200, riseLimitS: 300e-9 })));
    if (window.verdict !== "fits") throw new Error(window.sentence);
    expect(window.values.E12).toEqual([1000, 1200, 1500]);
    expect(plain(window.sentence)).toBe(
      "A value between 967 Ω and 1.77 kΩ fits; E6: 1.5 kΩ rises in 254 ns (30–70 %).",
    );
  });

  it("computed: fast mode, 400 pF, 3.3 V and 3 mA have no solution, 885.2 Ω against 966.7 Ω", () => {
    const window = value(pullUpWindow(bus(3.3, { capacitancePf: 400, riseLimitS: 300e-9 })));
    expect(window.verdict).toBe("none");
    expect(plain(window.sentence)).toBe(
      "No value fits: the rise time of 300 ns (30–70 %) at 400 pF asks for at most 885 Ω, the output's 3 mA ask for at least 967 Ω.",
    );
  });
});

describe("open collectors, formulas of the DM74LS03 and DM74LS12 sheets, computed", () => {
  /** 4 LS05 outputs (100 µA each, read in 74LS05 sheets) and 3 LS inputs. */
  const wiredAnd = (part: Partial<Line>): Line => ({
    ...bus(5, {}),
    supply: { minVolts: 4.75, maxVolts: 5.25 },
    highVolts: 2.4,
    sinkA: 4e-3,
    leakageA: 4 * 100e-6,
    inputsHighA: 3 * 20e-6,
    inputsLowA: 3 * 0.4e-3,
    ...part,
  });

  it("Rmax = (4.75 − 2.4) V / 460 µA = 5108.7 Ω, and Rmin at 0.4 V and 4 mA is 1732.14 Ω", () => {
    const window = value(pullUpWindow(wiredAnd({})));
    expect(window.maxOhm).toBeCloseTo(5108.7, 1);
    expect(window.minOhm).toBeCloseTo(1732.14, 2);
    expect(window.maxBinds).toBe("leakage");
  });

  it("VOL and IOL are a pair: at 0.5 V and 8 mA Rmin is 698.53 Ω", () => {
    const { minOhm } = value(pullUpWindow(wiredAnd({ lowVolts: 0.5, sinkA: 8e-3 })));
    expect(minOhm).toBeCloseTo(698.53, 2);
  });

  it("the inputs' current burdens the output: 516.3 Ω, from sheets that add the magnitude, would be unsafe", () => {
    expect((5.25 - 0.5) / (8e-3 + 1.2e-3)).toBeCloseTo(516.3, 1);
    const { minOhm } = value(pullUpWindow(wiredAnd({ lowVolts: 0.5, sinkA: 8e-3 })));
    expect(minOhm).toBeGreaterThan(690);
  });

  it("8 open drains of 5 µA and 8 HC inputs at 4.5 V, level 3.15 V: Rmax 28 125 Ω", () => {
    const line = bus(4.5, { highVolts: 3.15, leakageA: 8 * 5e-6, inputsHighA: 8 * 1e-6 });
    expect(value(pullUpWindow(line)).maxOhm).toBeCloseTo(28_125, 3);
  });
});

describe("the edge of a pulled-up line, computed with a circuit simulator", () => {
  it.each<[number, number, RiseDefinition, number]>([
    [4700, 100, "10–90 %", 1032.7],
    [4700, 100, "30–70 %", 398.23],
    [1000, 150, "10–90 %", 329.58],
    [4700, 40, "10–90 %", 413.1],
    [4700, 50, "10–90 %", 516.3],
  ])("%d Ω and %d pF, %s: %d ns", (ohm, pf, definition, ns) => {
    expect(Math.abs(value(riseTimeS(ohm, pf, definition)) * 1e9 - ns)).toBeLessThan(0.06);
  });

  it("the time to half the supply is 325.78 ns for 4.7 kΩ and 100 pF", () => {
    const line = bus(5, { highVolts: 2.5, lowVolts: 0, capacitancePf: 100 });
    expect(value(pullUpBehaviour(line, 4700)).toHighS).toBeCloseTo(325.78e-9, 11);
  });

  it("the rule 2.2 RC is 0.13 % too long, and the two definitions lie 2.593 apart", () => {
    const exact = value(riseTimeS(1000, 150, "10–90 %"));
    expect(((2.2 * 1000 * 150e-12) / exact - 1) * 100).toBeCloseTo(0.13, 2);
    expect(exact / value(riseTimeS(1000, 150, "30–70 %"))).toBeCloseTo(2.593, 3);
  });

  it("RC: 2.19722, 1.38629 and 0.84730 time constants", () => {
    const factors = RISE_DEFINITIONS.map((definition) => value(riseTimeS(1000, 1000, definition)) * 1e6);
    expect(factors.map((factor) => factor.toFixed(5))).toEqual(["2.19722", "0.84730", "1.38629"]);
  });
});
