import { describe, expect, it } from "vitest";
import { FAMILIES } from "@/lib/calc/levels";
import { familiesOf } from "@/lib/family/families-of";
import { FIGURE_NAMES, writeFigure } from "@/lib/family/figure-list";
import { saveFamilyInput } from "@/lib/family/schema";
import { SHEET, type DataSheet } from "../support/data-sheet";

const HEAD = {
  project: "tide",
  writeId: "0d0f6a5e-6c7b-4a54-9d2c-0a4b7f1f0001",
  familyId: "",
  version: 0,
  name: "HCX",
  technology: "CMOS",
  source: "Maker B, p. 12",
};
const read = (typed: Partial<DataSheet>) => saveFamilyInput.safeParse({ ...HEAD, typed: { ...SHEET, ...typed } });
const problems = (typed: Partial<DataSheet>) =>
  Object.fromEntries((read(typed).error?.issues ?? []).map(({ path, message }) => [path.join("."), message]));

describe("a slip in a data sheet is told at its figure", () => {
  it.each([
    [{ iohA: "4" }, "iohA", /4\sA is too much for logic\. Write it with its unit, as in 4 mA/],
    [{ tpdTypicalS: "9" }, "tpdTypicalS", /9\ss is too much for logic/],
    [{ vihMin: "high" }, "vihMin", /a number belongs here/],
    [{ iolA: "4 V" }, "iolA", /not volts/],
    [{ edgeS: "" }, "edgeS", /Copy the figure from the data sheet/],
    [{ edgeS: "0 ns" }, "edgeS", /must be more than 0/],
    [{ vilMax: "3.5 V" }, "vilMax", /VIL lies below VIH/],
    [{ volMax: "4 V" }, "volMax", /VOL lies below VOH/],
    [{ vohMin: "4.6 V" }, "vohMin", /No output gives more than its supply/],
    [{ minVolts: "4.5 V" }, "maxVolts", /Give both ends/],
    [{ minVolts: "5 V", maxVolts: "5.5 V" }, "volts", /outside the range/],
    [{ minVolts: "5.5 V", maxVolts: "5 V" }, "maxVolts", /ends below where it begins/],
  ])("%o", (typed, name, sentence) => {
    expect(problems(typed)[`typed.${name}`]).toMatch(sentence);
  });

  it("several slips are told at once", () => {
    expect(Object.keys(problems({ edgeS: "", vihMin: "x" })).sort()).toEqual(["typed.edgeS", "typed.vihMin"]);
  });
});

describe("a family's figures", () => {
  it("are read as they are written on screen: every built-in family comes back", () => {
    for (const { name, supply, ...figures } of FAMILIES) {
      const stored = { ...figures, minVolts: supply?.minVolts, maxVolts: supply?.maxVolts };
      const typed = Object.fromEntries(FIGURE_NAMES.map((one) => [one, writeFigure(one, stored[one])]));
      const back = saveFamilyInput.safeParse({ ...HEAD, ...{ technology: figures.technology, source: "s" }, typed });
      expect(back.error?.issues ?? []).toEqual([]);
      const { source: _theirs, ...rest } = figures;
      expect(back.data?.figures, name).toMatchObject({ ...rest, ...(supply ? { supply } : {}) });
    }
  });

  it("of one's own stand for the built-in ones of the same name, however it is spelt", () => {
    const [first] = FAMILIES;
    const { name: _name, ...figures } = first ?? { name: "" };
    const all = familiesOf([{ name: "74hc", figures: { ...figures, vohMin: 4 } }]);
    expect(all.filter(({ name }) => /^(74)?hc$/i.test(name)).map(({ name, vohMin }) => [name, vohMin])).toEqual([
      ["74hc", 4],
    ]);
    expect(all).toHaveLength(FAMILIES.length);
  });
});
