import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { findConnector } from "@/lib/calc/connector";
import { EMPTY_TEXTS, type PinTexts } from "@/lib/pin-map/pin-columns";
import { impliedRole, readRole } from "@/lib/pin-map/pin-role";
import { readCell } from "@/lib/pin-map/read-cell";
import { pinTexts, readPinRow } from "@/lib/pin-map/read-pin-row";
import { readPinRows } from "@/lib/pin-map/read-pin-rows";

const known = { families: ["HC", "HCT", "LS", "HC3V3"], rails: ["+5V", "VREF"] };
const row = (texts: Partial<PinTexts>) => readPinRow("a10", { ...EMPTY_TEXTS, ...texts }, known);
const wrong = (texts: Partial<PinTexts>) => {
  const read = row(texts);
  return read.ok ? [] : read.problems.map(({ sentence }) => sentence);
};

describe("a row of a pin map", () => {
  test("is read as people write it", () => {
    const typed = {
      signal: " FAULT_N ",
      role: "OC",
      family: "hct",
      loads: "2",
      enableGroup: "SUM_SEL",
      pullUpOhm: "4k7",
    };
    expect(row({ ...typed, note: "five cards pull it low" })).toEqual({
      ok: true,
      value: {
        pin: "a10",
        signal: "FAULT_N",
        role: "open-drain output",
        family: "HCT",
        loads: 2,
        enableGroup: "SUM_SEL",
        pullUpOhm: 4700,
        note: "five cards pull it low",
      },
    });
  });

  test.each([
    [{ signal: "A B" }, "a10, Signal: “A B” has a blank in it. Write a signal in one word, such as CARRY_N."],
    [{ signal: "=cmd" }, "a10, Signal: “=” cannot stand in a signal."],
    [{ signal: "X".repeat(41) }, "a10, Signal: It has 41 characters; at most 40 fit here."],
    [{ signal: "D[7:0]" }, "a10, Signal: D[7:0] names 8 signals, and a pin carries one. Type it over 8 selected pins."],
    [{ role: "outputt" }, "a10, Role: “outputt” is no role. Write power, ground, push-pull output"],
    [{ family: "XYZ" }, "a10, Family: “XYZ” is no logic family of this project. Known: HC, HCT, LS, HC3V3."],
    [{ loads: "1.5" }, "a10, Loads: “1.5” is no number of loads."],
    [{ loads: "-1" }, "a10, Loads: “-1” is no number of loads."],
    [{ loads: "1001" }, "a10, Loads: 1001 loads are more than the 1000 that fit here."],
    [{ pullUpOhm: "5 V" }, "a10, Pull-up: The pull-up was not understood:"],
    [{ pullUpOhm: "0" }, "a10, Pull-up: A pull-up is 1 Ω to 100 MΩ."],
    [{ note: "x".repeat(201) }, "a10, Note: It has 201 characters; at most 200 fit here."],
  ])("%j is refused with pin and column", (texts, sentence) => {
    expect(wrong(texts)).toEqual([expect.stringContaining(sentence)]);
  });

  test.each(["PH6", "+5V", "-12V", "/CS", "~OE", "IRQ*", "CS#", "D[3]", "A<3>", "!RD", "5V0_A", "NET$3", "Ω_REF"])(
    "%s is a signal",
    (signal) => expect(readCell("signal", signal, known)).toMatchObject({ ok: true, text: signal }),
  );

  test("names every cell that is wrong, not only the first", () => {
    expect(wrong({ role: "x", loads: "y" })).toHaveLength(2);
  });

  test("comes back the same from the texts that stand for it", () => {
    const written = fc.record({
      signal: fc.constantFrom("", "PH6", "+5V"),
      role: fc.constantFrom("power", "ground", "push-pull output", "input", "no connection"),
      family: fc.constantFrom("", ...known.families),
      loads: fc.integer({ min: 0, max: 1000 }).map(String),
      enableGroup: fc.constantFrom("", "SUM_SEL"),
      pullUpOhm: fc.double({ min: 1, max: 1e8, noNaN: true }).map((ohm) => String(Number(ohm.toPrecision(6)))),
      note: fc.constantFrom("", "keep short"),
    });
    fc.assert(
      fc.property(written, (texts) => {
        const read = row(texts);
        if (!read.ok) throw new Error(JSON.stringify(read.problems));
        expect(row(pinTexts(read.value))).toEqual(read);
      }),
    );
  });
});

describe("a role", () => {
  test.each([
    ["Push-Pull Output", "push-pull output"],
    ["pp", "push-pull output"],
    ["three state output", "three-state output"],
    ["3-state", "three-state output"],
    ["open collector", "open-drain output"],
    ["I/O", "bidirectional"],
    ["NC", "no connection"],
    ["bid", "bidirectional"],
    ["gnd", "ground"],
  ])("%j is %s", (text, role) => expect(readRole(text)).toBe(role));

  test.each(["", "p", "x", "toString"])("%j could mean none or several and is asked for again", (text) => {
    expect(readRole(text)).toBeUndefined();
  });

  test.each([
    ["GND", "ground"],
    ["AGND", "ground"],
    ["+5V", "power"],
    ["-12V_A", "power"],
    ["VREF", "power"],
    ["VCC", "power"],
    ["CLK", "passive"],
    ["", "passive"],
  ])("left empty for %j is %s", (signal, role) => expect(impliedRole(signal, known.rails)).toBe(role));
});

describe("rows against a connector's face", () => {
  const face = findConnector("din41612-c64");
  if (!face) throw new Error("The connector is in the list.");
  const read = (rows: (Partial<PinTexts> & { pin: string })[], kept: string[] = []) =>
    readPinRows(
      rows.map((one) => ({ ...EMPTY_TEXTS, ...one })),
      { reference: "CON J1", face, kept },
      known,
    );

  test("take the face's own writing of a pin", () => {
    expect(read([{ pin: "A4", signal: "CLK" }]).put).toMatchObject([{ pin: "a4", signal: "CLK", role: "passive" }]);
  });

  test("name a pin that the connector has not, and one that stands twice", () => {
    const { problems } = read([
      { pin: "b4", signal: "CLK" },
      { pin: "a4", signal: "X" },
      { pin: "A4", signal: "Y" },
    ]);
    expect(problems["b4.pin"]).toContain("CON J1 has no pin b4.");
    expect(problems["a4.pin"]).toBe("a4 stands in two rows. Keep one of them.");
  });

  test("without a word take away what is kept, also of a pin that the face lost", () => {
    expect(read([{ pin: "a4" }, { pin: "b4" }, { pin: "a5" }], ["a4", "b4"])).toEqual({
      put: [],
      take: ["a4", "b4"],
      problems: {},
    });
  });
});
