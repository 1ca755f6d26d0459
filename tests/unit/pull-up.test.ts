import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Computed } from "@/lib/calc/computed";
import { FAMILIES, type Family, findFamily } from "@/lib/calc/levels";
import {
  inParallelOhm,
  judgePullUp,
  type Line,
  lineOf,
  OFFERED_SERIES,
  ohmForRise,
  pullUpBehaviour,
  pullUpWindow,
  RISE_DEFINITIONS,
  riseTimeS,
} from "@/lib/calc/pull-up";

function value<T>(answer: Computed<T>): T {
  if (!answer.ok) throw new Error(answer.message);
  return answer.value;
}

function family(name: string): Family {
  const found = findFamily(FAMILIES, name);
  if (!found) throw new Error(`no family ${name}`);
  return found;
}

const plain = (text: string) => text.replaceAll("\u202f", " ");

const line: Line = {
  supply: { minVolts: 4.75, maxVolts: 5.25 },
  highVolts: 3.325,
  lowVolts: 0.33,
  sinkA: 4e-3,
  leakageA: 40e-6,
  inputsHighA: 4e-6,
  inputsLowA: 4e-6,
  capacitancePf: 80,
  definition: "10–90 %",
  riseLimitS: null,
  tolerancePercent: 0,
};

const amps = (max: number) => fc.double({ min: 0, max, noNaN: true });
const anyLine: fc.Arbitrary<Line> = fc.record({
  supply: fc
    .tuple(fc.double({ min: 2, max: 6, noNaN: true }), fc.double({ min: 0, max: 0.5, noNaN: true }))
    .map(([minVolts, more]) => ({ minVolts, maxVolts: minVolts + more })),
  highVolts: fc.double({ min: 1, max: 4, noNaN: true }),
  lowVolts: fc.double({ min: 0, max: 0.6, noNaN: true }),
  sinkA: fc.double({ min: 1e-4, max: 0.03, noNaN: true }),
  leakageA: amps(2e-4),
  inputsHighA: amps(2e-4),
  inputsLowA: amps(5e-3),
  capacitancePf: fc.double({ min: 1, max: 1000, noNaN: true }),
  definition: fc.constantFrom(...RISE_DEFINITIONS),
  riseLimitS: fc.option(fc.double({ min: 1e-8, max: 1e-5, noNaN: true })),
  tolerancePercent: fc.double({ min: 0, max: 20, noNaN: true }),
});

describe("the window of a pull-up", () => {
  it("is never widened by more load: leakage, inputs, capacitance, or a coarser resistor", () => {
    const more = fc.record({ leak: amps(1e-4), high: amps(1e-4), low: amps(1e-3), pf: amps(500), tolerance: amps(10) });
    fc.assert(
      fc.property(anyLine, more, (light, { leak, high, low, pf, tolerance }) => {
        const heavy = {
          ...light,
          leakageA: light.leakageA + leak,
          inputsHighA: light.inputsHighA + high,
          inputsLowA: light.inputsLowA + low,
          capacitancePf: light.capacitancePf + pf,
          tolerancePercent: light.tolerancePercent + tolerance,
        };
        const [before, after] = [value(pullUpWindow(light)), value(pullUpWindow(heavy))];
        expect(after.maxOhm ?? Infinity).toBeLessThanOrEqual((before.maxOhm ?? Infinity) * (1 + 1e-12));
        expect(after.minOhm ?? Infinity).toBeGreaterThanOrEqual((before.minOhm ?? Infinity) * (1 - 1e-12));
        if (before.minOhm === null) expect(after.verdict).toBe("none");
      }),
    );
  });

  it("holds every value that it offers, and the recommended one does what was asked", () => {
    fc.assert(
      fc.property(anyLine, (any) => {
        const window = value(pullUpWindow(any));
        if (window.verdict === "none") return;
        const offered = OFFERED_SERIES.flatMap((series) => window.values[series]);
        expect(window.values[window.recommended.series]).toContain(window.recommended.ohm);
        for (const ohm of offered) {
          expect(ohm).toBeGreaterThanOrEqual(window.minOhm * (1 - 1e-11));
          expect(ohm).toBeLessThanOrEqual((window.maxOhm ?? Infinity) * (1 + 1e-11));
        }
        if (any.riseLimitS !== null) expect(window.recommended.riseS).toBeLessThanOrEqual(any.riseLimitS * (1 + 1e-11));
        const sunk = (any.supply.maxVolts - any.lowVolts) / window.recommended.ohm + any.inputsLowA;
        expect(sunk).toBeLessThanOrEqual(any.sinkA + 1e-9);
        expect(judgePullUp(any, window.recommended.ohm)).toMatchObject({ value: { verdict: "fits" } });
      }),
    );
  });

  it("leaves nothing between its ends out: just inside fits, just outside does not", () => {
    fc.assert(
      fc.property(anyLine, (any) => {
        const { minOhm, maxOhm } = value(pullUpWindow(any));
        if (minOhm === null || maxOhm === null || maxOhm < minOhm * 1.01) return;
        expect(judgePullUp(any, minOhm * 1.001)).toMatchObject({ value: { verdict: "fits" } });
        expect(judgePullUp(any, maxOhm * 0.999)).toMatchObject({ value: { verdict: "fits" } });
        expect(judgePullUp(any, minOhm * 0.999)).toMatchObject({ value: { verdict: "too small" } });
        expect(judgePullUp(any, maxOhm * 1.001)).toMatchObject({ value: { verdict: "too large" } });
      }),
    );
  });

  it("is told with a value from the drawer", () => {
    // (5.25 − 0.33) V / 3.996 mA = 1231 Ω; 1.425 V / 44 µA = 32 386 Ω; middle 6315 Ω.
    expect(plain(value(pullUpWindow(line)).sentence)).toBe(
      "A value between 1.24 kΩ and 32.3 kΩ fits; E6: 6.8 kΩ rises in 1.20 µs (10–90 %).",
    );
    expect(plain(value(pullUpWindow({ ...line, riseLimitS: 0.5e-6, capacitancePf: 100 })).sentence)).toBe(
      "A value between 1.24 kΩ and 2.27 kΩ fits; E6: 1.5 kΩ rises in 330 ns (10–90 %).",
    );
    const bare = { ...line, capacitancePf: 0, leakageA: 0, inputsHighA: 0 };
    expect(plain(value(pullUpWindow(bare)).sentence)).toBe("1.24 kΩ or more fits; E6: 3.3 kΩ takes 1.59 mA at low.");
  });

  it("falls back on a finer series when the coarse ones have nothing inside", () => {
    const window = value(pullUpWindow({ ...line, capacitancePf: 100, riseLimitS: 278e-9 }));
    if (window.verdict !== "fits") throw new Error(window.sentence);
    expect(window.maxOhm).toBeCloseTo(1265, 0);
    expect(window.values).toMatchObject({ E6: [], E12: [], E24: [], E48: [], E96: [1240] });
    expect(window.recommended).toMatchObject({ series: "E96", ohm: 1240 });
  });

  it("says why there is none", () => {
    const why = (part: Partial<Line>) => {
      const window = value(pullUpWindow({ ...line, ...part }));
      expect(window.verdict).toBe("none");
      return plain(window.sentence);
    };
    expect(why({ highVolts: 4.75 })).toBe("No resistor pulls the line to 4.75 V: the supply may be as low as 4.75 V.");
    expect(why({ inputsLowA: 4e-3 })).toBe(
      "No value fits: the inputs alone give 4 mA at low, and the output takes 4 mA.",
    );
    expect(why({ leakageA: 2e-3, inputsLowA: 0 })).toBe(
      "No value fits: 2 mA of leakage and input current at a level of 3.325 V ask for at most 711 Ω, the output's 4 mA ask for at least 1.23 kΩ.",
    );
    expect(why({ riseLimitS: 100e-9, inputsLowA: 1e-3 })).toBe(
      "No value fits: the rise time of 100 ns (10–90 %) at 80.0 pF asks for at most 568 Ω, the output's 4 mA, less 1 mA from the inputs, ask for at least 1.64 kΩ.",
    );
    expect(why({ capacitancePf: 100, riseLimitS: 271.5e-9 })).toMatch(
      /^Between 1\.2\d+ kΩ and 1\.2\d+ kΩ there is no value of E6 to E96\.$/,
    );
  });
});

describe("the resistance that a line has", () => {
  it("is judged with its figures", () => {
    const told = (ohm: number, part: Partial<Line> = {}) =>
      plain(value(judgePullUp({ ...line, ...part }, ohm)).sentence);
    expect(told(470)).toBe("With 470 Ω the output must take 10.5 mA at low; it takes 4 mA, so 1.24 kΩ at least.");
    expect(told(470, { inputsLowA: 5e-3 })).toBe(
      "With 470 Ω the output must take 15.5 mA at low; it takes 4 mA, and no resistor is large enough.",
    );
    expect(told(47_000)).toBe(
      "With 47 kΩ the line reaches only 2.682 V for leakage and input current; 3.325 V are wanted, so 32.3 kΩ at most.",
    );
    expect(told(10_000, { riseLimitS: 1e-6 })).toBe(
      "With 10 kΩ the line rises in 1.76 µs (10–90 %); 1.00 µs are allowed, so 5.68 kΩ at most.",
    );
    expect(told(4700)).toBe(
      "4.7 kΩ fits: the output's 4 mA, less 4 µA from the inputs, ask for at least 1.24 kΩ; 44 µA of leakage and input current at a level of 3.325 V ask for at most 32.3 kΩ.",
    );
    expect(told(1250, { tolerancePercent: 5 })).toBe(
      "With 1.25 kΩ ± 5 % the output must take 4.15 mA at low; it takes 4 mA, so 1.3 kΩ at least.",
    );
    expect(told(4700, { highVolts: 5 })).toBe(
      "With 4.7 kΩ the line reaches only 4.543 V for leakage and input current; 5 V are wanted.",
    );
  });

  it("of several resistors is theirs in parallel", () => {
    expect(inParallelOhm([4700, 4700])).toBeCloseTo(2350, 9);
    expect(inParallelOhm([1000])).toBe(1000);
    expect(inParallelOhm([])).toBeNull();
  });
});

describe("how a pulled-up line behaves", () => {
  it("takes current and power at low, and lets through a square wave by its rise", () => {
    const found = value(pullUpBehaviour({ ...line, leakageA: 0, inputsHighA: 0 }, 4700));
    expect(found.lowCurrentA).toBeCloseTo(5.25 / 4700, 12);
    expect(found.lowPowerW).toBeCloseTo(5.25 ** 2 / 4700, 12);
    // 4.7 kΩ · 80 pF · ln((4.75 − 0.33) / (4.75 − 3.325)) = 425.6 ns; computed.
    expect(found.toHighS).toBeCloseTo(425.6e-9, 10);
    expect(found.highestRateHz).toBeCloseTo(1 / (4 * 425.6e-9), -3);
  });

  it("is slower with a larger resistor, and never there when leakage holds it down", () => {
    const rates = [1500, 4700, 15_000, 30_000].map((ohm) => value(pullUpBehaviour(line, ohm)).highestRateHz ?? 0);
    expect(rates).toEqual([...rates].sort((a, b) => b - a));
    expect(value(pullUpBehaviour(line, 33_000))).toMatchObject({ toHighS: null, highestRateHz: null });
    expect(value(pullUpBehaviour({ ...line, capacitancePf: 0 }, 4700))).toMatchObject({ riseS: null, toHighS: null });
  });

  it("rises in the time that the resistor was chosen for, by any definition", () => {
    for (const definition of RISE_DEFINITIONS) {
      const ohm = value(ohmForRise(300e-9, 200, definition));
      expect(value(riseTimeS(ohm, 200, definition))).toBeCloseTo(300e-9, 15);
    }
  });
});

describe("the line of a net", () => {
  const conditions = {
    supply: { minVolts: 4.5, maxVolts: 5.5 },
    capacitancePf: 100,
    definition: "10–90 %",
    riseLimitS: null,
    tolerancePercent: 5,
    marginVolts: 0.2,
  } as const;

  it("takes the weakest output, the highest threshold, and the sum of all currents", () => {
    const outputs = [
      { family: family("HC"), count: 2 },
      { family: family("LS"), count: 1 },
    ];
    const inputs = [
      { family: family("HC"), count: 3 },
      { family: family("LS"), count: 2 },
    ];
    const found = value(lineOf(outputs, inputs, conditions));
    expect(found).toMatchObject({ lowVolts: 0.5, sinkA: 4e-3, supply: conditions.supply, tolerancePercent: 5 });
    expect(found.highVolts).toBeCloseTo(3.35, 12);
    expect(found.leakageA).toBeCloseTo(30e-6, 12);
    expect(found.inputsHighA).toBeCloseTo(43e-6, 12);
    expect(found.inputsLowA).toBeCloseTo(803e-6, 12);
  });

  it("without receivers wants the level of its outputs' own family; families that are counted 0 do not count", () => {
    const outputs = [
      { family: family("LS"), count: 1 },
      { family: family("HC"), count: 0 },
    ];
    const found = value(lineOf(outputs, [{ family: family("HC"), count: 0 }], { ...conditions, marginVolts: 0 }));
    expect(found).toMatchObject({ highVolts: 2, sinkA: 8e-3 });
  });

  it("needs an output and whole counts", () => {
    expect(lineOf([], [{ family: family("HC"), count: 1 }], conditions)).toEqual({
      ok: false,
      field: "outputs",
      message: "There is no output on the line to pull it low.",
    });
    expect(lineOf([{ family: family("HC"), count: -1 }], [], conditions)).toMatchObject({ ok: false, field: "count" });
  });
});

describe("a line that cannot be", () => {
  it.each<[Partial<Line>, string, string]>([
    [{ supply: { minVolts: 0, maxVolts: 5 } }, "minVolts", "The lowest supply must be more than 0."],
    [{ supply: { minVolts: 5, maxVolts: 4 } }, "minVolts", "The lowest supply lies above the highest."],
    [{ supply: { minVolts: 5, maxVolts: Number.NaN } }, "maxVolts", "The highest supply is no number."],
    [{ highVolts: -1 }, "highVolts", "The high level must be more than 0."],
    [{ lowVolts: -0.1 }, "lowVolts", "The low level must not be below 0."],
    [{ lowVolts: 3.325 }, "lowVolts", "The low level must lie below the high level."],
    [{ sinkA: 0 }, "sinkA", "The current of the output must be more than 0."],
    [{ leakageA: -1e-6 }, "leakageA", "The leakage must not be below 0."],
    [{ inputsHighA: -1e-6 }, "inputsHighA", "The current of the inputs at high must not be below 0."],
    [{ inputsLowA: -0.4e-3 }, "inputsLowA", "The current of the inputs at low must not be below 0."],
    [{ capacitancePf: -1 }, "capacitancePf", "The capacitance of the line must not be below 0."],
    [
      { capacitancePf: 0, riseLimitS: 1e-6 },
      "capacitancePf",
      "A limit for the rise time needs the capacitance of the line.",
    ],
    [{ riseLimitS: 0 }, "riseLimitS", "The rise time must be more than 0."],
    [{ tolerancePercent: 100 }, "tolerancePercent", "The tolerance of the resistor must be below 100 %."],
  ])("is refused with the field: %j", (part, field, message) => {
    const broken = { ...line, ...part };
    for (const answer of [pullUpWindow(broken), judgePullUp(broken, 4700), pullUpBehaviour(broken, 4700)]) {
      expect(answer).toEqual({ ok: false, field, message });
    }
  });

  it("and a resistor or a time of nothing", () => {
    const message = "The resistor must be more than 0.";
    expect(judgePullUp(line, 0)).toEqual({ ok: false, field: "ohm", message });
    expect(pullUpBehaviour(line, -1)).toEqual({ ok: false, field: "ohm", message });
    expect(riseTimeS(0, 100, "10–90 %")).toEqual({ ok: false, field: "ohm", message });
    expect(ohmForRise(0, 100, "10–90 %")).toMatchObject({ ok: false, field: "riseS" });
    expect(ohmForRise(1e-6, 0, "10–90 %")).toMatchObject({ ok: false, field: "capacitancePf" });
  });
});
