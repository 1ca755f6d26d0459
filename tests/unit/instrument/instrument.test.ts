import { randomUUID } from "node:crypto";
import { describe, expect, it } from "vitest";
import { workedExample } from "@/components/instrument/worked-example";
import { EMPTY_RANGE, type TypedRange } from "@/lib/instrument/range-schema";
import { MAX_RANGES, saveInstrumentInput } from "@/lib/instrument/schema";

const METER: TypedRange = {
  unit: "V",
  fullScale: "20 V",
  resolution: "1 mV",
  percentOfReading: "0.5 %",
  counts: "2",
  percentOfRange: "0",
};

const save = (...ranges: TypedRange[]) =>
  saveInstrumentInput.safeParse({
    writeId: randomUUID(),
    instrument: "",
    name: "Bench meter",
    kind: "meter",
    calibrationNote: "",
    ranges,
  });

const complaints = (range: Partial<TypedRange>) =>
  save({ ...METER, ...range }).error?.issues.map((issue) => `${issue.path.join(".")}: ${issue.message}`) ?? [];

describe("a range of an instrument", () => {
  it("is read as the data sheet writes it", () => {
    expect(save(METER).data?.ranges).toEqual([
      { unit: "V", fullScale: 20, resolution: 0.001, percentOfReading: 0.5, counts: 2, percentOfRange: 0 },
    ]);
    expect(save({ ...METER, unit: "Ω", fullScale: "4k7", resolution: "0R1" }).data?.ranges[0]).toMatchObject({
      fullScale: 4700,
      resolution: 0.1,
    });
  });

  it.each<[keyof TypedRange, string]>([
    ["unit", "furlong"],
    ["fullScale", "wide"],
    ["fullScale", "0"],
    ["fullScale", "-20 V"],
    ["fullScale", "20 A"],
    ["fullScale", "OL"],
    ["resolution", "0"],
    ["resolution", "30 V"],
    ["percentOfReading", "101"],
    ["percentOfReading", "-1"],
    ["counts", "many"],
    ["percentOfRange", "5 V"],
  ])("with %s = %s is refused beside that field", (field, value) => {
    expect(complaints({ [field]: value }).join()).toContain(`ranges.0.${field}: `);
  });

  it("without any accuracy is refused: no instrument is exact", () => {
    expect(complaints({ percentOfReading: "0", counts: "0", percentOfRange: "0" }).join()).toContain("above zero");
  });

  it("is one of at most forty", () => {
    expect(save(...Array.from({ length: MAX_RANGES }, () => METER)).success).toBe(true);
    expect(save(...Array.from({ length: MAX_RANGES + 1 }, () => METER)).success).toBe(false);
  });

  it("left empty says what is missing and does not crash", () => {
    expect(save(EMPTY_RANGE).success).toBe(false);
  });
});

describe("the worked example", () => {
  it("says what ± (0.5 % + 2 counts) means at 5 V", () => {
    const example = workedExample({
      unit: "V",
      fullScale: 20,
      resolution: 0.001,
      percentOfReading: 0.5,
      counts: 2,
      percentOfRange: 0,
    });
    // a = 0.025 V + 0.002 V = 27 mV; U = 2a/√3 = 31 mV
    expect(example?.limitOfError).toBe("27\u202fmV");
    expect(example?.uncertainty).toBe("31\u202fmV");
    expect(example?.acceptance?.replaceAll("\u202f", " ")).toBe("4.781 V … 5.219 V");
  });

  it("says when the range is too coarse for limits of ± 5 %, and when no reading could conform", () => {
    const scope = { unit: "V", fullScale: 8, resolution: 0.03, percentOfReading: 0, counts: 0, percentOfRange: 1 };
    expect(workedExample(scope)).toMatchObject({ isCoarse: true, acceptance: expect.any(String) });
    expect(workedExample({ ...scope, percentOfRange: 5 })).toMatchObject({ isCoarse: true, acceptance: undefined });
  });

  it("is absent for a unit that is none", () => {
    expect(
      workedExample({ unit: "x", fullScale: 1, resolution: 1, percentOfReading: 1, counts: 0, percentOfRange: 0 }),
    ).toBeUndefined();
  });
});
