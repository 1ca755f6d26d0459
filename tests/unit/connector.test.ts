import { describe, expect, test } from "vitest";
import { connectorChoices, findConnector, findPin, parsePin } from "@/lib/calc/connector";

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
});
