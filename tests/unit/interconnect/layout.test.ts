import { describe, expect, test } from "vitest";
import { applyEdits } from "@/lib/calc/interconnect";
import { board, carries, clock, found, ground, input, only, pushPull, rack } from "../../support/small-machine";
import { face } from "../../support/face";

describe("fast edges", () => {
  test("far from ground are found with the family and the distance, once for the connector", () => {
    const machine = rack({ cards: { TIM: { a1: ground(), a10: pushPull("D0", "AC"), a11: pushPull("D1", "AC") } } });
    const finding = only(machine, "far-ground");
    expect(finding.title).toBe("Fast edges without a ground pin nearby on TIM J1");
    expect(finding.why).toContain("AC edges of about 2.0\u202fns on a10 and a11");
    expect(finding.why).toContain("from a11 the nearest ground is 25.4\u202fmm away");
  });

  test("within two places of a ground pin are fine, and slow edges may be far", () => {
    expect(found(rack({ cards: { TIM: { a1: ground(), a3: pushPull("D0", "AC") } } }), "far-ground")).toEqual([]);
    expect(found(rack({ cards: { TIM: { a1: ground(), a4: pushPull("D0", "AC") } } }), "far-ground")).toHaveLength(1);
    expect(found(rack({ cards: { TIM: { a1: ground(), a20: pushPull("D0", "HC") } } }), "far-ground")).toEqual([]);
  });
});

describe("clock lines", () => {
  const more = { signals: [clock("PHI1"), clock("PHI2")] };

  test("on neighbouring pins are found once for all boards", () => {
    const cards = {
      TIM: { a10: pushPull("PHI1"), a11: pushPull("PHI2") },
      CON: { a10: input("PHI1"), a11: input("PHI2") },
    };
    const finding = only(rack({ cards, more }), "clock-beside-clock");
    expect(finding.title).toBe("PHI1 runs beside PHI2");
    expect(finding.why).toBe("a10 next to a11 on BPL, CON and TIM, with no ground between.");
    expect(finding.weight).toBe("should");
  });

  test("with a ground pin between them are fine", () => {
    const cards = { TIM: { a10: pushPull("PHI1"), a11: ground(), a12: pushPull("PHI2") } };
    const machine = rack({ cards, more });
    expect(found(machine, "clock-beside-clock")).toEqual([]);
    expect(found(machine, "clock-beside-line")).toEqual([]);
  });

  test("beside a bus line are worth a look; the same clock on two pins is not beside itself", () => {
    const cards = { TIM: { a20: pushPull("PHI1"), a21: pushPull("PHI1"), a19: pushPull("D7") } };
    expect(only(rack({ cards, more }), "clock-beside-line").weight).toBe("look");
    expect(
      found(rack({ cards: { TIM: { a20: pushPull("PHI1"), a21: pushPull("PHI1") } }, more }), "clock-beside-line"),
    ).toEqual([]);
  });

  test("in rows a and c of a type C stand too far apart to matter", () => {
    const machine = rack({ cards: { TIM: { a10: pushPull("PHI1"), c10: pushPull("PHI2") } }, more });
    expect(found(machine, "clock-beside-clock")).toEqual([]);
  });
});

describe("CMOS inputs that carry nothing", () => {
  test("are found once for the connector and tied by a resistor", () => {
    const machine = rack({ cards: { CON: { a5: input(""), a6: input("") } } });
    const finding = only(machine, "open-inputs");
    expect(finding.title).toBe("Unused CMOS inputs on CON J1 are not tied");
    expect(found(applyEdits(machine, finding.edits), "open-inputs")).toEqual([]);
  });

  test("are let be when a resistor ties them or when they are bipolar", () => {
    const tied = carries("", "input", { loads: 1, pullUpOhm: 10_000 });
    expect(found(rack({ cards: { CON: { a5: tied, a6: input("", "LS") } } }), "open-inputs")).toEqual([]);
  });

  test("of spare gates are found by board and tied", () => {
    const spare = { ...board("CON", {}), untiedSpares: [{ part: "74HC00", gates: 2, inputs: 4, family: "HC" }] };
    const machine = { ...rack({ cards: {} }), boards: [spare] };
    const finding = only(machine, "spare-gates");
    expect(finding.why).toContain("2 of 74HC00 with 4 inputs");
    expect(found(applyEdits(machine, finding.edits), "spare-gates")).toEqual([]);
    const bipolar = { ...spare, untiedSpares: [{ part: "74LS00", gates: 2, inputs: 4, family: "LS" }] };
    expect(found({ ...machine, boards: [bipolar] }, "spare-gates")).toEqual([]);
  });
});

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
