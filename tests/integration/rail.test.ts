import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { describe, expect, test } from "vitest";
import { database } from "@/db/client";
import { findConditions, findRails } from "@/db/queries/machine";
import { events } from "@/db/schema/events";
import { saveConditions } from "@/lib/plan-conditions/save-conditions";
import { saveConditionsInput } from "@/lib/plan-conditions/schema";
import { savePowerLine } from "@/lib/power/save-power-line";
import { savePowerLineInput } from "@/lib/power/schema";
import { removeRail } from "@/lib/rail/remove-rail";
import { saveRail } from "@/lib/rail/save-rail";
import { saveRailInput } from "@/lib/rail/schema";
import { typedRail } from "@/lib/rail/typed-rail";
import { railNow } from "@/lib/rail/schema";
import { must } from "../support/bench";
import { useDatabase } from "../support/database";
import { makeBoard, makeProject } from "../support/project";

useDatabase();

const LOGIC = { ...typedRail(), name: "+5V", volts: "5V0", capacityA: "3", tolerancePercent: "5" };

/** A project whose rails and conditions are typed as people write them. */
async function desk() {
  const project = await makeProject();
  const scope = project.scopes.builder;
  const write = () => ({ project: project.slug, writeId: randomUUID() });
  const parse = (typed: object) => saveRailInput.safeParse({ ...write(), rail: "", version: 0, ...LOGIC, ...typed });
  const save = async (typed: object = {}) => {
    const parsed = parse(typed);
    if (!parsed.success) throw parsed.error;
    return saveRail(scope, parsed.data);
  };
  const rails = async () => (await findRails(database(), scope)).map((rail) => railNow.parse(rail));
  const conditions = (typed: object) =>
    saveConditions(
      scope,
      saveConditionsInput.parse({
        ...write(),
        version: 0,
        ...{
          ambientC: "40",
          logicVolts: "5",
          logicRail: "+5V",
          pinCapacitancePf: "5 pF",
          sparesPercent: "10",
          currency: "EUR",
        },
        ...typed,
      }),
    );
  return { project, scope, write, parse, save, rails, conditions };
}

const fieldsOf = (parsed: ReturnType<Awaited<ReturnType<typeof desk>>["parse"]>) =>
  parsed.error?.issues.map(({ path, message }) => `${path.join(".")}: ${message}`) ?? [];

describe("a rail", () => {
  test("is kept with its figures in base units, however they were typed", async () => {
    const { save, rails } = await desk();
    await must(save({ capacityA: "3000 mA", segmentMm: "20.32 mm", widthMm: "5 mm", thicknessUm: "70 µ" }));
    expect(await rails()).toMatchObject([
      { volts: 5, tolerancePercent: 5, capacityA: 3, copper: { segmentMm: 20.32, widthMm: 5, thicknessUm: 70 } },
    ]);
  });

  test("comes back into its form as it was typed", async () => {
    const { save, rails, parse } = await desk();
    await must(save({ name: "-12V", volts: "−12 V", segmentMm: "20.32 mm", widthMm: "5 mm", thicknessUm: "35 µm" }));
    const [rail] = await rails();
    const again = parse(typedRail(rail));
    expect(again.data).toMatchObject({ volts: -12, capacityA: 3, copper: rail?.copper });
  });

  test("may have a capacity that nobody knows yet", async () => {
    const { save, rails } = await desk();
    await must(save({ capacityA: "" }));
    expect((await rails())[0]?.capacityA).toBeNull();
  });

  test("with a stale version is refused with what stands there now", async () => {
    const { save, rails } = await desk();
    const { id } = await must(save());
    await must(save({ rail: id, version: 1, capacityA: "4 A" }));
    expect(await save({ rail: id, version: 1, capacityA: "2 A" })).toMatchObject({
      error: { code: "conflict", details: { current: { capacityA: 4, version: 2 } } },
    });
    expect((await rails())[0]?.capacityA).toBe(4);
  });

  test("is there once, whatever the case, also when two people add it at once", async () => {
    const { save, rails } = await desk();
    const both = await Promise.all([save({ name: "+5V" }), save({ name: "+5v" })]);
    expect(both.filter((answer) => answer.ok)).toHaveLength(1);
    expect(await rails()).toHaveLength(1);
  });

  test.each([
    ["a voltage without figures", { volts: "five" }, "volts"],
    ["no voltage at all", { volts: "" }, "volts: Say what voltage it has."],
    ["zero volts", { volts: "0" }, "volts: A rail at 0 V is ground; it needs no line here."],
    ["milliamperes without the m", { capacityA: "3000" }, "capacityA: 3000 is far too much. Write it such as 3 A."],
    ["a negative capacity", { capacityA: "-1 A" }, "capacityA: -1 A is too little. Write it such as 3 A."],
    ["a width in metres", { widthMm: "5" }, "widthMm: 5 is far too much. Write it such as 3 mm."],
    ["half of the copper", { widthMm: "5 mm" }, "segmentMm: The drop needs all three sizes"],
    ["no name", { name: " " }, "name: Name the rail as the pin map does: +5V."],
  ])("with %s is refused beside the field", async (_what, typed, said) => {
    const { parse } = await desk();
    expect(fieldsOf(parse(typed)).join("\n")).toContain(said);
  });

  test("cannot be fed by a board of another project", async () => {
    const { save } = await desk();
    const elsewhere = await makeBoard(await makeProject(), "SUP");
    expect(await save({ source: elsewhere.id })).toMatchObject({ error: { fields: { source: expect.any(String) } } });
  });

  test("of another project cannot be changed", async () => {
    const { save } = await desk();
    const other = await desk();
    const { id } = await must(other.save());
    expect(await save({ rail: id, version: 1 })).toMatchObject({ error: { code: "not-found" } });
  });
});

describe("a rail that boards take from", () => {
  async function lit() {
    const made = await desk();
    await makeBoard(made.project, "PAN");
    const { id } = await must(made.save());
    const lamps = {
      ...{ kind: "led", label: "Phase lamps", rail: "+5V", count: "8", forwardVolts: "2 V", ohm: "470" },
      ...{ litTypical: "50 %", litWorst: "100 %" },
    };
    const input = { ...made.write(), board: "PAN", line: "", seen: null, typed: lamps };
    await must(savePowerLine(made.scope, savePowerLineInput.parse(input)));
    return { ...made, id };
  }

  test("takes the lines and the logic along when it gets another name", async () => {
    const { save, id, scope, write } = await lit();
    await must(save({ rail: id, version: 1, name: "VCC" }));
    expect((await findConditions(database(), scope)).logicRail).toBe("VCC");
    const removed = await removeRail(scope, { ...write(), rail: id, version: 2 });
    expect(removed).toMatchObject({ error: { message: expect.stringContaining("PAN take current from VCC") } });
  });

  test("is not removed from under them", async () => {
    const { scope, write, id, rails } = await lit();
    const answer = await removeRail(scope, { ...write(), rail: id, version: 1 });
    expect(answer).toMatchObject({ error: { code: "conflict" } });
    expect(await rails()).toHaveLength(1);
  });
});

test("a rename leaves the other conditions as they were set", async () => {
  const { save, conditions, scope } = await desk();
  const { id } = await must(save());
  await must(conditions({ ambientC: "50 °C" }));
  await must(save({ rail: id, version: 1, name: "VCC" }));
  expect(await findConditions(database(), scope)).toMatchObject({ logicRail: "VCC", ambientC: 50, version: 2 });
});

describe("the conditions of the plan", () => {
  test("begin with the first edit, and say in the log what changed", async () => {
    const { conditions, scope } = await desk();
    expect(await must(conditions({ ambientC: "50 °C", sparesPercent: "15" }))).toEqual({ version: 1 });
    const [event] = await database().select().from(events).where(eq(events.projectId, scope.projectId));
    expect(event).toMatchObject({ kind: "plan.conditions", payload: { what: "air at 50\u202f°C, 15\u202f% spares" } });
  });

  test("of two first edits at once, one is refused", async () => {
    const { conditions } = await desk();
    const both = await Promise.all([conditions({ ambientC: "50" }), conditions({ ambientC: "60" })]);
    expect(both.map((answer) => answer.ok).sort()).toEqual([false, true]);
  });

  test("that were changed meanwhile are not overwritten", async () => {
    const { conditions } = await desk();
    await must(conditions({ ambientC: "50 °C" }));
    expect(await conditions({ ambientC: "60 °C" })).toMatchObject({
      error: { code: "conflict", details: { current: { ambientC: 50, version: 1 } } },
    });
  });

  test("that change nothing leave no trace", async () => {
    const { conditions, scope } = await desk();
    expect(await must(conditions({}))).toEqual({ version: 0 });
    expect(await database().select().from(events).where(eq(events.projectId, scope.projectId))).toHaveLength(0);
  });
});
