import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  FAMILIES,
  fanOut,
  type Family,
  familyAt,
  findFamily,
  inputStress,
  loadedEdge,
  loading,
  margins,
  marginsOverSupply,
  netLoad,
  pairWarnings,
  supplyRange,
} from "@/lib/calc/levels";

function family(name: string, volts?: number): Family {
  const found = findFamily(FAMILIES, name);
  if (!found) throw new Error(`no family ${name}`);
  if (volts === undefined) return found;
  const moved = familyAt(found, volts);
  if (!moved.ok) throw new Error(moved.message);
  return moved.value;
}

const plain = (text: string) => text.replaceAll("\u202f", " ");
const anyFamily = fc.constantFrom(...FAMILIES);
const burden = { inputs: [], offOutputs: [], pullUp: null };

describe("a family", () => {
  it("is found as people write it", () => {
    for (const name of ["HC", "hc", " 74HC ", "74hc"]) expect(findFamily(FAMILIES, name)?.name).toBe("HC");
    expect(findFamily(FAMILIES, "4000b")?.name).toBe("4000B");
    expect(findFamily(FAMILIES, "")).toBeUndefined();
    expect(findFamily(FAMILIES, "HCQ")).toBeUndefined();
  });

  it("of the project's own goes before the generic one of the same name", () => {
    const own = { ...family("HC"), source: "data sheet of the parts in the drawer" };
    expect(findFamily([own, ...FAMILIES], "HC")).toBe(own);
  });

  it("has a name of its own and figures that make sense", () => {
    expect(new Set(FAMILIES.map(({ name }) => name)).size).toBe(FAMILIES.length);
    for (const one of FAMILIES) {
      expect(one.vilMax).toBeLessThan(one.vihMin);
      expect(one.volMax).toBeLessThan(one.vohMin);
      expect(one.vohMin).toBeLessThanOrEqual(one.volts);
      expect(supplyRange(one).minVolts).toBeLessThanOrEqual(one.volts);
      expect(supplyRange(one).maxVolts).toBeGreaterThanOrEqual(one.volts);
      expect(margins(one, one)).toMatchObject({ verdict: "fits" });
    }
  });

  it("is refused at a supply that it is not made for, with its range", () => {
    const answer = familyAt(family("LS"), 3.3);
    expect(answer).toMatchObject({ ok: false, field: "volts" });
    expect(!answer.ok && plain(answer.message)).toBe(
      "The figures of LS hold from 4.75 V to 5.25 V, not at 3.3 V: enter those of the data sheet.",
    );
    expect(familyAt(family("HC"), 2.5).ok).toBe(false);
    expect(familyAt(family("HC"), 0)).toEqual({
      ok: false,
      field: "volts",
      message: "The supply must be more than 0.",
    });
    expect(familyAt(family("HC"), Number.NaN).ok).toBe(false);
  });

  it("of the project's own without a range moves by a tenth, or within 5 V ± 10 %", () => {
    const own = (volts: number): Family => ({ ...family("HC"), name: "own", volts, supply: undefined });
    expect(familyAt(own(4.5), 5.5).ok).toBe(true);
    expect(familyAt(own(4.5), 5.6).ok).toBe(false);
    expect(familyAt(own(3.3), 3).ok).toBe(true);
    expect(familyAt(own(3.3), 2.9).ok).toBe(false);
    const moved = familyAt(own(3.3), 3);
    expect(moved.ok && familyAt(moved.value, 2.9).ok).toBe(false);
  });

  it("asks no less of a driver and gives no less as the supply rises", () => {
    const at = fc.tuple(
      anyFamily,
      fc.double({ min: 0, max: 1, noNaN: true }),
      fc.double({ min: 0, max: 1, noNaN: true }),
    );
    fc.assert(
      fc.property(at, ([one, a, b]) => {
        const { minVolts, maxVolts } = supplyRange(one);
        const volts = (share: number) => Math.min(maxVolts, minVolts + share * (maxVolts - minVolts));
        const low = familyAt(one, volts(Math.min(a, b)));
        const high = familyAt(one, volts(Math.max(a, b)));
        if (!low.ok || !high.ok) throw new Error("inside the range");
        expect(high.value.vihMin).toBeGreaterThanOrEqual(low.value.vihMin);
        expect(high.value.vohMin).toBeGreaterThanOrEqual(low.value.vohMin);
        expect(high.value.iolA).toBeGreaterThanOrEqual(low.value.iolA);
      }),
    );
  });
});

describe("noise margins", () => {
  it("say what is given and what is wanted", () => {
    expect(plain(margins(family("LS"), family("HC")).sentence)).toBe(
      "An LS output gives 2.7 V at worst; the HC input wants 3.15 V.",
    );
    expect(plain(margins(family("HC"), family("LS")).sentence)).toBe(
      "An HC output drives the LS input with 1.84 V to spare at high and 470 mV at low.",
    );
    const weak = { ...family("HCT"), name: "own", volMax: 0.9 };
    expect(plain(margins(weak, family("LS")).sentence)).toBe(
      "An own output leaves 900 mV at worst; the LS input takes up to 800 mV as low.",
    );
  });

  it("fit at exactly nothing to spare", () => {
    expect(margins({ ...family("HC"), vohMin: 3.15, volMax: 1.35 }, family("HC"))).toMatchObject({
      highVolts: 0,
      lowVolts: 0,
      verdict: "fits",
    });
  });

  it("swap with the pair: what one direction loses the other gains", () => {
    fc.assert(
      fc.property(anyFamily, anyFamily, (a, b) => {
        const [there, back, aa, bb] = [margins(a, b), margins(b, a), margins(a, a), margins(b, b)];
        expect(there.highVolts - aa.highVolts).toBeCloseTo(bb.highVolts - back.highVolts, 9);
        expect(there.lowVolts - aa.lowVolts).toBeCloseTo(bb.lowVolts - back.lowVolts, 9);
      }),
    );
  });

  it("are never better on two supplies than on one", () => {
    fc.assert(
      fc.property(anyFamily, anyFamily, fc.integer({ min: 0, max: 25 }), (a, b, hundredths) => {
        const range = { minVolts: 5 - hundredths / 100, maxVolts: 5 + hundredths / 100 };
        const one = marginsOverSupply(a, b, range, "same");
        const two = marginsOverSupply(a, b, range, "separate");
        expect(two.ok).toBe(one.ok);
        if (!one.ok || !two.ok) return;
        expect(two.value.highVolts).toBeLessThanOrEqual(one.value.highVolts);
        expect(two.value.lowVolts).toBeLessThanOrEqual(one.value.lowVolts);
      }),
    );
  });

  it("tell which supply they were computed for", () => {
    const range = { minVolts: 4.5, maxVolts: 5.5 };
    const sentence = (supplies: "same" | "separate") => {
      const found = marginsOverSupply(family("HC"), family("HC"), range, supplies);
      return found.ok ? plain(found.value.sentence) : found.message;
    };
    expect(sentence("same")).toBe(
      "An HC output drives the HC input with 690 mV to spare at high and 1.02 V at low. Both cards hang on one supply.",
    );
    expect(sentence("separate")).toBe(
      "An HC output gives 3.84 V at worst; the HC input wants 3.85 V. The cards have separate supplies, anywhere from 4.5 V to 5.5 V.",
    );
  });

  it("over a supply that one family is not made for are refused", () => {
    const wide = { minVolts: 4.5, maxVolts: 5.5 };
    expect(marginsOverSupply(family("HC"), family("LS"), wide, "same")).toMatchObject({ ok: false, field: "volts" });
    expect(marginsOverSupply(family("HC"), family("HC"), { minVolts: 5, maxVolts: 4 }, "same")).toEqual({
      ok: false,
      field: "minVolts",
      message: "The lowest supply lies above the highest.",
    });
  });
});

describe("the load of an output", () => {
  it("is summed over families on both levels and shows what remains", () => {
    const found = loading(family("HC"), {
      ...burden,
      inputs: [
        { family: family("LS"), count: 2 },
        { family: family("HC"), count: 3 },
        { family: family("ALS"), count: 1 },
      ],
    });
    expect(found).toMatchObject({
      ok: true,
      value: { holds: true, low: { usedA: 0.903e-3, leftA: 3.097e-3 }, high: { usedA: 63e-6 } },
    });
    expect(found.ok && plain(found.value.sentence)).toBe(
      "An HC output is loaded with 0.063 of 4 mA at high and 0.903 of 4 mA at low.",
    );
  });

  it("counts switched-off outputs on both levels and a pull-up at low", () => {
    const found = loading(family("LS"), {
      inputs: [{ family: family("LS"), count: 10 }],
      offOutputs: [{ family: family("LS"), count: 12 }],
      pullUp: { ohm: 1000, supplyVolts: 5 },
    });
    expect(found).toMatchObject({
      value: { high: { usedA: 440e-6, holds: false }, low: { usedA: 8.74e-3, holds: false }, holds: false },
    });
    expect(found.ok && plain(found.value.sentence)).toBe(
      "An LS output is loaded too much on both levels: with 440 of 400 µA at high and 8.74 of 8 mA at low.",
    );
  });

  it("holds for exactly as many inputs as the fan-out says, and for no more", () => {
    fc.assert(
      fc.property(anyFamily, anyFamily, (driver, receiver) => {
        const { loads } = fanOut(driver, receiver);
        if (loads === null) throw new Error("all families take current");
        const holds = (count: number) => {
          const found = loading(driver, { ...burden, inputs: [{ family: receiver, count }] });
          return found.ok && found.value.holds;
        };
        expect(holds(loads)).toBe(true);
        expect(holds(loads + 1)).toBe(false);
      }),
    );
  });

  it("is counted in whole nanoamperes: 0.3 mA drives three inputs of 0.1 mA, though the computer divides to 2.9999", () => {
    expect(0.3e-3 / 0.1e-3).toBeLessThan(3);
    expect(fanOut({ ...family("LS"), iohA: 0.3e-3 }, { ...family("LS"), iihA: 0.1e-3 }).high).toBe(3);
    expect(fanOut({ ...family("LS"), iolA: 2.4e-3 }, family("LS")).low).toBe(6);
  });

  it("has no limit where inputs take no current", () => {
    const ideal = { ...family("HC"), name: "ideal", iihA: 0, iilA: 0 };
    expect(fanOut(family("HC"), ideal)).toMatchObject({ loads: null, binds: "nothing" });
    expect(fanOut(family("HC"), { ...ideal, iihA: 1e-6 })).toMatchObject({ loads: 4000, binds: "high" });
  });

  it.each<[Partial<Parameters<typeof loading>[1]>, string, string]>([
    [{ inputs: [{ family: family("LS"), count: -1 }] }, "count", "The number of LS pins must not be below 0."],
    [{ offOutputs: [{ family: family("LS"), count: 1.5 }] }, "count", "The number of LS pins must be a whole number."],
    [{ pullUp: { ohm: 0, supplyVolts: 5 } }, "pullUp", "The pull-up must be more than 0."],
    [{ pullUp: { ohm: 1000, supplyVolts: -5 } }, "supplyVolts", "The supply of the pull-up must not be below 0."],
  ])("is refused for figures that cannot be: %j", (part, field, message) => {
    expect(loading(family("HC"), { ...burden, ...part })).toEqual({ ok: false, field, message });
  });
});

describe("the capacitance of a net", () => {
  const net = { inputs: [], offOutputs: [], connectorPins: 0, pinPf: 3, furtherPf: 0 };

  it("adds inputs, switched-off outputs and connector pins", () => {
    const found = netLoad({
      inputs: [{ family: family("HC"), count: 4 }],
      offOutputs: [{ family: family("HC"), count: 3 }],
      connectorPins: 8,
      pinPf: 3,
      furtherPf: 12,
    });
    expect(found).toEqual({
      ok: true,
      value: { totalPf: 80, inputsPf: 14, outputsPf: 30, pinsPf: 24, furtherPf: 12 },
    });
  });

  it("is refused for counts and capacitances that cannot be", () => {
    expect(netLoad({ ...net, connectorPins: -1 })).toMatchObject({ ok: false, field: "connectorPins" });
    expect(netLoad({ ...net, pinPf: Number.NaN })).toMatchObject({ ok: false, field: "pinPf" });
    expect(netLoad({ ...net, furtherPf: -1 })).toMatchObject({ ok: false, field: "furtherPf" });
    expect(netLoad({ ...net, inputs: [{ family: family("HC"), count: 0.5 }] })).toMatchObject({ ok: false });
  });

  it("stretches the edge in proportion and delays the gate: 150 pF on an HC output", () => {
    const found = loadedEdge(family("HC"), 150);
    expect(found.ok && found.value.edgeS).toBeCloseTo(21e-9, 15);
    // 7 ns / (ln 9 · 50 pF) = 63.7 Ω; ln 2 · 63.7 Ω · 100 pF = 4.42 ns; computed.
    expect(found.ok && found.value.outputOhm).toBeCloseTo(63.72, 2);
    expect(found.ok && found.value.delayS).toBeCloseTo(11.4165e-9, 13);
    expect(found.ok && plain(found.value.sentence)).toBe(
      "An HC output with 150 pF has an edge of about 21 ns and a gate delay of about 11 ns.",
    );
  });

  it("is taken as 15 pF at least, since below that the edge is the output's own", () => {
    expect(loadedEdge(family("HC"), 3)).toMatchObject({ ok: true, value: { edgeS: expect.closeTo(2.1e-9, 15) } });
    const lightest = loadedEdge(family("HC"), 15);
    const bit = loadedEdge(family("HC"), 20);
    expect(lightest.ok && lightest.value.edgeS).toBeCloseTo(2.1e-9, 15);
    expect(bit.ok && bit.value.edgeS).toBeCloseTo(2.8e-9, 15);
  });

  it("never makes an edge quicker or a gate earlier by growing", () => {
    const load = fc.double({ min: 0, max: 10_000, noNaN: true });
    fc.assert(
      fc.property(anyFamily, load, load, (driver, a, b) => {
        const [light, heavy] = [loadedEdge(driver, Math.min(a, b)), loadedEdge(driver, Math.max(a, b))];
        if (!light.ok || !heavy.ok) throw new Error("loads are fine");
        expect(light.value.edgeS).toBeGreaterThan(0);
        expect(heavy.value.edgeS).toBeGreaterThanOrEqual(light.value.edgeS);
        expect(heavy.value.delayS ?? 0).toBeGreaterThanOrEqual(light.value.delayS ?? 0);
      }),
    );
  });

  it("says nothing of the delay of a family without one, and refuses an edge of nothing", () => {
    const found = loadedEdge({ ...family("HC"), tpdTypicalS: null }, 50);
    expect(found.ok && found.value.delayS).toBeNull();
    expect(found.ok && found.value.sentence).not.toContain("delay");
    expect(loadedEdge({ ...family("HC"), edgeS: 0 }, 50)).toMatchObject({ ok: false, field: "edgeS" });
    expect(loadedEdge(family("HC"), -1)).toMatchObject({ ok: false, field: "loadPf" });
  });
});

describe("families that meet", () => {
  const kinds = (driver: Family, receiver: Family) => pairWarnings(driver, receiver).map(({ kind }) => kind);

  it("5 V into an LVC input at 3.3 V is fine, into a plain CMOS input at 3.3 V it is not", () => {
    expect(inputStress(family("HC", 5), family("LVC 3.3 V", 3.3)).over).toBe(false);
    expect(inputStress(family("HC", 5), family("HC", 3.3))).toMatchObject({ over: true, bearsVolts: 3.8 });
    expect(plain(inputStress(family("HC", 5), family("HC", 3.3)).sentence)).toBe(
      "An HC output can reach 5 V; the HC input at 3.3 V bears 3.8 V.",
    );
    expect(kinds(family("HC", 5), family("HC", 3.3))).toEqual(["over-voltage"]);
  });

  it("on one supply nothing is over, whatever its tolerance", () => {
    for (const driver of FAMILIES.filter(({ volts }) => volts > 4)) {
      for (const receiver of FAMILIES.filter(({ volts }) => volts > 4)) {
        expect(inputStress(driver, receiver).over).toBe(false);
      }
    }
  });

  it("a bipolar output into a CMOS input wants a TTL-threshold part or a pull-up", () => {
    for (const name of ["LS", "ALS", "F", "S"]) {
      expect(kinds(family(name), family("HC"))).toEqual(["bipolar-into-cmos"]);
      expect(kinds(family(name), family("HCT"))).toEqual(["supply-current"]);
      expect(kinds(family(name), family("LS"))).toEqual([]);
    }
    expect(plain(pairWarnings(family("LS"), family("HC"))[0]?.mend ?? "")).toBe(
      "Take a receiver with TTL thresholds (HCT, ACT, AHCT), or a pull-up to 4.5 V.",
    );
  });

  it("CMOS into anything at 5 V is no trouble", () => {
    for (const receiver of ["HC", "HCT", "LS", "ALS", "F", "AC"])
      expect(kinds(family("HC"), family(receiver))).toEqual([]);
  });

  it("3.3 V logic into a 5 V CMOS input does not reach it", () => {
    expect(kinds(family("LVC 3.3 V", 3.3), family("HC", 5))).toEqual(["levels"]);
  });
});
