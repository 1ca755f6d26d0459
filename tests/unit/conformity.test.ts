import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  expandedUncertainty,
  judge,
  JudgementError,
  maximumError,
  pickRange,
  probabilityInside,
  probabilityOutside,
  shareOfTolerance,
  VERDICT_WORDS,
  verdictSentence,
  type Accuracy,
  type AccuracyRange,
  type DecisionRule,
} from "@/lib/calc/conformity";
import { parseLimits, parseQuantity, type Limits, type Unit } from "@/lib/calc/units";

function limits(text: string): Limits {
  const parsed = parseLimits(text);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.value;
}

function reading(text: string, unit?: Unit) {
  const parsed = parseQuantity(text, unit);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.value;
}

/** ± (0.5 % + 2 counts) on a range that resolves 10 mV. */
const meter: Accuracy = { percentOfReading: 0.5, counts: 2, resolution: 0.01, percentOfRange: 0 };
/** Exactly ± a, whatever the reading. */
const within = (a: number): Accuracy => ({ percentOfReading: 0, counts: 1, resolution: a, percentOfRange: 0 });

function verdict(text: string, of: string, rule: DecisionRule = "simple", accuracy?: Accuracy) {
  const allowed = limits(of);
  return judge({ reading: reading(text, allowed.unit), limits: allowed, rule, accuracy, model: "limit" }).verdict;
}

describe("a reading on a limit", () => {
  it("conforms when the limit is included", () => {
    expect(verdict("5.25 V", "5 V ± 5 %")).toBe("conforms");
    expect(verdict("4.75 V", "4.75 … 5.25 V")).toBe("conforms");
    expect(verdict("0.5 Ω", "≤ 0.5 Ω")).toBe("conforms");
    expect(verdict("−12.6 V", "−12 V ± 5 %")).toBe("conforms");
  });

  it("does not conform when the limit is left out", () => {
    expect(verdict("0.5 Ω", "< 0.5 Ω")).toBe("does-not-conform");
    expect(verdict("1 MΩ", "> 1 MΩ")).toBe("does-not-conform");
    const { sentences } = judge({ reading: reading("0.5 Ω"), limits: limits("< 0.5 Ω"), rule: "simple" });
    expect(sentences[0]?.replaceAll("\u202f", " ")).toBe("500 mΩ is on the limit, and < 0.5 Ω leaves the limit out.");
  });

  it("is not judged by rounding: 0.1 + 0.2 is neither above 0.3 nor below it", () => {
    const sum = { value: 0.1 + 0.2, unit: "V" } as const;
    expect(judge({ reading: sum, limits: limits("≤ 0.3 V"), rule: "simple" }).verdict).toBe("conforms");
    const belowSum = { unit: "V", upper: 0.1 + 0.2, upperInclusive: false } as const;
    expect(judge({ reading: reading("0.3 V"), limits: belowSum, rule: "simple" }).verdict).toBe("does-not-conform");
    const handMade = { unit: "V", lower: 5 - 5 * 0.999_999, upper: 1.1 * 1.1 * 5, nominal: 5 } as const;
    expect(judge({ reading: reading("0.000005 V"), limits: handMade, rule: "simple" }).verdict).toBe("conforms");
    expect(judge({ reading: reading("6.05 V"), limits: handMade, rule: "simple" }).verdict).toBe("conforms");
  });

  it("is told from one just inside and one just outside", () => {
    for (const nudge of [1e-3, 1e-6, 1e-9]) {
      expect(verdict(`${5.25 - nudge}`, "5 V ± 5 %")).toBe("conforms");
      expect(verdict(`${5.25 + nudge}`, "5 V ± 5 %")).toBe("does-not-conform");
      expect(verdict(`${4.75 + nudge}`, "5 V ± 5 %")).toBe("conforms");
      expect(verdict(`${4.75 - nudge}`, "5 V ± 5 %")).toBe("does-not-conform");
    }
  });
});

describe("the guard band", () => {
  it.each([
    ["5.15", "conforms"],
    ["5.149999999", "conforms"],
    ["5.150000001", "guard-band"],
    ["5.25", "guard-band"],
    ["5.250000001", "does-not-conform"],
    ["4.85", "conforms"],
    ["4.850000001", "conforms"],
    ["4.849999999", "guard-band"],
    ["4.75", "guard-band"],
    ["4.749999999", "does-not-conform"],
  ])("of 0.1 V inside 4.75 … 5.25 V: %s V is %s", (text, expected) => {
    expect(verdict(text, "4.75 … 5.25 V", "guarded", within(0.1))).toBe(expected);
  });

  it("does not arise under the simple rule", () => {
    expect(verdict("5.25 V", "4.75 … 5.25 V", "simple", within(0.1))).toBe("conforms");
  });

  it("does not arise without an accuracy, and a sentence says so", () => {
    const judged = judge({ reading: reading("5.25 V"), limits: limits("4.75 … 5.25 V"), rule: "guarded" });
    expect(judged).toMatchObject({ verdict: "conforms", guardBand: 0, tooCoarse: false });
    expect(judged.probabilityOfConformance).toBeUndefined();
    expect(judged.sentences).toContain(
      "The instrument's accuracy is not known, so nothing was held back at the limits.",
    );
  });

  it("leaves nothing to accept when it is wider than half the limits; at exactly half one value is left", () => {
    const wide = judge({
      reading: reading("5 V"),
      limits: limits("4.75 … 5.25 V"),
      rule: "guarded",
      accuracy: within(0.3),
      model: "limit",
    });
    expect(wide).toMatchObject({ verdict: "guard-band", tooCoarse: true, acceptance: { empty: true } });
    expect(wide.sentences.join(" ")).toMatch(/no reading can keep clear of both/);
    const half = judge({
      reading: reading("5 V"),
      limits: limits("4.75 … 5.25 V"),
      rule: "guarded",
      accuracy: within(0.25),
      model: "limit",
    });
    expect(half).toMatchObject({ verdict: "conforms", acceptance: { empty: false } });
  });
});

describe("an overload", () => {
  it("meets a limit that is open on its side, and no other", () => {
    expect(verdict("OL Ω", "> 1 MΩ")).toBe("conforms");
    expect(verdict("OL Ω", "≥ 1 MΩ", "guarded")).toBe("conforms");
    expect(verdict("OL Ω", "< 0.5 Ω")).toBe("does-not-conform");
    expect(verdict("OL Ω", "200 Ω … 2 kΩ")).toBe("does-not-conform");
    expect(verdict("−OL V", "< 5 V")).toBe("conforms");
    expect(verdict("−OL V", "> −12 V")).toBe("does-not-conform");
  });

  it("proves no more than the range holds", () => {
    const megohm = { reading: reading("OL Ω"), limits: limits("> 1 MΩ"), rule: "guarded" } as const;
    expect(judge({ ...megohm, accuracy: { ...meter, range: 6e6 } }).verdict).toBe("conforms");
    const short = judge({ ...megohm, accuracy: { ...meter, range: 600e3 } });
    expect(short).toMatchObject({ verdict: "guard-band", tooCoarse: true });
    expect(short.sentences[0]?.replaceAll("\u202f", " ")).toBe(
      "The range in use ends at 600 kΩ, so an overload does not show that the value lies above 1 MΩ: repeat with a larger range.",
    );
    expect(judge({ ...megohm, rule: "simple", accuracy: { ...meter, range: 600e3 } }).verdict).toBe("conforms");
  });
});

describe("what cannot be judged is refused", () => {
  const sound = { reading: reading("5 V"), limits: limits("≤ 6 V"), rule: "guarded" } as const;
  it.each<[string, Parameters<typeof judge>[0], string]>([
    ["a reading that is no number", { ...sound, reading: { value: NaN, unit: "V" } }, "reading"],
    ["no limit at all", { ...sound, limits: { unit: "V" } }, "limits"],
    ["a limit that is no number", { ...sound, limits: { unit: "V", upper: NaN } }, "limits"],
    ["limits the wrong way round", { ...sound, limits: { unit: "V", lower: 2, upper: 1 } }, "limits"],
    ["another unit than the limits'", { ...sound, reading: { value: 5, unit: "A" } }, "unit"],
    ["a negative accuracy", { ...sound, accuracy: { ...meter, counts: -1 } }, "accuracy"],
    ["an accuracy that is no number", { ...sound, accuracy: { ...meter, percentOfReading: NaN } }, "accuracy"],
    ["a percentage of an unknown range", { ...sound, accuracy: { ...meter, percentOfRange: 0.1 } }, "accuracy"],
  ])("%s", (_, measured, about) => {
    expect(() => judge(measured)).toThrow(JudgementError);
    expect(() => judge(measured)).toThrow(expect.objectContaining({ about }));
  });
});

describe("the range in use", () => {
  const range = (fullScale: number, unit: Unit = "V"): AccuracyRange => ({
    ...meter,
    unit,
    fullScale,
    resolution: fullScale / 6000,
  });
  const ranges = [range(60), range(0.6), range(6), range(6e6, "Ω"), range(600, "Ω")];

  it("is the smallest that holds the reading, on either side of zero and at its very end", () => {
    expect(pickRange(ranges, reading("5 V"))).toMatchObject({ fullScale: 6, resolution: 0.001, range: 6 });
    expect(pickRange(ranges, reading("−0.4 V"))?.fullScale).toBe(0.6);
    expect(pickRange(ranges, reading("6 V"))?.fullScale).toBe(6);
    expect(pickRange(ranges, reading("6.001 V"))?.fullScale).toBe(60);
  });

  it("is none when the reading is beyond all of them or in another unit", () => {
    expect(pickRange(ranges, reading("61 V"))).toBeUndefined();
    expect(pickRange(ranges, reading("1 A"))).toBeUndefined();
    expect(pickRange([], reading("1 V"))).toBeUndefined();
  });

  it("is the largest for an overload", () => {
    expect(pickRange(ranges, reading("OL Ω"))?.fullScale).toBe(6e6);
  });

  it("counts with its full scale where the accuracy has a percentage of range", () => {
    const found = pickRange([{ ...range(6), percentOfRange: 0.1 }], reading("5 V"));
    expect(found && maximumError(reading("5 V"), found)).toBeCloseTo(0.025 + 0.002 + 0.006, 12);
  });
});

describe("an instrument is too coarse above a quarter of the tolerance", () => {
  const coarse = (a: number, of: string) =>
    judge({
      reading: reading("0.1", limits(of).unit),
      limits: limits(of),
      rule: "simple",
      accuracy: within(a),
      model: "limit",
    }).tooCoarse;

  it("which for two limits is half their distance", () => {
    expect(shareOfTolerance(0.0625, limits("4.75 … 5.25 V"))).toBe(0.25);
    expect(coarse(0.0625, "4.75 … 5.25 V")).toBe(false);
    expect(coarse(0.0626, "4.75 … 5.25 V")).toBe(true);
  });

  it("which for one limit is the limit itself", () => {
    expect(coarse(0.125, "< 0.5 Ω")).toBe(false);
    expect(coarse(0.126, "< 0.5 Ω")).toBe(true);
    expect(shareOfTolerance(0.1, limits("≥ 0 V"))).toBeUndefined();
  });
});

describe("the sentences say what happened and what follows", () => {
  const said = (text: string, rule: DecisionRule, accuracy: Accuracy | undefined = meter) =>
    judge({ reading: reading(text), limits: limits("4.75 … 5.25 V"), rule, accuracy }).sentences.map((one) =>
      one.replaceAll("\u202f", " "),
    );

  it("when it conforms", () => {
    expect(said("4.98 V", "guarded")).toEqual([
      "4.98 V fits 4.75 … 5.25 V by more than the instrument's uncertainty of ±52 mV.",
      "The maker's limit of error at this reading is ±45 mV; U (k = 2) is ±52 mV.",
    ]);
  });

  it("when it lies in the guard band", () => {
    expect(said("5.22 V", "guarded")[0]).toBe(
      "5.22 V fits 4.75 … 5.25 V, but by less than the instrument's uncertainty of ±53 mV: repeat with a better instrument.",
    );
  });

  it("when it does not conform, and whether a better instrument may tell", () => {
    expect(said("5.28 V", "guarded").slice(0, 2)).toEqual([
      "5.28 V is 30 mV above the limit of 5.25 V.",
      "That is less than the instrument's uncertainty of ±54 mV: a better instrument may tell.",
    ]);
    expect(said("4.5 V", "guarded")[0]).toBe("4.5 V is 250 mV below the limit of 4.75 V.");
    expect(said("4.5 V", "guarded").join(" ")).not.toMatch(/may tell/);
  });

  it("when simple acceptance takes a risk", () => {
    expect(said("5.22 V", "simple")[1]).toBe("Accepted as read; the chance that the true value lies outside is 13 %.");
    expect(said("5 V", "simple").join(" ")).not.toMatch(/chance/);
  });

  it("when the instrument is too coarse", () => {
    expect(said("5 V", "guarded", within(0.1)).join(" ")).toMatch(/its uncertainty is 46 % of the tolerance/);
  });

  it("in the words of the interface", () => {
    expect(VERDICT_WORDS).toEqual({
      conforms: "conforms",
      "guard-band": "conforms, inside guard band",
      "does-not-conform": "does not conform",
    });
    expect(verdictSentence("guard-band")).toMatch(/repeat with a better instrument/);
  });
});

describe("for any reading, limits and instrument", () => {
  const finite = fc.double({ min: -1e6, max: 1e6, noNaN: true });
  const positive = fc.double({ min: 1e-9, max: 1e5, noNaN: true });
  const accuracies = fc.record({
    percentOfReading: fc.double({ min: 0, max: 10, noNaN: true }),
    counts: fc.integer({ min: 0, max: 100 }),
    resolution: fc.double({ min: 0, max: 10, noNaN: true }),
    percentOfRange: fc.double({ min: 0, max: 5, noNaN: true }),
    range: fc.double({ min: 0, max: 1e6, noNaN: true }),
  });
  const anyLimits = fc
    .tuple(finite, positive, fc.constantFrom("both", "lower", "upper"), fc.boolean(), fc.boolean())
    .map(([lower, width, sides, lowerInclusive, upperInclusive]): Limits => ({
      unit: "V",
      ...(sides === "upper" ? {} : { lower, lowerInclusive }),
      ...(sides === "lower" ? {} : { upper: lower + width, upperInclusive }),
    }));
  const measured = fc.record({
    reading: fc.record({
      value: fc.oneof(finite, fc.constantFrom(Infinity, -Infinity)),
      unit: fc.constant("V" as const),
    }),
    limits: anyLimits,
    accuracy: fc.option(accuracies, { nil: undefined }),
    rule: fc.constantFrom("simple" as const, "guarded" as const),
  });
  const rank = { "does-not-conform": 0, "guard-band": 1, conforms: 2 };

  it("there is a verdict, its sentences, and probabilities between 0 and 1 that add up", () => {
    fc.assert(
      fc.property(measured, (one) => {
        const judged = judge(one);
        expect(judged.sentences.length).toBeGreaterThan(0);
        expect(judged.sentences.join(" ")).not.toMatch(/NaN|undefined|Infinity/);
        const { probabilityOfConformance: inside, probabilityOfFalseAcceptance: outside } = judged;
        if (inside === undefined || outside === undefined) return;
        expect(Math.min(inside, outside)).toBeGreaterThanOrEqual(0);
        expect(inside + outside).toBeCloseTo(1, 9);
      }),
      { numRuns: 2000 },
    );
  });

  it("the guarded rule is never more lenient than the simple one, and both refuse the same readings", () => {
    fc.assert(
      fc.property(measured, (one) => {
        const guarded = judge({ ...one, rule: "guarded" }).verdict;
        const simple = judge({ ...one, rule: "simple" }).verdict;
        expect(rank[guarded]).toBeLessThanOrEqual(rank[simple]);
        expect(guarded === "does-not-conform").toBe(simple === "does-not-conform");
        expect(simple).not.toBe("guard-band");
      }),
    );
  });

  it("a coarser instrument never makes a verdict better, and its acceptance zone lies inside the finer one's", () => {
    fc.assert(
      fc.property(measured, accuracies, positive, (one, accuracy, more) => {
        fc.pre(Number.isFinite(one.reading.value));
        const fine = judge({ ...one, rule: "guarded", accuracy });
        const coarse = judge({
          ...one,
          rule: "guarded",
          accuracy: { ...accuracy, percentOfReading: accuracy.percentOfReading + more },
        });
        expect(rank[coarse.verdict]).toBeLessThanOrEqual(rank[fine.verdict]);
        expect(coarse.acceptance.lower ?? 0).toBeGreaterThanOrEqual(fine.acceptance.lower ?? 0);
        expect(coarse.acceptance.upper ?? 0).toBeLessThanOrEqual(fine.acceptance.upper ?? 0);
        expect(fine.acceptance.lower ?? 0).toBeGreaterThanOrEqual(one.limits.lower ?? 0);
      }),
    );
  });

  it("U by the rectangular model is 2/√3 of the maker's limit, and both grow with the reading", () => {
    fc.assert(
      fc.property(accuracies, positive, positive, (accuracy, size, more) => {
        const [small, large] = [size, size + more].map((value) => maximumError({ value, unit: "V" }, accuracy));
        expect(large ?? 0).toBeGreaterThanOrEqual(small ?? 0);
        const at = { value: size, unit: "V" } as const;
        expect(expandedUncertainty(at, accuracy)).toBeCloseTo(((small ?? 0) * 2) / Math.sqrt(3), 6);
        expect(expandedUncertainty(at, accuracy, "limit")).toBe(small);
      }),
    );
  });

  it("the risk grows as the reading nears a limit", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 10, noNaN: true }), fc.double({ min: 0, max: 10, noNaN: true }), (a, b) => {
        const [near, far] = [Math.max(a, b), Math.min(a, b)];
        expect(probabilityOutside(near, 1, { upper: 10 })).toBeGreaterThanOrEqual(
          probabilityOutside(far, 1, { upper: 10 }),
        );
        expect(probabilityInside(near, 1, { upper: 10 })).toBeLessThanOrEqual(probabilityInside(far, 1, { upper: 10 }));
      }),
    );
  });
});
