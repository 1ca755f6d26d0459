import { randomUUID } from "node:crypto";
import { and, eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import { slotOccupancies, slots } from "@/db/schema/boards";
import { events } from "@/db/schema/events";
import { reworkDoubts, reworks, reworkTouches } from "@/db/schema/faults";
import { netlists } from "@/db/schema/netlists";
import { connectors, pins } from "@/db/schema/wiring";
import { recomputeAll } from "@/lib/check/recompute-all";
import { loadComparison, loadReworks } from "@/lib/rework/load-reworks";
import { loadReworkForm } from "@/lib/rework/load-rework-form";
import { recordReworkInput } from "@/lib/rework/schema";
import { checkOf, conforms, fails, must, refusal, send, state, stateOf, statesOf } from "../support/bench";
import { one, useDatabase } from "../support/database";
import { tie, voiding } from "../support/decisions";
import { makeBoard, makeProject, makeUnit } from "../support/project";
import { preview, rework } from "../support/reworks";

const db = useDatabase();

const CHECKS = [
  { title: "Ground is one net", stage: "continuity" as const, covers: { rails: ["GND"] } },
  { title: "PH7 to U6", stage: "continuity" as const, covers: { pins: ["J1 a14"] } },
  { title: "Counts to 255", stage: "function" as const, covers: { signals: ["PH[7:0]"] } },
  { title: "Carry", stage: "function" as const, covers: { signals: ["CARRY_N"] }, needs: ["Counts to 255"] },
];

async function card() {
  const project = await makeProject();
  const { builder, maintainer } = project.scopes;
  const board = await makeBoard(project, "CON", CHECKS);
  const connector = one(
    await db
      .insert(connectors)
      .values({ projectId: project.id, boardId: board.id, reference: "J1", type: "din41612-b64", position: 1 })
      .returning(),
  );
  await db.insert(pins).values([
    { connectorId: connector.id, pin: "a14", signal: "PH7", role: "push-pull output" },
    { connectorId: connector.id, pin: "a1", signal: "GND", role: "ground" },
  ]);
  const unit = await makeUnit(maintainer, board, "CON-01");
  for (const { title } of CHECKS) await state(builder, unit, title, conforms);
  return { project, builder, maintainer, board, unit };
}

type Card = Awaited<ReturnType<typeof card>>;

describe("a rework that touches PH7", () => {
  let it1: Card;
  beforeAll(async () => {
    it1 = await card();
  });

  it("shows before it is saved what comes into doubt, why, and what does not", async () => {
    const { builder, unit } = it1;
    const shown = await preview(builder, unit, { signals: ["PH7"] });
    expect(shown.doubtful.map(({ title, sentences }) => [title, sentences[0]])).toEqual([
      ["PH7 to U6", "It covers J1 a14, which carries PH7; the rework touches PH7."],
      ["Counts to 255", "It covers PH7 of PH[7:0]; the rework touches it."],
      ["Carry", "It relies on “Counts to 255”, which the rework touches."],
    ]);
    expect(shown.untouched.map(({ title }) => title)).toEqual(["Ground is one net"]);
    expect(shown.repeat).toMatchObject({ checks: 3, seconds: null });
    expect(await statesOf(unit)).toBe("passed passed passed passed");
  });

  it("puts exactly those in doubt, tells it once, and repeating the write changes nothing", async () => {
    const { builder, unit, project } = it1;
    const writeId = randomUUID();
    const wire = { number: "W3", from: "U6-12", to: "U9-3", colour: "white", out: false };
    const given = { kind: "bodge-wire", signals: ["PH7"], wire, writeId };
    const seen = (await preview(builder, unit, given)).doubtful.map(({ checkId }) => checkId);
    const first = await must(rework(builder, unit, { ...given, seen }));
    expect(first).toMatchObject({ number: 1, doubtful: 3 });
    expect(await statesOf(unit)).toBe("passed doubtful doubtful doubtful");
    expect((await checkOf(unit, "Counts to 255")).stateReason).toBe(
      "Bodge wire W3: it covers PH7 of PH[7:0]; the rework touches it.",
    );
    expect(await must(rework(builder, unit, { ...given, seen }))).toEqual(first);
    expect(await db.select().from(reworks).where(eq(reworks.unitId, unit.id))).toHaveLength(1);
    const told = await db
      .select({ kind: events.kind })
      .from(events)
      .where(and(eq(events.projectId, project.id), eq(events.subjectId, first.id)));
    expect(told.map(({ kind }) => kind)).toEqual(["rework.recorded"]);
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });

  it("is answered by repeating, check by check", async () => {
    const { builder, unit, project } = it1;
    await state(builder, unit, "PH7 to U6", conforms);
    expect(await statesOf(unit)).toBe("passed passed doubtful doubtful");
    await state(builder, unit, "Counts to 255", conforms);
    expect(await statesOf(unit)).toBe("passed passed passed doubtful");
    await state(builder, unit, "Carry", conforms);
    expect(await statesOf(unit)).toBe("passed passed passed passed");
    expect(await recomputeAll(db, project.id)).toEqual([]);
    const [shown] = (await loadReworks(builder, unit.serial))?.reworks ?? [];
    expect(shown?.doubts.map(({ isAnswered }) => isAnswered)).toEqual([true, true, true]);
  });

  it("comes back when the attempt that answered it is voided", async () => {
    const { builder, maintainer, unit, project } = it1;
    const { id } = await checkOf(unit, "PH7 to U6");
    const again = randomUUID();
    await must(rework(builder, unit, { pins: ["J1 a14"] }));
    await must(send(builder, id, { id: again, record: conforms }));
    expect(await stateOf(unit, "PH7 to U6")).toBe("passed");
    await must(voiding(maintainer, again));
    expect(await stateOf(unit, "PH7 to U6")).toBe("doubtful");
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });
});

describe("what the builder decides", () => {
  it("spares a check with a reason, and adds one that would have stayed", async () => {
    const { builder, unit, project } = await card();
    const [count, ground] = [await checkOf(unit, "Counts to 255"), await checkOf(unit, "Ground is one net")];
    const given = {
      signals: ["PH7"],
      spared: [{ checkId: count.id, reason: "Counted it with the wire on, just now." }],
      added: [{ checkId: ground.id, reason: "The iron was on the ground plane." }],
    };
    const shown = await preview(builder, unit, given);
    expect(shown.spared.map(({ title }) => title)).toEqual(["Counts to 255"]);
    await must(rework(builder, unit, given));
    expect(await statesOf(unit)).toBe("doubtful doubtful passed doubtful");
    expect((await checkOf(unit, "Ground is one net")).stateReason).toBe(
      "Cut track, R1: The iron was on the ground plane.",
    );
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });

  it("is asked for the reason of each check that is spared", () => {
    const parsed = recordReworkInput.safeParse({
      ...{ project: "p", writeId: randomUUID(), unit: "CON-01", kind: "reflow", wire: null, what: "U6 reflowed" },
      ...{ why: "", faultId: null, carriedFrom: null, performedAt: new Date().toISOString(), seen: [], added: [] },
      touches: { signals: ["PH7"], pins: [], parts: [], blocks: [], rails: [] },
      spared: [{ checkId: randomUUID(), reason: "" }],
    });
    expect(parsed.error?.issues.map(({ path }) => path.join("."))).toEqual(["spared.0.reason"]);
  });

  it("must have seen the list as it is now", async () => {
    const { builder, unit } = await card();
    const seen = (await preview(builder, unit, { signals: ["CARRY_N"] })).doubtful.map(({ checkId }) => checkId);
    expect(seen).toHaveLength(1);
    await state(builder, unit, "Carry", fails);
    const refused = await refusal(rework(builder, unit, { signals: ["CARRY_N"], seen }));
    expect(refused).toMatchObject({ code: "conflict" });
    expect(await db.select().from(reworks).where(eq(reworks.unitId, unit.id))).toEqual([]);
  });
});

describe("a rework and what has no pass", () => {
  it("leaves a failed check failed; when its failure is voided the pass before it is in doubt", async () => {
    const { builder, maintainer, unit, project } = await card();
    const { id } = await checkOf(unit, "Carry");
    const failing = randomUUID();
    await must(send(builder, id, { id: failing, record: fails, note: "Stays high." }));
    await must(rework(builder, unit, { signals: ["CARRY_N"] }));
    expect(await stateOf(unit, "Carry")).toBe("failed");
    await must(voiding(maintainer, failing));
    expect(await stateOf(unit, "Carry")).toBe("doubtful");
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });
});

describe("a rework and other units", () => {
  it("reaches checks that rely on it and integration checks of what sits in the machine with it", async () => {
    const { builder, maintainer, unit, project, board } = await card();
    const other = await makeBoard(project, "SUM", [
      { title: "Reads the phase", stage: "integration", covers: { signals: ["PH7"] } },
      { title: "Own sum", stage: "function", covers: { signals: ["PH7"] } },
      { title: "Adds two cards", stage: "integration", covers: { signals: ["SUM0"] } },
    ]);
    const sum = await makeUnit(maintainer, other, "SUM-01");
    await must(tie(maintainer, (await checkOf(sum, "Adds two cards")).id, (await checkOf(unit, "Carry")).id));
    for (const title of ["Reads the phase", "Own sum", "Adds two cards"]) await state(builder, sum, title, conforms);
    const placed = await db
      .insert(slots)
      .values(
        [1, 2].map((position) => ({ projectId: project.id, position, boardId: position === 1 ? board.id : other.id })),
      )
      .returning();
    await db
      .insert(slotOccupancies)
      .values([unit, sum].map(({ id: unitId }, at) => ({ unitId, slotId: placed[at]?.id ?? "" })));
    await must(rework(builder, unit, { signals: ["PH7"] }));
    expect(await statesOf(sum)).toBe("doubtful passed doubtful");
    expect((await checkOf(sum, "Reads the phase")).stateReason).toMatch(/^Cut track, R1 on CON-01: /);
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });

  it("is carried over to another unit with a doubt of its own, and the two are told apart", async () => {
    const { builder, maintainer, unit, board } = await card();
    const second = await makeUnit(maintainer, board, "CON-02");
    for (const { title } of CHECKS) await state(builder, second, title, conforms);
    const wire = { number: "W1", from: "U6-12", to: "U9-3", colour: "white", out: false };
    const first = await must(rework(builder, unit, { kind: "bodge-wire", wire, signals: ["PH7"] }));
    await must(rework(builder, unit, { rails: ["GND"] }));
    const form = await loadReworkForm(builder, { serial: second.serial, fault: undefined, from: first.id });
    expect(form?.start).toMatchObject({ wire, carried: { serial: "CON-01", number: 1 } });
    expect(form?.start.touches.signals).toEqual(["PH7"]);
    await must(rework(builder, second, { kind: "bodge-wire", wire, signals: ["PH7"], carriedFrom: first.id }));
    expect(await statesOf(second)).toBe("passed doubtful doubtful doubtful");
    const compared = await loadComparison(builder, "CON-01", "CON-02");
    expect(compared?.pairs.map(({ here, there }) => [here?.number, there?.number])).toEqual([
      [1, 1],
      [2, undefined],
    ]);
  });
});

describe("a part", () => {
  it("stands for the signals that hang on it in the newest netlist of the revision, ground apart", async () => {
    const { builder, unit, board, project } = await card();
    const point = (part: string, pin: string) => ({ part, pin });
    const nets = [
      { name: "CARRY_N", points: [point("U6", "9"), point("J1", "b14")] },
      { name: "GND", points: [point("U6", "8"), point("J1", "a1")] },
      { name: "PH7", points: [point("U9", "3"), point("J1", "a14")] },
    ];
    const version = { projectId: project.id, revisionId: board.revisionId, source: "pin-list" as const, sha256: "0" };
    await db.insert(netlists).values([
      { ...version, number: 1, content: { nets: [] }, nets: 0, points: 0 },
      { ...version, number: 2, content: { nets }, nets: 3, points: 6 },
    ]);
    const titles = async (given: object) =>
      (await preview(builder, unit, given)).doubtful.map(({ title, sentences }) => [title, sentences[0]]);
    expect(await titles({ kind: "reflow", parts: ["u6"] })).toEqual([
      ["Carry", "It covers CARRY_N; the rework touches u6, which it hangs on."],
    ]);
    expect((await titles({ pins: ["U9-3"] })).map(([title]) => title)).toEqual(["PH7 to U6", "Counts to 255", "Carry"]);
    const { names } = (await loadReworkForm(builder, { serial: unit.serial, fault: undefined, from: "" })) ?? {};
    expect(names?.parts.map(({ name }) => name)).toEqual(["U6", "U9"]);
    expect(names?.pins).toContainEqual({ name: "U6 9", says: "CARRY_N" });
  });
});

describe("a wire", () => {
  it("touches the pins that it joins, whether they are named besides or not", async () => {
    const { builder, unit } = await card();
    const wire = { number: "W1", from: "J1 a14", to: "the via beside C4", colour: "", out: false };
    const { id } = await must(rework(builder, unit, { kind: "bodge-wire", wire }));
    const named = await db.select().from(reworkTouches).where(eq(reworkTouches.reworkId, id));
    expect(named.map(({ kind, name }) => `${kind} ${name}`)).toEqual(["pin J1 a14"]);
    expect(await statesOf(unit)).toBe("passed doubtful doubtful doubtful");
  });

  it("stays on record for ever", async () => {
    const { builder, unit } = await card();
    const { id } = await must(rework(builder, unit, { signals: ["PH7"] }));
    await expect(db.update(reworks).set({ what: "Nothing" }).where(eq(reworks.id, id))).rejects.toThrow();
    await expect(db.delete(reworkDoubts).where(eq(reworkDoubts.reworkId, id))).rejects.toThrow();
  });
});
