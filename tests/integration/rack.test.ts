import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { recordAttempt } from "@/lib/attempt/record-attempt";
import { recordAttemptInput } from "@/lib/attempt/schema";
import { database } from "@/db/client";
import { checks } from "@/db/schema/travelers";
import { eq } from "drizzle-orm";
import { loadPlaceCounts } from "@/lib/rack/load-place-counts";
import { loadRack } from "@/lib/rack/load-rack";
import { rackSentence } from "@/lib/rack/rack-sentence";
import { createSlot } from "@/lib/slot/create-slot";
import { placeUnit } from "@/lib/slot/place-unit";
import { archiveUnit } from "@/lib/unit/archive-unit";
import { queriesOf } from "../support/count-queries";
import { useDatabase } from "../support/database";
import { scopeFor } from "../support/people";
import { makeBoard, makeProject, makeUnit } from "../support/project";

useDatabase();

const CHECKS = [
  { title: "Joints", stage: "inspection", holdPoint: true },
  { title: "Rails to ground", stage: "continuity" },
  { title: "First power", stage: "power-on" },
] as const;

async function machine(cards: number) {
  const project = await makeProject();
  const scope = project.scopes.builder;
  const write = () => ({ project: project.slug, writeId: randomUUID() });
  for (let position = 1; position <= cards; position += 1) {
    const board = await makeBoard(project, `C${position}`, CHECKS);
    const unit = await makeUnit(scope, board, `C${position}-01`);
    const slot = await createSlot(scope, { ...write(), position, label: "", pitchHp: 4, boardId: board.id });
    if (!slot.ok) throw new Error(slot.error.message);
    await placeUnit(scope, { ...write(), slotId: slot.value.id, unitId: unit.id });
  }
  const record = async (serial: string, title: string, conforms: boolean) => {
    const rack = await loadRack(scope);
    const unit = rack.slots.find((slot) => slot.unit?.serial === serial)?.unit;
    const rows = await database()
      .select({ id: checks.id, stage: checks.stage })
      .from(checks)
      .where(eq(checks.unitId, unit?.id ?? ""));
    const stage = CHECKS.find((check) => check.title === title)?.stage;
    const checkId = rows.find((row) => row.stage === stage)?.id ?? "";
    const given = { project: project.slug, id: randomUUID(), checkId, performedAt: new Date().toISOString() };
    const note = conforms ? "" : "Seen under the lens.";
    const answer = await recordAttempt(scope, recordAttemptInput.parse({ ...given, note, record: { conforms } }));
    if (!answer.ok) throw new Error(answer.error.message);
  };
  return { project, scope, write, record };
}

describe("the rack", () => {
  test("asks the database no more for twelve cards than for one, and at most six times with all that is around it", async () => {
    const counts = [];
    for (const cards of [1, 12]) {
      const { project } = await machine(cards);
      const queries = await queriesOf(async () => {
        const scope = await scopeFor(project.viewers.builder, project);
        await loadPlaceCounts(scope);
        await loadRack(scope);
      });
      counts.push(queries.length);
    }
    expect(counts[1]).toBe(counts[0]);
    expect(counts[1]).toBeLessThanOrEqual(6);
  });

  test("shows each check of each unit in its stage, and what waits", async () => {
    const { scope, record } = await machine(2);
    await record("C1-01", "Joints", true);
    const [first, second] = (await loadRack(scope)).slots;
    expect(first?.unit?.stages.map((stage) => stage.states)).toEqual([["passed"], ["untested"], ["untested"], [], []]);
    expect(second?.unit?.stages.map((stage) => stage.states)).toEqual([["untested"], ["waiting"], ["waiting"], [], []]);
  });

  test("puts first on the bench what holds back most, and marks it on its card", async () => {
    const { scope, record } = await machine(2);
    await record("C1-01", "Joints", true);
    const rack = await loadRack(scope);
    expect(rack.next[0]).toMatchObject({ serial: "C2-01", title: "Joints", stage: "inspection" });
    expect(rack.slots[1]?.unit?.marked).toEqual({ group: 0, check: 0 });
  });

  test("counts what fails, in the sentence and beside the places", async () => {
    const { scope, record } = await machine(1);
    await record("C1-01", "Joints", false);
    expect(await loadPlaceCounts(scope)).toEqual({ failing: 1, doubtful: 0, toMend: 0, faults: 0 });
    expect(rackSentence(await loadRack(scope))).toBe("1 slot, 1 card, 3 checks. 0 hold, 1 fails.");
  });

  test("counts since Sunday what was recorded: passed at the first attempt, failed, repeated", async () => {
    const { scope, record } = await machine(1);
    await record("C1-01", "Joints", false);
    await record("C1-01", "Joints", true);
    await record("C1-01", "Rails to ground", true);
    const counts = { attempts: 3, evenings: 1, firstPasses: 1, failures: 1, repeats: 1 };
    expect((await loadRack(scope)).since).toMatchObject({ from: "sunday", ...counts });
  });

  test("leaves archived units and other projects out", async () => {
    const { scope, write } = await machine(1);
    await machine(1);
    const unitId = (await loadRack(scope)).slots[0]?.unit?.id ?? "";
    await archiveUnit(scope, { ...write(), unitId });
    const rack = await loadRack(scope);
    expect(rack.slots.map((slot) => slot.unit)).toEqual([null]);
    expect(rack).toMatchObject({ total: 0, loose: [], next: [] });
  });

  test("lists units in no slot below the drawing", async () => {
    const { project, scope } = await machine(1);
    const board = await makeBoard(project, "SPARE", CHECKS);
    await makeUnit(scope, board, "SPARE-01");
    expect((await loadRack(scope)).loose.map((unit) => unit.serial)).toEqual(["SPARE-01"]);
  });
});
