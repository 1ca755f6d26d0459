import { describe, expect, it } from "vitest";
import { FAMILIES, fanOut, type Family, familyAt, findFamily, margins, marginsOverSupply } from "@/lib/calc/levels";

function family(name: string): Family {
  const found = findFamily(FAMILIES, name);
  if (!found) throw new Error(`no family ${name}`);
  return found;
}

const HC = family("HC");
/** Read in the same sheets as HC: its output at 20 µA. */
const HC_AT_20_UA: Family = { ...HC, vohMin: 4.4, volMax: 0.1, iohA: 20e-6, iolA: 20e-6 };
/** Read in the DM74LS00 and DM74LS08 sheets: another maker's input current. */
const LS_OTHER_MAKER: Family = { ...family("LS"), iilA: 0.36e-3 };

describe("the family table, read in data sheets (see check values 1a)", () => {
  it.each<[string, number, number, number, number, number, number]>([
    // name, VIH, VIL, VOH, VOL, IOH mA, IOL mA
    ["HC", 3.15, 1.35, 3.84, 0.33, 4, 4],
    ["HCT", 2.0, 0.8, 3.84, 0.33, 4, 4],
    ["AC", 3.15, 1.35, 3.76, 0.44, 24, 24],
    ["ACT", 2.0, 0.8, 3.76, 0.44, 24, 24],
    ["AHC", 3.15, 1.35, 3.8, 0.44, 8, 8],
    ["AHCT", 2.0, 0.8, 3.8, 0.44, 8, 8],
    ["LS", 2.0, 0.8, 2.7, 0.5, 0.4, 8],
    ["ALS", 2.0, 0.8, 2.5, 0.5, 0.4, 8],
    ["F", 2.0, 0.8, 2.5, 0.5, 1, 20],
    ["LVC", 3.15, 1.35, 3.8, 0.55, 24, 24],
    ["HCU", 3.6, 0.8, 4.0, 0.5, 0.02, 0.02],
  ])("%s", (name, vihMin, vilMax, vohMin, volMax, iohMa, iolMa) => {
    const { iohA, iolA, ...rest } = family(name);
    expect(rest).toMatchObject({ vihMin, vilMax, vohMin, volMax });
    expect([iohA * 1e3, iolA * 1e3].map((ma) => Number(ma.toFixed(6)))).toEqual([iohMa, iolMa]);
  });

  it.each(FAMILIES.map((one) => [one.name, one] as const))("%s says where its figures come from", (_, one) => {
    expect(one.source).toMatch(/^(Read in|All from memory)/);
    expect(one.source).toMatch(/from memory/i);
  });
});

describe("noise margins and fan-out, computed from the table", () => {
  it.each<[Family, Family, number, number, number | null]>([
    [HC, HC, 0.69, 1.02, 4000],
    [HC, family("LS"), 1.84, 0.47, 10],
    [HC, LS_OTHER_MAKER, 1.84, 0.47, 11],
    [HC, family("ALS"), 1.84, 0.47, 40],
    [HC, family("F"), 1.84, 0.47, 6],
    [family("HCT"), HC, 0.69, 1.02, 4000],
    [family("LS"), HC, -0.45, 0.85, 400],
    [family("LS"), family("HCT"), 0.7, 0.3, 400],
    [family("LS"), family("LS"), 0.7, 0.3, 20],
    [family("LS"), family("ALS"), 0.7, 0.3, 20],
    [family("LS"), family("F"), 0.7, 0.3, 13],
    [family("ALS"), HC, -0.65, 0.85, null],
    [family("F"), HC, -0.65, 0.85, null],
    [family("F"), family("LS"), 0.5, 0.3, 50],
    [family("F"), family("F"), 0.5, 0.3, 33],
    [family("AC"), family("LS"), 1.76, 0.36, 60],
    [family("AC"), family("F"), 1.76, 0.36, 40],
    [family("AHC"), family("LS"), 1.8, 0.36, 20],
    [family("LVC"), family("LS"), 1.8, 0.25, 60],
    [HC_AT_20_UA, HC, 1.25, 1.25, null],
  ])("$0.name drives $1.name", (driver, receiver, highVolts, lowVolts, loads) => {
    const verdict = highVolts < 0 || lowVolts < 0 ? "does not fit" : "fits";
    expect(margins(driver, receiver)).toMatchObject({ highVolts, lowVolts, verdict });
    if (loads !== null) expect(fanOut(driver, receiver).loads).toBe(loads);
  });

  it("read in the SN74HC00 sheet: an HC output drives up to 10 LS inputs; its low level binds", () => {
    expect(fanOut(HC, family("LS"))).toMatchObject({ loads: 10, low: 10, high: 200, binds: "low" });
  });

  it("LS into ALS is bound at high, LS into F at low, LS into LS at both", () => {
    expect(fanOut(family("LS"), family("ALS")).binds).toBe("high");
    expect(fanOut(family("LS"), family("F")).binds).toBe("low");
    expect(fanOut(family("LS"), family("LS")).binds).toBe("both");
  });

  it("from memory: a 4000B output drives no LS input at worst", () => {
    expect(fanOut(family("4000B"), family("LS")).loads).toBe(0);
  });

  it("even a typical LS high of 3.4 V is 0.1 V short of HC's threshold at 5.0 V", () => {
    const hcAt5 = familyAt(HC, 5);
    if (!hcAt5.ok) throw new Error(hcAt5.message);
    expect(hcAt5.value.vihMin).toBe(3.5);
    expect(margins({ ...family("LS"), vohMin: 3.4 }, hcAt5.value).highVolts).toBe(-0.1);
  });
});

describe("thresholds over the supply", () => {
  it.each<[string, number, number, number, string]>([
    ["HC", 5.5, 3.85, 1.65, "VIH read in note 5 of the MM74HC sheets"],
    ["HC", 6, 4.2, 1.8, "from memory"],
    ["AHC", 5.5, 3.85, 1.65, "read in the 74AHC04 sheet"],
    ["AHC", 3, 2.1, 0.9, "VIH read in the 74AHC04 sheet, VIL from memory"],
    ["HCT", 5.5, 2.0, 0.8, "read in the CD74HCT08 sheet: 4.5 to 5.5 V"],
    ["4000B", 10, 7, 3, "from memory"],
  ])("%s at %d V: VIH %d V, VIL %d V (%s)", (name, volts, vihMin, vilMax) => {
    expect(familyAt(family(name), volts)).toMatchObject({ ok: true, value: { volts, vihMin, vilMax } });
  });

  it("from memory: HC gives 5.34 V at 6 V, as far from its supply as at 4.5 V", () => {
    expect(familyAt(HC, 6)).toMatchObject({ value: { vohMin: 5.34, iohA: 4e-3 } });
  });

  it("from memory: AC at 3 V gives 12 mA; what is computed stays below that", () => {
    const found = familyAt(family("AC"), 3);
    expect(found).toMatchObject({ ok: true, value: { iohA: 10.666e-3, iolA: 10.666e-3 } });
  });

  it("one supply or two, note 5 of the MM74HC sheets: HC into HC has +0.69 V on one rail, −0.01 V on two", () => {
    const range = { minVolts: 4.5, maxVolts: 5.5 };
    expect(marginsOverSupply(HC, HC, range, "same")).toMatchObject({
      value: { highVolts: 0.69, lowVolts: 1.02, verdict: "fits" },
    });
    expect(marginsOverSupply(HC, HC, range, "separate")).toMatchObject({
      value: { highVolts: -0.01, lowVolts: 1.02, verdict: "does not fit" },
    });
  });
});
