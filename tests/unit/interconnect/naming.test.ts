import { describe, expect, test } from "vitest";
import { applyEdits, checkMachine, type Machine } from "@/lib/calc/interconnect";
import { found, ground, input, only, power, pushPull, rack, type PinMap } from "../../support/small-machine";

describe("one net under two names", () => {
  test("is a pin out of place or an alias; agreeing on the alias ends the finding", () => {
    const machine = rack({ cards: { SUP: { b9: pushPull("PWR_OK") }, TIM: { b9: input("PWROK") } } });
    const finding = only(machine, "named-differently");
    expect(finding.title).toBe("One net, two names: PWR_OK / PWROK");
    expect(finding.mend).toBe("Move the pin, or agree that PWROK means PWR_OK.");
    expect(found(applyEdits(machine, finding.edits), "named-differently")).toEqual([]);
  });

  test("is fine when an alias is agreed on, even one that several signals share", () => {
    const signals = ["SELM2_N", "SELS2_N"].map((name) => ({
      name,
      class: "control" as const,
      aliases: ["SEL_N"],
      frequencyHz: null,
    }));
    const machine = rack({
      cards: { CON: { a5: input("SEL_N") }, TIM: { a6: pushPull("SELM2_N"), a7: pushPull("SELS2_N") } },
      slots: ["CON", "CON"],
      backplane: (slot) => (slot === 1 ? "SELM2_N" : "SELS2_N"),
      more: { signals },
    });
    expect(found(machine, "named-differently")).toEqual([]);
  });

  test("is not told for rails: there it is a short circuit, or an alias of a rail", () => {
    const rails = [{ name: "+5V", volts: 5, tolerancePercent: 5 }];
    const named = rack({ cards: { CON: { a2: power("+5V") }, SUM: { a2: power("VCC") } }, more: { rails } });
    expect(found(named, "rails-joined")).toEqual([]);
    expect(only(named, "named-differently").title).toBe("One net, two names: +5V / VCC");
    const shorted = rack({ cards: { CON: { a2: power("+5V") }, SUM: { a2: ground() } }, more: { rails } });
    expect(found(shorted, "named-differently")).toEqual([]);
  });
});

describe("names that differ in capitals only", () => {
  test("are spelt as most pins spell them", () => {
    const machine = rack({ cards: { TIM: { a7: pushPull("STB") }, CON: { a7: input("Stb") } } });
    const finding = only(machine, "case-only");
    expect(finding.title).toBe("STB / Stb differ only in capitals");
    expect(finding.mend).toBe("Spell it STB.");
    expect(found(machine, "named-differently")).toEqual([]);
    expect(found(applyEdits(machine, finding.edits), "case-only")).toEqual([]);
  });

  test("are not found where all spell alike", () => {
    const machine = rack({ cards: { TIM: { a7: pushPull("STB") }, CON: { a7: input("STB") } } });
    expect(found(machine, "case-only")).toEqual([]);
  });
});

describe("a connector that is listed mirrored", () => {
  const bus: PinMap = {
    a1: ground(),
    c1: ground(),
    a32: ground(),
    c32: ground(),
    ...Object.fromEntries([2, 3, 4, 5, 6, 7].map((at) => [`a${at}`, input(`D${at}`)])),
    ...Object.fromEntries([2, 3, 4, 5].map((at) => [`c${at}`, pushPull(`OUT${at}`)])),
  };
  const turned = (turn: (row: string, position: number) => string): PinMap =>
    Object.fromEntries(Object.entries(bus).map(([pin, what]) => [turn(pin.charAt(0), Number(pin.slice(1))), what]));
  const swapped = (row: string) => (row === "a" ? "c" : "a");

  const machineWith = (pins: PinMap): Machine => {
    const straight = rack({ cards: { REF: bus, CON: bus }, slots: ["REF", "CON", "CON"] });
    const other = rack({ cards: { CON: pins } }).boards.filter(({ code }) => code === "CON");
    return { ...straight, boards: [...straight.boards.filter(({ code }) => code !== "CON"), ...other] };
  };

  test.each([
    ["row a for c", turned((row, at) => `${swapped(row)}${at}`)],
    ["position n for 33\u202f−\u202fn", turned((row, at) => `${row}${33 - at}`)],
    ["row a for c and position n for 33\u202f−\u202fn", turned((row, at) => `${swapped(row)}${33 - at}`)],
  ])("%s is one finding, whatever the number of pins and slots, and turning the list ends it", (words, pins) => {
    const machine = machineWith(pins);
    const finding = only(machine, "mirrored");
    expect(finding.title).toBe(`CON J1 is listed mirrored, ${words}`);
    expect(finding.boards).toEqual(["CON"]);
    expect(found(machine, "named-differently")).toEqual([]);
    const mended = applyEdits(machine, finding.edits);
    expect(found(mended, "mirrored")).toEqual([]);
    const connector = mended.boards.find(({ code }) => code === "CON")?.connectors[0];
    expect(connector?.pins.find(({ pin }) => pin === "a2")?.signal).toBe("D2");
  });

  test("is the slot's fault when the card fits in another slot", () => {
    const machine = machineWith(bus);
    const boards = machine.boards.map((board) =>
      board.code !== "BPL"
        ? board
        : {
            ...board,
            connectors: board.connectors.map((one) =>
              one.id !== "X3"
                ? one
                : {
                    ...one,
                    pins: one.pins.map((pin) => ({ ...pin, pin: `${swapped(pin.pin.charAt(0))}${pin.pin.slice(1)}` })),
                  },
            ),
          },
    );
    const finding = only({ ...machine, boards }, "mirrored");
    expect(finding.title).toBe("BPL X3 is listed mirrored, row a for c");
    expect(found(applyEdits({ ...machine, boards }, finding.edits), "mirrored")).toEqual([]);
  });

  test("leaves the nets as they are listed, and judges the rest as if it were mended", () => {
    const machine = machineWith(turned((row, at) => `${swapped(row)}${at}`));
    const { nets, findings } = checkMachine(machine);
    expect(nets.some(({ names }) => names.includes("D2") && names.includes("OUT2"))).toBe(true);
    const straight = checkMachine(machineWith(bus)).findings.map(({ key }) => key);
    expect(findings.map(({ key }) => key).filter((key) => !key.startsWith("mirrored"))).toEqual(straight);
  });

  test("is not suspected for two pins that were exchanged", () => {
    const { a2, a3, ...rest } = bus;
    if (!a2 || !a3) throw new Error("the bus has no such pins");
    const machine = machineWith({ ...rest, a2: a3, a3: a2 });
    expect(found(machine, "mirrored")).toEqual([]);
    expect(found(machine, "named-differently")).toHaveLength(2);
  });
});
