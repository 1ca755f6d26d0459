import { describe, expect, test } from "vitest";
import { assembleNets, netFacts, netsByPin } from "@/lib/calc/interconnect";
import { carries, input, openDrain, pushPull, rack, threeState } from "../../support/small-machine";

const phase = rack({
  cards: {
    CON: { a10: threeState("PH6", "SEL") },
    SUM: { a10: input("PH6"), c10: input("PH6") },
    PAN: { a11: input("STEP") },
  },
  slots: ["CON", "CON", "SUM", "PAN"],
});

describe("the nets of the assembled machine", () => {
  test("go through every slot, and a pin tells who else is on its net", () => {
    const who = netsByPin(assembleNets(phase));
    const net = who({ placement: "slot 1", connectorId: "CON J1", pin: "a10" });
    expect(net?.name).toBe("PH6");
    expect(net?.placements).toEqual(["backplane", "slot 1", "slot 2", "slot 3"]);
    expect(net?.pins.filter(({ kind }) => kind === "card").map(({ label, pin }) => `${label} ${pin}`)).toEqual([
      "CON-01 a10",
      "CON-02 a10",
      "SUM-01 a10",
      "SUM-01 c10",
    ]);
    expect(who({ placement: "slot 1", connectorId: "CON J1", pin: "c9" })).toBeUndefined();
  });

  test("are named as most boards name them, else as the backplane does, and are found by that name", () => {
    const machine = rack({
      cards: { CON: { a5: input("SEL_N") } },
      slots: ["CON", "CON"],
      backplane: (slot) => `SEL${slot}_N`,
    });
    expect(assembleNets(machine).map(({ id, names }) => [id, names])).toEqual([
      ["SEL1_N", ["SEL1_N", "SEL_N"]],
      ["SEL2_N", ["SEL2_N", "SEL_N"]],
    ]);
  });

  test("of one name that nothing joins have the first pin in their id", () => {
    const machine = rack({ cards: { CON: { a5: input("OPT") } }, slots: ["CON", "CON"], more: { matings: [] } });
    const ids = assembleNets({ ...machine, boards: machine.boards.filter(({ code }) => code === "CON") }).map(
      ({ id }) => id,
    );
    expect(ids).toEqual(["OPT at CON-01 J1 a5", "OPT at CON-02 J1 a5"]);
  });

  test("do not join pins without a signal, nor pins that are not connected", () => {
    const machine = rack({
      cards: { CON: { a5: input(""), a6: carries("NC", "no connection"), a7: carries("NC", "no connection") } },
    });
    const own = assembleNets({ ...machine, boards: machine.boards.filter(({ code }) => code === "CON"), matings: [] });
    expect(own.map(({ pins }) => pins.length)).toEqual([1, 1, 1]);
  });

  test("with planned and occupied slots alike", () => {
    const planned = {
      ...phase,
      placements: phase.placements.map((one) => ({ ...one, label: `planned ${one.slot ?? ""}` })),
    };
    expect(assembleNets(planned).map(({ pins }) => pins.length)).toEqual(
      assembleNets(phase).map(({ pins }) => pins.length),
    );
  });
});

describe("what a net's own panel says", () => {
  const net = (machine: typeof phase, name: string) => {
    const found = assembleNets(machine).find((one) => one.name === name);
    if (!found) throw new Error(`no net ${name}`);
    return netFacts(machine, found);
  };

  test("who drives it, with what margins and which pair binds", () => {
    const machine = rack({
      cards: {
        TIM: { a1: pushPull("CLK", "AC") },
        CON: { a1: input("CLK", "HC", 3) },
        PAN: { a1: input("CLK", "LS") },
      },
      slots: ["TIM", "CON", "CON", "PAN"],
    });
    const facts = net(machine, "CLK");
    expect(facts.drivers.map(({ place, family }) => [place, family])).toEqual([["TIM-01 a1", "AC"]]);
    expect(facts.loads.map(({ place, loads }) => [place, loads])).toEqual([
      ["CON-01 a1", 3],
      ["CON-02 a1", 3],
      ["PAN-01 a1", 1],
    ]);
    expect([facts.high?.driving, facts.high?.receiving]).toEqual(["AC", "HC"]);
    expect(facts.high?.volts).toBeCloseTo(4.26 - 3.5, 9);
    expect([facts.low?.driving, facts.low?.receiving]).toEqual(["AC", "LS"]);
    expect(facts.low?.volts).toBeCloseTo(0.8 - 0.44, 9);
    expect(facts.fanOut?.low.usedA).toBeCloseTo(6 * 1e-6 + 0.4e-3, 12);
    expect(facts.inShort).toEqual({ text: "0.41 of 24\u202fmA", isWrong: false });
  });

  test("how much it loads the driver: 5 pF for each of 6 connector pins, 3.5 pF for each of 4 HC inputs", () => {
    const machine = rack({
      cards: { TIM: { a1: pushPull("CLK") }, CON: { a1: input("CLK", "HC", 2) } },
      slots: ["TIM", "CON", "CON"],
    });
    const facts = net(machine, "CLK");
    expect(facts.capacitancePf).toBeCloseTo(6 * 5 + 4 * 3.5, 9);
    expect(facts.edge?.edgeS).toBeCloseTo((7e-9 * 44) / 50, 15);
  });

  test("the window of its pull-up and how the present one does", () => {
    const pulled = carries("BUSY_N", "input", { family: "HCT", loads: 1, pullUpOhm: 2200 });
    const machine = rack({ cards: { CON: { a8: openDrain("BUSY_N") }, TIM: { a8: pulled } } });
    const facts = net(machine, "BUSY_N");
    expect(facts.pullUps).toEqual([{ placement: "slot 2", place: "TIM-01 a8", ohm: 2200 }]);
    expect(facts.pullUp?.judgement?.verdict).toBe("fits");
    expect(facts.window?.verdict === "fits" && facts.window.values.E12.includes(2200)).toBe(true);
    expect(facts.inShort.text).toMatch(/^pull-up 2\.2\u202fkΩ, window /);
  });

  test("in a few words what is wrong with it", () => {
    const words = (cards: Parameters<typeof rack>[0]["cards"]) => net(rack({ cards }), "D0").inShort;
    expect(words({ A: { a1: pushPull("D0") }, B: { a1: pushPull("D0") } })).toEqual({
      text: "two drivers",
      isWrong: true,
    });
    expect(words({ A: { a1: input("D0") }, B: { a1: input("D0") } })).toEqual({ text: "no driver", isWrong: true });
    expect(words({ A: { a1: openDrain("D0") }, B: { a1: input("D0") } })).toEqual({
      text: "no pull-up",
      isWrong: true,
    });
    expect(words({ A: { a1: pushPull("D0", "LS") }, B: { a1: input("D0") } })).toEqual({
      text: "high level too low by 800\u202fmV",
      isWrong: true,
    });
  });

  test("and what it cannot say, for families that are not in the table", () => {
    const machine = rack({ cards: { A: { a1: pushPull("D0", "XY") }, B: { a1: input("D0") } } });
    const facts = net(machine, "D0");
    expect(facts.unknownFamilies).toEqual(["XY"]);
    expect(facts.sentences).toContain("Not looked at: XY is not in the table.");
  });
});
