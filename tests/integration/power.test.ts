import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { database } from "@/db/client";
import { loadMachine } from "@/lib/machine/load-machine";
import { loadFirstPower } from "@/lib/power/load-first-power";
import { loadPower } from "@/lib/power/load-power";
import { removePowerLine } from "@/lib/power/remove-power-line";
import { savePowerLineInput } from "@/lib/power/schema";
import { must } from "../support/bench";
import { useDatabase } from "../support/database";
import { FULL_ADDER, keepBlock, listBoard, planBoard } from "../support/parts";
import { keepLine, keepRail, LAMPS, wholeBoard } from "../support/power-desk";
import { makeBoard, makeProject } from "../support/project";
import { GROUNDED, makeWiredProject } from "../support/wired-project";

useDatabase();

/** TIM in slot 1 and CON in slot 2, each with one contact for +5V and one for ground. */
async function machine() {
  const project = await makeWiredProject();
  const scope = project.scopes.builder;
  for (const place of ["BP.X1", "BP.X2", "TIM.J1", "CON.J1"] as const) await project.wire(place, GROUNDED);
  const board = async (code: string) => {
    const found = (await loadPower(scope)).boards.find((one) => one.code === code);
    if (!found) throw new Error(`no board ${code}`);
    return found;
  };
  const assembled = async () => {
    const view = await loadPower(scope);
    if (!view.machine.ok) throw new Error(view.machine.message);
    return view.machine.value;
  };
  return { ...project, scope, board, assembled };
}

describe("what a board draws", () => {
  test("comes from the packages of its blocks at the clock and load of its plan", async () => {
    const { scope, board } = await machine();
    const block = await must(keepBlock(scope, FULL_ADDER));
    await must(planBoard(scope, { board: "CON", blocks: { [block.id]: 4 } }));
    const { power } = await board("CON");
    const [rail] = power?.rails ?? [];
    expect(rail?.lines.map(({ label, count }) => `${count} ${label}`)).toEqual(["2 74HC86", "2 74HC08", "1 74HC32"]);
    expect(rail?.taken.worst).toBeGreaterThan(rail?.taken.typical ?? 0);
    expect(rail?.rail).toBe("+5V");
  });

  test("counts logic parts of its parts list, and nothing else of it", async () => {
    const { scope, board } = await machine();
    const { version } = await must(planBoard(scope, { board: "CON" }));
    const lines = [
      { partNumber: "SN74HCT244N", count: "2" },
      { partNumber: "DIN 41612 B 64 male", count: "1" },
    ];
    await must(listBoard(scope, { board: "CON", version, lines }));
    const { power } = await board("CON");
    expect(power?.rails[0]?.lines.map(({ label, count }) => `${count} ${label}`)).toEqual(["2 74HCT244"]);
  });

  test("adds lamps: eight through 500 Ω from 5 V, half of them lit", async () => {
    const { scope, board } = await machine();
    await must(keepRail(scope));
    await must(keepLine(scope, { board: "CON", typed: LAMPS }));
    const { power, lines } = await board("CON");
    expect(power?.rails[0]?.taken.typical).toBeCloseTo(0.024);
    expect(power?.rails[0]?.taken.worst).toBeCloseTo((8 * (5.25 - 2)) / 500);
    expect(lines).toMatchObject([{ item: { ohm: 500, count: 8 } }]);
  });

  test("is what was measured, once somebody typed that in; the sum stays beside it", async () => {
    const { scope, board } = await machine();
    await must(keepLine(scope, { board: "CON", typed: LAMPS }));
    await must(keepLine(scope, { board: "CON", typed: wholeBoard("120 mA", "0.18 A") }));
    const [rail] = (await board("CON")).power?.rails ?? [];
    expect(rail).toMatchObject({ source: "typed", taken: { typical: 0.12, worst: 0.18 } });
    expect(rail?.computed.typical).toBeCloseTo(0.024);
  });

  test("that cannot be added up says why, and the other boards still are", async () => {
    const { scope, board } = await machine();
    await must(keepRail(scope));
    const regulator = {
      ...{ kind: "regulator", label: "U7", rail: "+5V", output: "+6V", outputVolts: "6 V", type: "linear" },
      ...{ groundA: "5 mA", efficiency: "85 %" },
    };
    await must(keepLine(scope, { board: "TIM", typed: regulator }));
    await must(keepLine(scope, { board: "CON", typed: LAMPS }));
    expect(await board("TIM")).toMatchObject({
      power: null,
      problem: expect.stringContaining("cannot make 6 V from 5 V"),
    });
    expect((await board("CON")).power).not.toBeNull();
  });

  test("of which nothing is known is not taken for nothing", async () => {
    const { board, assembled } = await machine();
    expect((await board("TIM")).power).toBeNull();
    expect((await assembled()).heat).toEqual([]);
  });
});

describe("a line is refused", () => {
  test("when somebody changed it meanwhile, with what stands there now", async () => {
    const { scope, board } = await machine();
    const { line, item } = await must(keepLine(scope, { board: "CON", typed: LAMPS }));
    await must(keepLine(scope, { board: "CON", line, seen: item, typed: { ...LAMPS, count: "6" } }));
    const answer = await keepLine(scope, { board: "CON", line, seen: item, typed: { ...LAMPS, count: "4" } });
    expect(answer).toMatchObject({ error: { code: "conflict", details: { current: { count: 6 } } } });
    expect((await board("CON")).lines[0]?.item).toMatchObject({ count: 6 });
  });

  test("when it takes from a rail that nobody has described", async () => {
    const { scope } = await machine();
    const answer = await keepLine(scope, { board: "CON", typed: { ...LAMPS, rail: "+12V" } });
    expect(answer).toMatchObject({
      error: { fields: { "typed.rail": expect.stringContaining("There is no rail +12V") } },
    });
  });

  test("when the whole board is typed in twice for one rail", async () => {
    const { scope } = await machine();
    await must(keepLine(scope, { board: "CON", typed: wholeBoard("0.1", "0.2") }));
    const answer = await keepLine(scope, { board: "CON", typed: wholeBoard("0.1", "0.3") });
    expect(answer).toMatchObject({ error: { code: "conflict" } });
  });

  test.each([
    ["no lamp", { count: "0" }, "Count: 0 is too few; at least 1."],
    ["minus three lamps", { count: "-3" }, "Count: -3 is too few"],
    ["half a lamp", { count: "0.5" }, "no whole number"],
    ["a resistor of 0 Ω", { ohm: "0" }, "too little"],
    ["more than all of them lit", { litWorst: "120 %" }, "far too much"],
    ["fewer lit at worst than as a rule", { litWorst: "10 %" }, "At worst it is at least"],
    ["no name", { label: "" }, "Name it as the parts list does."],
  ])("with %s", async (_what, wrong, said) => {
    const typed = { ...LAMPS, ...wrong };
    const write = { project: "tide-computer", writeId: randomUUID(), board: "CON", line: "", seen: null };
    const parsed = savePowerLineInput.safeParse({ ...write, typed });
    expect(parsed.error?.issues.map(({ message }) => message).join("\n")).toContain(said);
  });

  test("when the board belongs to another project", async () => {
    const { scope } = await machine();
    await makeBoard(await makeProject(), "PAN");
    expect(await keepLine(scope, { board: "PAN", typed: LAMPS })).toMatchObject({ error: { code: "not-found" } });
  });
});

test("a line that was removed is out of the sum, and not removed twice", async () => {
  const { scope, board, write } = await machine();
  const { line, item } = await must(keepLine(scope, { board: "CON", typed: LAMPS }));
  await must(removePowerLine(scope, { ...write(), board: "CON", line, seen: item }));
  expect((await board("CON")).power).toBeNull();
  const again = await removePowerLine(scope, { ...write(), board: "CON", line, seen: item });
  expect(again).toMatchObject({ error: { code: "not-found" } });
});

describe("the assembled machine", () => {
  test("adds up what all boards take from a rail, against what its supply gives", async () => {
    const { scope, assembled } = await machine();
    await must(keepRail(scope, { capacityA: "0.5 A" }));
    await must(keepLine(scope, { board: "TIM", typed: wholeBoard("0.1", "0.2") }));
    await must(keepLine(scope, { board: "CON", typed: wholeBoard("0.1", "0.35") }));
    const [margin] = (await assembled()).margins;
    expect(margin).toMatchObject({ rail: "+5V", verdict: "too little", sum: { typical: 0.2 } });
    expect(margin?.sum.worst).toBeCloseTo(0.55);
  });

  test("has the current of each contact, and the rule check finds the one that carries too much", async () => {
    const { scope, assembled, findings } = await machine();
    await must(keepRail(scope));
    await must(keepLine(scope, { board: "CON", typed: wholeBoard("1.2 A", "1.9 A") }));
    const load = (await assembled()).contacts.find(({ rail }) => rail === "+5V");
    expect(load).toMatchObject({ label: "CON in slot 2", contacts: 1, ratedA: 1.6, verdict: "too much" });
    expect((await findings("contact-current")).length).toBeGreaterThan(0);
  });

  test("loses voltage along the copper of the backplane, the further the more", async () => {
    const { scope, assembled } = await machine();
    await must(keepRail(scope, { segmentMm: "20 mm", widthMm: "1 mm", thicknessUm: "35 µm" }));
    await must(keepLine(scope, { board: "TIM", typed: wholeBoard("0.5", "1 A") }));
    await must(keepLine(scope, { board: "CON", typed: wholeBoard("0.5", "1 A") }));
    const { drops } = await assembled();
    expect(drops.map(({ slot }) => slot)).toEqual([1, 2]);
    // 20 squares there and 20 back at 40 °C; 2 A to slot 1, 1 A on to slot 2; one contact each way, 20 mΩ.
    const segmentOhm = (2 * 20 * 1.72e-8 * (1 + 0.00393 * 20)) / 35e-6;
    expect(drops[0]?.dropV).toBeCloseTo(2 * segmentOhm + 0.04, 6);
    expect(drops[1]?.dropV).toBeCloseTo(3 * segmentOhm + 0.04, 6);
  });

  test("is fed by one of its boards, whose contacts then carry what the others take", async () => {
    const { scope, assembled } = await machine();
    const view = await loadPower(scope);
    const source = view.sources.find(({ code }) => code === "TIM")?.id ?? "";
    await must(keepRail(scope, { source }));
    await must(keepLine(scope, { board: "CON", typed: wholeBoard("0.2", "0.4 A") }));
    const { contacts } = await assembled();
    const through = contacts.filter(({ rail }) => rail === "+5V").map(({ label, worstA }) => [label, worstA]);
    expect(through).toEqual([
      ["TIM in slot 1", 0.4],
      ["CON in slot 2", 0.4],
    ]);
    const draws = (await loadMachine(database(), scope)).draws.map(({ placement, worstA }) => [placement, worstA]);
    expect(draws).toEqual([
      ["slot 2", 0.4],
      ["slot 1", -0.4],
    ]);
  });

  test("feeds its own rail through a regulator, which hands on what the others take", async () => {
    const { scope, board, assembled } = await machine();
    const source = (await loadPower(scope)).sources.find(({ code }) => code === "TIM")?.id ?? "";
    await must(keepRail(scope, { source }));
    await must(keepRail(scope, { name: "+9V", volts: "9 V", capacityA: "2 A" }));
    const regulator = {
      ...{ kind: "regulator", label: "U1", rail: "+9V", output: "+5V", outputVolts: "5 V", type: "linear" },
      ...{ groundA: "10 mA", efficiency: "85 %" },
    };
    await must(keepLine(scope, { board: "TIM", typed: regulator }));
    await must(keepLine(scope, { board: "CON", typed: wholeBoard("0.2", "0.4 A") }));
    const margins = (await assembled()).margins.map(({ rail, sum }) => [rail, Number(sum.worst.toFixed(3))]);
    expect(margins).toEqual([
      ["+5V", 0.4],
      ["+9V", 0.41],
    ]);
    expect((await board("TIM")).power?.rails.find(({ rail }) => rail === "+9V")?.taken.worst).toBeCloseTo(0.01);
  });
});

describe("the first power of a unit", () => {
  test("has a window for its supply current, offered to its checks of a current", async () => {
    const project = await makeProject();
    const scope = project.scopes.builder;
    await makeBoard(project, "PAN", [
      { title: "Current at first power", limits: "10 … 60 mA" },
      { title: "+5 V at U1", limits: "4.75 … 5.25 V" },
    ]);
    await must(keepLine(scope, { board: "PAN", typed: wholeBoard("25 mA", "54 mA") }));
    const view = await loadFirstPower(scope, "pan");
    expect(view?.windows).toMatchObject([{ rail: "+5V", expectedA: 0.025, upperA: 0.054, limitA: 0.07 }]);
    expect(view?.place).toMatchObject({ issuedNumber: 1, checks: [{ title: "Current at first power" }] });
  });

  test("is not guessed while nothing is known of the board", async () => {
    const project = await makeProject();
    await makeBoard(project, "PAN", []);
    expect(await loadFirstPower(project.scopes.builder, "PAN")).toBeUndefined();
  });
});
