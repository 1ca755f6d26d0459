import { describe, expect, test } from "vitest";
import { canMate, connectorChoices, faceOf, findConnector, findPin, parsePin } from "@/lib/calc/connector";
import { face } from "../support/face";

describe("a connector of IEC 60603-2", () => {
  test("type C with 64 pins carries rows a and c and leaves row b of the body empty", () => {
    const connector = findConnector("din41612-c64");
    expect(connector?.rows.map((row) => row.name)).toEqual(["a", "c"]);
    expect(connector?.bodyRows).toBe(3);
    expect(connector?.rows.map((row) => row.offsetMm)).toEqual([0, 5.08]);
    expect(connector?.pins).toHaveLength(64);
  });

  test("type B with 64 pins has rows a and b side by side at 2.54 mm", () => {
    const connector = findConnector("din41612-b64");
    expect(connector?.rows.map((row) => row.offsetMm)).toEqual([0, 2.54]);
    expect(connector?.pins.at(-1)?.name).toBe("b32");
  });

  test("half sizes stop at position 16: B with 2 × 16, C with 3 × 16 and with rows a and c alone", () => {
    expect(face("din41612-b32").pins.map((pin) => pin.name)).toEqual(named(["a", "b"], 16));
    expect(face("din41612-c48").pins.map((pin) => pin.name)).toEqual(named(["a", "b", "c"], 16));
    expect(face("din41612-c32").pins.map((pin) => pin.name)).toEqual(named(["a", "c"], 16));
  });

  test("64 pins of type C plug into 96, type B into neither, a half size only into a half size", () => {
    expect(canMate(face("din41612-c64"), face("din41612-c96"))).toBe(true);
    expect(canMate(face("din41612-b64"), face("din41612-c64"))).toBe(false);
    expect(canMate(face("din41612-c48"), face("din41612-c96"))).toBe(false);
    expect(canMate(face("din41612-c48"), face("din41612-c32"))).toBe(true);
  });

  test("type C with 96 pins names them a1 to c32, each once", () => {
    const names = findConnector("din41612-c96")?.pins.map((pin) => pin.name) ?? [];
    expect(names[0]).toBe("a1");
    expect(names.at(-1)).toBe("c32");
    expect(new Set(names).size).toBe(96);
  });
});

test("a pin header counts across: 1 and 2 face each other, odd in one row", () => {
  const header = findConnector("header-2x5");
  expect(header?.pins.find((pin) => pin.name === "1")).toEqual({ name: "1", row: 0, position: 1 });
  expect(header?.pins.find((pin) => pin.name === "2")).toEqual({ name: "2", row: 1, position: 1 });
  expect(header?.pins.find((pin) => pin.name === "10")).toEqual({ name: "10", row: 1, position: 5 });
});

test("headers come in every length from 2 × 5 to 2 × 32 and in no other", () => {
  for (let n = 5; n <= 32; n += 1) expect(face(`header-2x${n}`).pins).toHaveLength(2 * n);
  expect(findConnector("header-2x4")).toBeUndefined();
  expect(findConnector("header-2x33")).toBeUndefined();
});

describe("a card edge", () => {
  test("of 2 × 22 counts 1 … 22 and letters A … Z without G, I, O and Q on the other side", () => {
    const edge = face("edge-2x22");
    const [numbers, letters] = [0, 1].map((row) => edge.pins.filter((pin) => pin.row === row).map((pin) => pin.name));
    expect(numbers).toEqual(Array.from({ length: 22 }, (_, at) => String(at + 1)));
    expect(letters?.join("")).toBe("ABCDEFHJKLMNPRSTUVWXYZ");
    expect(edge.pitchMm).toBe(3.96);
  });

  test("of 2 × 31 has A1 facing B1 and A31 facing B31", () => {
    const edge = face("edge-2x31");
    expect(edge.pins.find((pin) => pin.name === "A31")).toEqual({ name: "A31", row: 0, position: 31 });
    expect(edge.pins.find((pin) => pin.name === "B31")).toEqual({ name: "B31", row: 1, position: 31 });
  });
});

test("a face is found by its kind, an own grid by its rows", () => {
  const grid = { rows: ["a", "b"], positions: 4, pitchMm: 2 };
  expect(faceOf({ type: "din41612-b64", grid: null })?.pins).toHaveLength(64);
  expect(faceOf({ type: "grid", grid })?.pins.map((pin) => pin.name)).toEqual(named(["a", "b"], 4));
  expect(faceOf({ type: "grid", grid: null })).toBeUndefined();
  expect(faceOf({ type: "round plug", grid: null })).toBeUndefined();
});

test("every connector that is offered can be drawn", () => {
  for (const { id } of connectorChoices) expect(findConnector(id)?.pins.length).toBeGreaterThan(0);
  expect(findConnector("constructor")).toBeUndefined();
  expect(findConnector(null)).toBeUndefined();
});

describe("a pin as people write it", () => {
  test.each([
    ["J1 a4", { connector: "J1", pin: "a4" }],
    ["j1-A4", { connector: "J1", pin: "a4" }],
    ["J1.c32", { connector: "J1", pin: "c32" }],
    ["a4", { connector: undefined, pin: "a4" }],
    ["J2 pin 14", { connector: "J2", pin: "14" }],
    ["Z", { connector: undefined, pin: "z" }],
    ["X3 Z", { connector: "X3", pin: "z" }],
    ["X3 B31", { connector: "X3", pin: "b31" }],
    ["J2-J4", { connector: "J2", pin: "j4" }],
  ])("%s", (text, pin) => expect(parsePin(text)).toEqual(pin));

  test.each(["", "J1", "CLK", "a4 b5", "J1 a4444"])("“%s” is no pin", (text) => {
    expect(parsePin(text)).toBeUndefined();
  });

  test("is found on its own connector and on no other", () => {
    const connector = findConnector("din41612-c64");
    if (!connector) throw new Error("the connector is missing");
    expect(findPin(connector, "J1", "J1 c7")?.position).toBe(7);
    expect(findPin(connector, "J1", "J2 c7")).toBeUndefined();
    expect(findPin(connector, "J1", "b7")).toBeUndefined();
  });

  test("is found in the connector's own writing, small or capital", () => {
    expect(findPin(face("edge-2x22"), "P1", "P1 z")?.name).toBe("Z");
    expect(findPin(face("edge-2x22"), "P1", "17")?.name).toBe("17");
    expect(findPin(face("edge-2x22"), "P1", "G")).toBeUndefined();
    expect(findPin(face("edge-2x31"), "P1", "b31")?.name).toBe("B31");
  });

  test("of a row that looks like a reference is still found on the face that has it", () => {
    const own = faceOf({ type: "grid", grid: { rows: ["J"], positions: 4, pitchMm: 2.54 } });
    if (!own) throw new Error("the grid cannot be drawn");
    expect(findPin(own, "X1", "J4")?.name).toBe("J4");
    expect(findPin(own, "X1", "X1 J4")?.name).toBe("J4");
  });
});

function named(rows: readonly string[], positions: number): string[] {
  return rows.flatMap((row) => Array.from({ length: positions }, (_, at) => `${row}${at + 1}`));
}
