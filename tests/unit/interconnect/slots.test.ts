import { describe, expect, test } from "vitest";
import { applyEdits, type Machine } from "@/lib/calc/interconnect";
import { face } from "../../support/face";
import { board, found, input, only, pushPull, rack, type PinMap } from "../../support/small-machine";

describe("connectors and slots", () => {
  const straight = rack({ cards: { TIM: { a7: pushPull("STB") }, CON: { a7: input("STB") } } });

  test("that cannot be put together are told with both kinds", () => {
    const boards = straight.boards.map((one) =>
      one.code !== "CON" ? one : board("CON", { a7: input("STB") }, "card", "din41612-b64"),
    );
    const finding = only({ ...straight, boards }, "cannot-mate");
    expect(finding.title).toBe("BPL X2 and CON J1 cannot be put together");
    expect(found(straight, "cannot-mate")).toEqual([]);
  });

  test("with 64 pins of type C in a slot of 96 fit", () => {
    const boards = straight.boards.map((one) => ({
      ...one,
      connectors: one.connectors.map((connector) =>
        one.code === "BPL" ? { ...connector, face: face("din41612-c96") } : connector,
      ),
    }));
    expect(found({ ...straight, boards }, "cannot-mate")).toEqual([]);
  });

  test("pins that the face does not have are told; capitals do not matter", () => {
    const machine = rack({
      cards: { CON: { a33: input("D0"), b2: input("D1"), A5: input("D2") } },
      more: { matings: [] },
    });
    const finding = only({ ...machine, boards: machine.boards.filter(({ code }) => code === "CON") }, "unknown-pins");
    expect(finding.title).toBe("CON J1 has no pin a33 and b2");
    expect(found(straight, "unknown-pins")).toEqual([]);
  });

  test("one pin listed twice joins both signals and is told", () => {
    const boards = straight.boards.map((one) => ({
      ...one,
      connectors: one.connectors.map((connector) =>
        one.code === "CON" ? { ...connector, pins: [...connector.pins, { pin: "A7", ...input("D0") }] } : connector,
      ),
    }));
    expect(only({ ...straight, boards }, "pins-twice").why).toContain("a7: D0 and STB");
    expect(found(straight, "pins-twice")).toEqual([]);
  });

  test("two boards in one slot are told, by the slot and by the connector", () => {
    const second = { id: "slot 2b", board: "CON", label: "CON-09", slot: 2 };
    const machine = {
      ...straight,
      placements: [...straight.placements, second],
      matings: [
        ...straight.matings,
        { from: { placement: "backplane", connector: "X2" }, to: { placement: "slot 2b", connector: "CON J1" } },
      ],
    };
    const titles = found(machine, "claimed-twice").map(({ title }) => title);
    expect(titles).toEqual(["BPL-01 X2 is claimed twice", "Slot 2 is claimed twice"]);
    expect(found(straight, "claimed-twice")).toEqual([]);
  });

  test("what names a board or a connector that is not there is told and left out", () => {
    const machine = {
      ...straight,
      placements: [...straight.placements, { id: "slot 9", board: "GONE", label: "GONE-01", slot: 9 }],
      matings: [
        ...straight.matings,
        { from: { placement: "backplane", connector: "X99" }, to: { placement: "slot 1", connector: "TIM J1" } },
      ],
    };
    expect(found(machine, "loose-end").map(({ title }) => title)).toEqual([
      "BPL-01 is put together by a connector that it does not have",
      "GONE-01 stands for a board that is not there",
    ]);
    expect(found(straight, "loose-end")).toEqual([]);
  });
});

describe("two cards on a ribbon", () => {
  const cabled = (pins: PinMap): Machine => ({
    ...rack({ cards: {} }),
    boards: [
      board(
        "OUT",
        ribbon((pin) => pin),
        "card",
        "header-2x5",
      ),
      board("PAN", pins, "card", "header-2x5"),
    ],
    placements: [
      { id: "out", board: "OUT", label: "OUT-01", slot: null },
      { id: "pan", board: "PAN", label: "PAN-01", slot: null },
    ],
    matings: [{ from: { placement: "out", connector: "OUT J1" }, to: { placement: "pan", connector: "PAN J1" } }],
  });
  const ribbon = (turn: (pin: number) => number): PinMap =>
    Object.fromEntries([1, 2, 3, 4, 5, 6].map((pin) => [String(turn(pin)), pushPull(`L${pin}`)]));

  test("whose odd and even pins are exchanged are one finding", () => {
    const machine = cabled(ribbon((pin) => (pin % 2 === 1 ? pin + 1 : pin - 1)));
    const finding = only(machine, "mirrored");
    expect(finding.title).toMatch(/^(OUT|PAN) J1 is listed mirrored, odd for even$/);
    expect(found(applyEdits(machine, finding.edits), "mirrored")).toEqual([]);
  });

  test("that meet pin by pin are not", () => {
    expect(found(cabled(ribbon((pin) => pin)), "mirrored")).toEqual([]);
  });
});
