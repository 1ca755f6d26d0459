import { describe, expect, test } from "vitest";
import { applyEdits } from "@/lib/calc/interconnect";
import { board, carries, found, input, only, passive, pushPull, rack } from "../../support/small-machine";

/** Every slot has its own wire on each pin, as for lines that run from card to card. */
const ownWires = (slot: number, pin: string) => `S${slot}_${pin}`;

describe("inputs that nothing drives", () => {
  test("are found with the pins that listen", () => {
    const machine = rack({ cards: { CON: { a5: input("SEL_N") }, SUM: { a5: input("SEL_N") } } });
    const finding = only(machine, "no-driver");
    expect(finding.title).toBe("Nothing drives SEL_N");
    expect(finding.why).toBe("CON-01 a5 and SUM-01 a5 listen, and no board drives. The level floats.");
    expect(finding.weight).toBe("must");
  });

  test("are fine once one board drives", () => {
    const machine = rack({ cards: { CON: { a5: input("SEL_N") }, TIM: { a5: pushPull("SEL_N") } } });
    expect(found(machine, "no-driver")).toEqual([]);
  });

  test("of one design on a wire of its own in each of three slots are one mistake", () => {
    const machine = rack({
      cards: { CON: { a5: input("SEL_N") } },
      slots: ["CON", "CON", "CON"],
      backplane: ownWires,
      more: { signals: [{ name: "SEL_N", class: "data", aliases: ["S1_a5", "S2_a5", "S3_a5"], frequencyHz: null }] },
    });
    const finding = only(machine, "no-driver");
    expect(finding.pins).toHaveLength(3);
    expect(finding.why).toContain("The same on 2 more.");
  });

  test("that a pull-up holds are worth a look only", () => {
    const held = carries("OPT", "input", { loads: 1, pullUpOhm: 10_000 });
    expect(only(rack({ cards: { CON: { a5: held }, SUM: { a5: input("OPT") } } }), "no-driver").weight).toBe("look");
  });

  test("are let be where the driver may stand outside: on a connector that meets nothing, or behind a switch", () => {
    const alone = rack({ cards: { CON: { a5: input("STEP") } }, more: { matings: [] } });
    expect(found(alone, "no-driver")).toEqual([]);
    const switched = rack({ cards: { CON: { a5: input("STEP") }, PAN: { a5: passive("STEP") } } });
    expect(found(switched, "no-driver")).toEqual([]);
  });

  test("are not let be because a passive card hands the net on to another connector that is known", () => {
    const machine = rack({ cards: { CON: { a5: input("STEP") }, OUT: { a5: passive("STEP") } } });
    const ribbon = board("OUT", { a5: passive("STEP") });
    const panel = board("PAN", { a5: input("STEP") });
    const out = {
      ...ribbon,
      connectors: [
        ...ribbon.connectors,
        ...ribbon.connectors.map((one) => ({ ...one, id: "OUT J3", reference: "J3" })),
      ],
    };
    const whole = {
      ...machine,
      boards: [...machine.boards.filter(({ code }) => code !== "OUT"), out, panel],
      placements: [...machine.placements, { id: "panel", board: "PAN", label: "PAN-01", slot: null }],
      matings: [
        ...machine.matings,
        { from: { placement: "slot 2", connector: "OUT J3" }, to: { placement: "panel", connector: "PAN J1" } },
      ],
    };
    expect(only(whole, "no-driver").pins.map(({ label }) => label)).toEqual(["CON-01", "PAN-01"]);
  });
});

describe("signals that reach one slot only", () => {
  const cards = { TIM: { a7: pushPull("STB"), a8: pushPull("CLK") }, CON: { a8: input("CLK") } };

  test("are found, and may be taken off the connector", () => {
    const machine = rack({ cards });
    const finding = only(machine, "one-slot-only");
    expect(finding.title).toBe("STB reaches one slot only");
    expect(finding.weight).toBe("look");
    expect(found(applyEdits(machine, finding.edits), "one-slot-only")).toEqual([]);
  });

  test("are not taken off a design that needs the pin in another slot", () => {
    const machine = rack({
      cards,
      slots: ["TIM", "CON", "TIM"],
      backplane: (slot, pin) => (pin !== "a8" ? undefined : slot === 3 ? "SPARE" : "CLK"),
    });
    const clock = found(machine, "one-slot-only").find(({ pins }) => pins.some(({ pin }) => pin === "a8"));
    expect(clock?.edits).toEqual([]);
  });

  test("are not looked at while only one card is in the rack", () => {
    expect(found(rack({ cards, slots: ["TIM"] }), "one-slot-only")).toEqual([]);
  });

  test("are nothing to tell when another card listens", () => {
    expect(found(rack({ cards: { ...cards, SUM: { a7: input("STB") } } }), "one-slot-only")).toEqual([]);
  });
});
