import { randomUUID } from "node:crypto";
import { and, eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { boards, slots, units } from "@/db/schema/boards";
import { events } from "@/db/schema/events";
import { attachments, logEntries } from "@/db/schema/evidence";
import { faults, reworks } from "@/db/schema/faults";
import { procedures } from "@/db/schema/procedures";
import { attempts, checkPrerequisites, checks } from "@/db/schema/travelers";
import { archiveBoard } from "@/lib/board/archive-board";
import { loadBoard } from "@/lib/board/load-board";
import { purgeBoard } from "@/lib/board/purge-board";
import { recomputeAll } from "@/lib/check/recompute-all";
import { addPrerequisite } from "@/lib/prerequisite/add-prerequisite";
import { archiveUnit } from "@/lib/unit/archive-unit";
import { purgeUnit } from "@/lib/unit/purge-unit";
import { checkOf, conforms, must, refusal, send, state, stateOf } from "../support/bench";
import { one, useDatabase } from "../support/database";
import { fault } from "../support/faults";
import { rework } from "../support/reworks";
import { makeBoard, makeEvidence, makeProject, makeUnit } from "../support/project";

const db = useDatabase();

/** A supply with a failed check, a clock card that waits for it, and a photo at each of three places. */
async function machine() {
  const project = await makeProject();
  const { maintainer, builder } = project.scopes;
  const supply = await makeBoard(project, "PSU", [{ title: "No bridges", stage: "inspection" }, { title: "5 V rail" }]);
  const clock = await makeBoard(project, "TIM", [{ title: "Clock runs", stage: "function" }]);
  const psu = await makeUnit(maintainer, supply, "PSU-01");
  const spare = await makeUnit(maintainer, supply, "PSU-02");
  const tim = await makeUnit(maintainer, clock, "TIM-01");
  const write = () => ({ project: project.slug, writeId: randomUUID() });
  const rail = await checkOf(psu, "5 V rail");
  const clockRuns = await checkOf(tim, "Clock runs");
  await must(addPrerequisite(maintainer, { ...write(), checkId: clockRuns.id, needsCheckId: rail.id }));
  const photo = await makeEvidence(project);
  await must(send(builder, rail.id, { record: { conforms: false }, note: "3.1 V.", attachmentIds: [photo] }));
  await state(builder, spare, "No bridges", conforms);
  return { project, maintainer, builder, supply, clock, psu, spare, tim, rail, photo, write };
}

type Machine = Awaited<ReturnType<typeof machine>>;

async function archivedUnit(given: Machine) {
  await must(archiveUnit(given.maintainer, { ...given.write(), unitId: given.psu.id }));
  return { ...given.write(), unitId: given.psu.id, confirmation: "PSU-01" };
}

async function saidOf({ project }: Machine, kind: string) {
  const ours = and(eq(events.projectId, project.id), eq(events.kind, kind));
  return one(await db.select().from(events).where(ours));
}

describe("purging a unit", () => {
  it("takes its faults and reworks, and lets go what those put in doubt elsewhere", async () => {
    const given = await machine();
    const { maintainer, builder, psu, tim, rail, project } = given;
    await must(send(builder, rail.id, { record: conforms }));
    await state(builder, tim, "Clock runs", conforms);
    const { number } = await must(fault(builder, { unit: "PSU-01", checkId: rail.id }));
    const { id: faultId } = one(
      await db
        .select()
        .from(faults)
        .where(and(eq(faults.projectId, project.id), eq(faults.number, number))),
    );
    await must(rework(builder, psu, { rails: ["+5V"], added: [{ checkId: rail.id, reason: "" }] }));
    expect(await stateOf(tim, "Clock runs")).toBe("doubtful");
    const input = await archivedUnit(given);
    await must(purgeUnit(maintainer, input));
    expect(await db.select().from(faults).where(eq(faults.id, faultId))).toEqual([]);
    expect(await db.select().from(reworks).where(eq(reworks.projectId, project.id))).toEqual([]);
    expect(await stateOf(tim, "Clock runs")).toBe("passed");
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });

  it("is refused while it is in work, and unless its serial number is typed exactly", async () => {
    const given = await machine();
    const early = { ...given.write(), unitId: given.psu.id, confirmation: "PSU-01" };
    expect(await refusal(purgeUnit(given.maintainer, early))).toMatchObject({ code: "conflict" });
    const input = await archivedUnit(given);
    expect(await refusal(purgeUnit(given.maintainer, { ...input, confirmation: "PSU-1" }))).toMatchObject({
      fields: { confirmation: "Type the serial number exactly: PSU-01" },
    });
    expect(await db.select().from(units).where(eq(units.id, given.psu.id))).toHaveLength(1);
    expect(await db.select().from(attempts).where(eq(attempts.unitId, given.psu.id))).toHaveLength(1);
  });

  it("takes its checks, attempts and files, as was shown before, says so in the log, and takes nothing of its sister", async () => {
    const given = await machine();
    const input = await archivedUnit(given);
    const shown = (await loadBoard(given.maintainer, "PSU"))?.units.find((unit) => unit.serial === "PSU-01")?.holds;
    expect(shown).toMatchObject({ checks: 2, attempts: 1, files: 1, waitsOfOtherUnits: 1 });
    expect(await must(purgeUnit(given.maintainer, input))).toEqual({ serial: "PSU-01" });
    expect(await db.select().from(checks).where(eq(checks.unitId, given.psu.id))).toEqual([]);
    expect(await db.select().from(attempts).where(eq(attempts.unitId, given.psu.id))).toEqual([]);
    // Without a row nobody can ask for the file any more, and the sweep deletes its object.
    expect(await db.select().from(attachments).where(eq(attachments.id, given.photo))).toEqual([]);
    const said = await saidOf(given, "unit.purged");
    expect(said.payload).toEqual({ serial: "PSU-01", checks: 2, attempts: 1, files: 1, waits: 1 });
    expect(await db.select().from(attempts).where(eq(attempts.unitId, given.spare.id))).toHaveLength(1);
    // Its serial number is free again; what the log said of it stays.
    expect((await loadBoard(given.maintainer, "PSU"))?.units.map((unit) => unit.serial)).toEqual(["PSU-02"]);
    expect(await db.select().from(events).where(eq(events.unitId, given.psu.id))).not.toHaveLength(1);
  });

  it("lets go what waited for it: the prerequisite goes, and the state is what history says", async () => {
    const given = await machine();
    expect(await stateOf(given.tim, "Clock runs")).toBe("waiting");
    await must(purgeUnit(given.maintainer, await archivedUnit(given)));
    expect(
      await db.select().from(checkPrerequisites).where(eq(checkPrerequisites.needsCheckId, given.rail.id)),
    ).toEqual([]);
    expect(await checkOf(given.tim, "Clock runs")).toMatchObject({ state: "untested", stateReason: "" });
    expect(await recomputeAll(db, given.project.id)).toEqual([]);
  });

  it("keeps log entries with their pictures: they are the project's, not the unit's", async () => {
    const given = await machine();
    const entry = { id: randomUUID(), projectId: given.project.id, unitId: given.psu.id, title: "It smoked." };
    await db.insert(logEntries).values(entry);
    const picture = await makeEvidence(given.project);
    const place = { logEntryId: entry.id, unitId: given.psu.id };
    await db.update(attachments).set(place).where(eq(attachments.id, picture));
    await must(purgeUnit(given.maintainer, await archivedUnit(given)));
    expect(one(await db.select().from(logEntries).where(eq(logEntries.id, entry.id))).unitId).toBeNull();
    expect(one(await db.select().from(attachments).where(eq(attachments.id, picture)))).toMatchObject({
      logEntryId: entry.id,
      unitId: null,
    });
  });

  it("done twice by the same write does it once; a new write finds nothing", async () => {
    const given = await machine();
    const input = await archivedUnit(given);
    await must(purgeUnit(given.maintainer, input));
    expect(await must(purgeUnit(given.maintainer, input))).toEqual({ serial: "PSU-01" });
    expect(await refusal(purgeUnit(given.maintainer, { ...input, writeId: randomUUID() }))).toMatchObject({
      code: "not-found",
    });
  });
});

describe("purging a board", () => {
  it("is refused while it is in work, and unless its code is typed exactly", async () => {
    const given = await machine();
    const input = { ...given.write(), boardId: given.supply.id, confirmation: "PSU" };
    expect(await refusal(purgeBoard(given.maintainer, input))).toMatchObject({ code: "conflict" });
    await must(archiveBoard(given.maintainer, { ...given.write(), boardId: given.supply.id }));
    expect(await refusal(purgeBoard(given.maintainer, { ...input, confirmation: "psu" }))).toMatchObject({
      fields: { confirmation: "Type the code exactly: PSU" },
    });
    expect(await db.select().from(boards).where(eq(boards.id, given.supply.id))).toHaveLength(1);
  });

  it("takes its units, revisions and procedures; its slot takes any card then, other boards keep what they have", async () => {
    const given = await machine();
    const wired = { projectId: given.project.id, position: 1, boardId: given.supply.id };
    await db.insert(slots).values(wired);
    await must(archiveBoard(given.maintainer, { ...given.write(), boardId: given.supply.id }));
    const input = { ...given.write(), boardId: given.supply.id, confirmation: "PSU" };
    expect(await must(purgeBoard(given.maintainer, input))).toEqual({ code: "PSU" });
    expect(await loadBoard(given.maintainer, "PSU")).toBeUndefined();
    expect(await db.select().from(units).where(eq(units.boardId, given.supply.id))).toEqual([]);
    expect(await db.select().from(procedures).where(eq(procedures.boardId, given.supply.id))).toEqual([]);
    expect(one(await db.select().from(slots).where(eq(slots.projectId, given.project.id))).boardId).toBeNull();
    const said = await saidOf(given, "board.purged");
    expect(said.payload).toMatchObject({ code: "PSU", units: 2, checks: 4, attempts: 2, files: 1, waits: 1 });
    expect(await stateOf(given.tim, "Clock runs")).toBe("untested");
    expect(await recomputeAll(db, given.project.id)).toEqual([]);
  });
});
