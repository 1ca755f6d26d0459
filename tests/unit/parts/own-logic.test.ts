import { describe, expect, it } from "vitest";
import { LOGIC_PARTS } from "@/lib/calc/logic-parts";
import { builtInName } from "@/lib/part/built-in-name";
import { functionChoices, knownFunctions, logicShape, ownLogic } from "@/lib/part/own-logic";
import { readGateLines, readPins, writeGateLines } from "@/lib/part/pin-lines";
import { EMPTY_LOGIC, typeLogic } from "@/lib/part/type-logic";
import { typedLogic } from "@/lib/part/typed-logic";

const NAND = {
  ...EMPTY_LOGIC,
  name: "Quad NAND",
  gateFunction: "nand2",
  gates: "1 2 > 3\n4 5 > 6\n9 10 > 8\n12 13 > 11",
  source: "Data sheet",
};

const fieldsOf = (given: object) => {
  const read = typedLogic.safeParse({ ...NAND, ...given });
  return Object.fromEntries(read.error?.issues.map(({ path, message }) => [path.join("."), message]) ?? []);
};

describe("pins as they are typed", () => {
  it("read with commas or blanks, and are refused beyond the package or twice", () => {
    expect(readPins("1, 2 13", 14)).toEqual({ ok: true, value: [1, 2, 13] });
    expect(readPins("1 15", 14)).toEqual({ ok: false, message: "Pin 15 is more than the 14 pins of the package." });
    expect(readPins("1 1", 14)).toEqual({ ok: false, message: "Pin 1 stands here twice." });
    expect(readPins("a", 14)).toMatchObject({ ok: false });
  });

  it("of gates say which inputs rest high, and name the line that is wrong", () => {
    const read = readGateLines("1^ 2 → 3\n\n4 5 > 6", 14);
    expect(read).toMatchObject({
      ok: true,
      value: [
        { inputs: [1, 2], outputs: [3], restHigh: [1] },
        { inputs: [4, 5], outputs: [6], restHigh: [] },
      ],
    });
    if (read.ok) expect(writeGateLines(read.value)).toBe("1^ 2 > 3\n4 5 > 6");
    expect(readGateLines("1 2 > 3\n4 5 6", 14)).toMatchObject({
      ok: false,
      message: expect.stringMatching(/^Line 2: /),
    });
  });
});

describe("own logic data", () => {
  it("of every built-in part can be typed and read again without a loss", () => {
    for (const { number, ...part } of LOGIC_PARTS) {
      const typed = typeLogic({ number, ...part });
      expect(typeLogic({ number, ...typedLogic.parse(typed) }), number).toEqual(typed);
    }
  });

  it("is refused where a pin does two things, or the lines are not as many as the gates", () => {
    expect(fieldsOf({ powerPins: "3" })).toEqual({ powerPins: "Pin 3 belongs to gate 1 already." });
    expect(fieldsOf({ gatesPerPackage: "3" })).toEqual({
      gates: "There are 4 lines for 3 gates. Write one line a gate, or none.",
    });
  });

  it("takes figures with their prefix only, and never a longest delay below the typical one", () => {
    const figures = {
      family: "HC",
      staticA: "20 µA",
      cpdPf: "22",
      cpdPer: "gate",
      tpdTypicalS: "9 ns",
      tpdMaxS: "7 ns",
      note: "",
    };
    expect(fieldsOf({ figures: [figures] })).toEqual({
      "figures.0.cpdPf": "22 is far too much. Write it such as 22 pF.",
      "figures.0.tpdMaxS": "The longest delay is below the typical one.",
    });
  });

  it("is counted with before the built-in part, until its part is archived", () => {
    const logic = logicShape.parse({ ...typedLogic.parse({ ...NAND, gateFunction: "majority3" }), number: "MAJ3" });
    const row = { number: "MAJ3", logic, archivedAt: null };
    expect(knownFunctions([row]).has("majority3")).toBe(true);
    expect(functionChoices(ownLogic([row]))[0]).toEqual({
      id: "majority3",
      label: "majority3",
      description: "4 in a MAJ3",
    });
    expect(knownFunctions([{ ...row, archivedAt: new Date() }]).has("majority3")).toBe(false);
  });
});

it("a number of the 74 series is known by its name in every family", () => {
  expect(["74HC00", "74LS00", "7400", "27C256", "74HC9999"].map(builtInName)).toEqual([
    "Quad 2-input NAND",
    "Quad 2-input NAND",
    "Quad 2-input NAND",
    undefined,
    undefined,
  ]);
});
