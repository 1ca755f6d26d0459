import { describe, expect, test } from "vitest";
import { applyEdits, type Machine } from "@/lib/calc/interconnect";
import { found, ground, input, only, passive, power, pushPull, rack } from "../../support/small-machine";

const rails = [
  { name: "+5V", volts: 5, tolerancePercent: 5 },
  { name: "+12V", volts: 12, tolerancePercent: 5 },
];

describe("supplies on the wrong pin", () => {
  test("two rails on one net are a short circuit", () => {
    const machine = rack({ cards: { CON: { a2: power("+5V") }, OUT: { a2: power("+12V") } }, more: { rails } });
    const finding = only(machine, "rails-joined");
    expect(finding.title).toBe("+5V and +12V are joined");
    expect(finding.weight).toBe("must");
  });

  test("a supply joined to ground is a short circuit, even when no rail is listed: the name tells the volts", () => {
    const machine = rack({ cards: { CON: { a2: power("+5V") }, OUT: { a2: ground() } } });
    expect(only(machine, "rails-joined").weight).toBe("must");
  });

  test("two grounds joined are a look, the same rail on two pins is nothing", () => {
    const grounds = rack({ cards: { CON: { a1: ground("GND") }, OUT: { a1: ground("AGND") } } });
    expect(only(grounds, "rails-joined").weight).toBe("look");
    const same = rack({
      cards: { CON: { a2: power("+5V"), c2: power("+5V") }, OUT: { a2: power("+5V") } },
      more: { rails },
    });
    expect(found(same, "rails-joined")).toEqual([]);
  });

  test("an output on a supply is taken off the pin", () => {
    const machine = rack({ cards: { CON: { a2: power("+5V") }, TIM: { a2: pushPull("STB") } }, more: { rails } });
    const finding = only(machine, "power-on-signal");
    expect(finding.title).toBe("An output drives +5V");
    expect(finding.why).toContain("TIM-01 a2");
    expect(found(applyEdits(machine, finding.edits), "power-on-signal")).toEqual([]);
  });

  test("a supply role on a signal is a slip of the role", () => {
    const machine = rack({
      cards: { CON: { a2: power("D3") }, TIM: { a2: pushPull("D3") }, SUM: { a2: input("D3") } },
      backplane: () => "D3",
    });
    const slipped: Machine = {
      ...machine,
      boards: machine.boards.map((board) =>
        board.code !== "BPL"
          ? board
          : {
              ...board,
              connectors: board.connectors.map((one) => ({ ...one, pins: [{ pin: "a2", ...passive("D3") }] })),
            },
      ),
    };
    const finding = only(slipped, "power-on-signal");
    expect(finding.title).toBe("A supply pin sits on D3");
    expect(found(applyEdits(slipped, finding.edits), "power-on-signal")).toEqual([]);
  });

  test("an input tied to ground in its slot is a look, and nothing when its own board calls it ground", () => {
    const tied = rack({ cards: { BUS: { a3: ground() }, CON: { a3: input("GA0") } } });
    expect(only(tied, "input-on-supply").weight).toBe("look");
    expect(found(tied, "power-on-signal")).toEqual([]);
    const told = rack({ cards: { BUS: { a3: ground() }, CON: { a3: input("GND") } } });
    expect(found(told, "input-on-supply")).toEqual([]);
  });

  test("one name as a supply and as ground gets the role of most pins", () => {
    const machine = rack({ cards: { CON: { a1: ground() }, SUM: { a1: power("GND") } } });
    const finding = only(machine, "rail-role");
    expect(finding.mend).toBe("Give this pin the role ground.");
    expect(found(applyEdits(machine, finding.edits), "rail-role")).toEqual([]);
  });
});

describe("rails that nobody lists", () => {
  test("are found by name, once for all boards", () => {
    const machine = rack({ cards: { CON: { a2: power("VCC") }, SUM: { a2: power("VCC") } }, more: { rails } });
    expect(only(machine, "unknown-rail").title).toBe("VCC is no rail of this machine");
  });

  test("are let be when they are an alias, and while the machine has no rails yet", () => {
    const cards = { CON: { a2: power("VCC") } };
    const signals = [{ name: "+5V", class: "power" as const, aliases: ["VCC"], frequencyHz: null }];
    expect(found(rack({ cards, more: { rails, signals } }), "unknown-rail")).toEqual([]);
    expect(found(rack({ cards }), "unknown-rail")).toEqual([]);
  });
});

describe("ground on a connector", () => {
  const bus = { a1: ground(), a2: pushPull("STB") };

  test("that is missing is found and taken where the slot has it", () => {
    const machine = rack({ cards: { TIM: bus, CON: { a2: input("STB") } } });
    const finding = only(machine, "ground-missing");
    expect(finding.title).toBe("CON J1 has no ground pin");
    expect(finding.mend).toBe("Take ground on a1, where the other half has it.");
    expect(found(applyEdits(machine, finding.edits), "ground-missing")).toEqual([]);
  });

  test("that is there is nothing to tell, and neither is a card that is put together with nothing", () => {
    expect(found(rack({ cards: { TIM: bus, CON: { a1: ground(), a2: input("STB") } } }), "ground-missing")).toEqual([]);
    expect(found(rack({ cards: { CON: { a2: input("STB") } }, more: { matings: [] } }), "ground-missing")).toEqual([]);
  });
});

describe("current through the contacts", () => {
  const cards = {
    SUP: { a1: ground(), a2: power("+5V"), c1: ground(), c2: power("+5V") },
    CON: { a1: ground(), c1: ground(), a2: power("+5V") },
  };
  const draw = (worstA: number) => [{ placement: "slot 2", rail: "+5V", typicalA: worstA / 2, worstA }];

  test("of 1.6 A each is borne at 40 °C and 1.7 A are too much", () => {
    expect(found(rack({ cards, more: { rails, draws: draw(1.6) } }), "contact-current")).toEqual([]);
    const finding = only(rack({ cards, more: { rails, draws: draw(1.7) } }), "contact-current");
    expect(finding.title).toBe("CON: +5V pins carry too much current");
    expect(finding.why).toBe("1.7\u202fA through 1 pin; one bears 1.6\u202fA at 40\u202f°C.");
  });

  test("is mended by pins that the slot has and the card leaves empty", () => {
    const machine = rack({ cards, more: { rails, draws: draw(1.7) } });
    const { edits, mend } = only(machine, "contact-current");
    expect(mend).toBe("Take +5V on c2 too, where the other half has it.");
    expect(found(applyEdits(machine, edits), "contact-current")).toEqual([]);
  });

  test("is not to be mended by pins alone when the slot has no more of them", () => {
    const [supply] = found(rack({ cards, more: { rails, draws: draw(9) } }), "contact-current");
    expect(supply?.mend).toBe("Give +5V 5 pins more.");
    expect(supply?.edits).toEqual([]);
  });

  test("of all rails together comes back through ground", () => {
    const draws = [...draw(1.5), { placement: "slot 2", rail: "+12V", typicalA: 1, worstA: 2 }];
    const titles = found(rack({ cards, more: { rails, draws } }), "contact-current").map(({ title }) => title);
    expect(titles).toEqual(["CON: ground pins carry too much current"]);
  });

  test("from a rail that the card has no pin for is told", () => {
    const draws = [{ placement: "slot 2", rail: "+12V", typicalA: 0.1, worstA: 0.2 }];
    const finding = only(rack({ cards, more: { rails, draws } }), "rail-missing");
    expect(finding.title).toBe("CON draws from +12V and has no pin for it");
  });
});
