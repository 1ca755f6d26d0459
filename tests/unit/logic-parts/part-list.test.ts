import { describe, expect, test } from "vitest";
import { findPart, gateFunctionName, LOGIC_PARTS, partFor, partLabel, partsFor } from "@/lib/calc/logic-parts";

const byNumber = LOGIC_PARTS.map((part) => [part.number, part] as const);

describe.each(byNumber)("74%s", (_, part) => {
  const gates = part.pinout ?? [];

  test("names every pin of the package exactly once", () => {
    const named = [
      ...gates.flatMap((gate) => [...gate.inputs, ...gate.outputs]),
      ...part.sharedInputs,
      ...part.sharedOutputs,
      ...part.powerPins,
      ...part.groundPins,
      ...part.unconnectedPins,
    ].sort((a, b) => a - b);
    expect(named).toEqual(Array.from({ length: part.pins }, (_, index) => index + 1));
  });

  test("has as many gates, inputs and outputs as it says", () => {
    expect(gates).toHaveLength(part.gatesPerPackage);
    for (const gate of gates) {
      expect(gate.inputs).toHaveLength(part.inputsPerGate);
      expect(gate.outputs).toHaveLength(part.outputsPerGate);
      expect(gate.inputs).toEqual(expect.arrayContaining(gate.restHigh));
    }
  });

  test("has figures that a part of its kind can have", () => {
    for (const [family, figures] of Object.entries(part.perFamily)) {
      expect(["HC", "HCT", "LS"]).toContain(family);
      const known = [figures.staticA, figures.cpdPf, figures.tpdTypicalS].filter((figure) => figure !== null);
      for (const figure of known) expect(figure).toBeGreaterThan(0);
      if (figures.tpdMaxS !== null) expect(figures.tpdMaxS).toBeGreaterThan(figures.tpdTypicalS ?? 0);
      expect(figures.note).toMatch(/from memory|read/i);
    }
  });

  test("has a function with words for people", () => {
    expect(gateFunctionName(part.gateFunction)).not.toBe(part.gateFunction);
  });
});

test("no number is listed twice", () => {
  const numbers = LOGIC_PARTS.map((part) => part.number);
  expect(new Set(numbers).size).toBe(numbers.length);
  expect(numbers.length).toBeGreaterThanOrEqual(45);
});

test("the usual part for a function is the first listed, the project's own goes before it", () => {
  expect(partFor("nand2")?.number).toBe("00");
  expect(partFor("reg8-three-state")?.number).toBe("374");
  expect(partsFor("reg8-three-state").map((part) => part.number)).toEqual(["374", "574"]);
  const own = { ...LOGIC_PARTS[0], number: "1G00", gateFunction: "nand2", gatesPerPackage: 1 };
  const first = findPart("00");
  if (!first) throw new Error("the quad NAND is missing");
  expect(partFor("nand2", [{ ...first, ...own }])?.number).toBe("1G00");
  expect(partFor("teapot")).toBeUndefined();
  expect(gateFunctionName("teapot")).toBe("teapot");
  expect(gateFunctionName("constructor")).toBe("constructor");
});

test("bus drivers end in three states, wired gates in open drains", () => {
  for (const number of ["125", "240", "244", "245", "257", "374", "541", "573", "595"])
    expect(findPart(number)?.output).toBe("three-state");
  for (const number of ["03", "05", "06", "07"]) expect(findPart(number)?.output).toBe("open-drain");
});

test("a part is ordered by series, family and number; a name of the project's own stays as it is", () => {
  expect(partLabel({ number: "283" }, "HC")).toBe("74HC283");
  expect(partLabel({ number: "74" }, "LS")).toBe("74LS74");
  expect(partLabel({ number: "74HC4078" }, "HCT")).toBe("74HC4078");
  expect(partLabel({ number: "7400" }, "HC")).toBe("7400");
  expect(partLabel({ number: "QUAD-7" }, "HC")).toBe("QUAD-7");
});
