import { randomUUID } from "node:crypto";
import { isNotNull, and, eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { units } from "@/db/schema/boards";
import { attempts, checkPrerequisites, checks } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { recomputeAll } from "@/lib/check/recompute-all";
import { loadMove } from "@/lib/traveler/load-move";
import { loadTraveler } from "@/lib/traveler/load-traveler";
import { moveTraveler } from "@/lib/traveler/move-traveler";
import { startUnitTraveler } from "@/lib/traveler/start-unit-traveler";
import { checkOf, conforms, fails, must, refusal, send, state, statesOf } from "../support/bench";
import { one, useDatabase } from "../support/database";
import { concede, lift, reopen, tie, voiding } from "../support/decisions";
import { makeBoard, makeEvidence, makeProject, makeUnit } from "../support/project";

const db = useDatabase();

const move = (scope: ProjectScope, unit: string, from: number, to: number) =>
  moveTraveler(scope, { project: scope.slug, writeId: randomUUID(), unit, from, to });

async function bench() {
  const project = await makeProject();
  const { maintainer, builder } = project.scopes;
  const board = await makeBoard(project, "CON", [
    { title: "Look", stage: "inspection" },
    { title: "Rails", limits: "4.75 … 5.25 V", holdPoint: true },
    { title: "Clock", needs: ["Look"] },
    { title: "Old habit" },
  ]);
  const unit = await makeUnit(maintainer, board, "CON-01");
  return { project, maintainer, builder, board, unit };
}

/** Version 2: Look is reworded, Rails has tighter limits, Old habit is gone, Count is new and needs Clock. */
const VERSION_2 = [
  { title: "Look", stage: "inspection" as const, instruction: "Under ×10, from both sides." },
  { title: "Rails", limits: "4.9 … 5.1 V", holdPoint: true },
  { title: "Clock", needs: ["Look"] },
  { title: "Count", needs: ["Clock"] },
];

describe("starting a traveler", () => {
  it("instantiates the newest issued version with its prerequisites, and everything that must wait waits", async () => {
    const { unit } = await bench();
    expect(await statesOf(unit)).toBe("untested untested waiting waiting");
    const edges = await db
      .select()
      .from(checkPrerequisites)
      .where(eq(checkPrerequisites.checkId, (await checkOf(unit, "Clock")).id));
    expect(edges.map((edge) => edge.needsCheckId)).toEqual([(await checkOf(unit, "Look")).id]);
  });

  it("happens once a unit, and needs an issued procedure", async () => {
    const { project, maintainer, board } = await bench();
    const input = { project: project.slug, writeId: randomUUID(), unit: "CON-01" };
    expect(await refusal(startUnitTraveler(maintainer, input))).toMatchObject({ code: "conflict" });
    const late = one(
      await db
        .insert(units)
        .values({ projectId: project.id, boardId: board.id, revisionId: board.revisionId, serial: "CON-02" })
        .returning(),
    );
    expect(await must(startUnitTraveler(maintainer, { ...input, writeId: randomUUID(), unit: late.serial }))).toEqual({
      number: 1,
    });
    const stranger = (await makeProject()).scopes.maintainer;
    expect(await refusal(startUnitTraveler(stranger, { ...input, writeId: randomUUID() }))).toMatchObject({
      code: "not-found",
    });
  });
});

describe("moving a traveler to a newer version", () => {
  it("shows first what stays, what changed and how, what is new and what goes", async () => {
    const { maintainer, board } = await bench();
    expect(await loadMove(maintainer, "CON-01")).toBeUndefined();
    await board.issue(2, VERSION_2);
    const view = await loadMove(maintainer, "CON-01");
    expect(view).toMatchObject({ from: 1, to: 2 });
    expect(view?.difference.kept.map((check) => [check.title, check.edits.map((edit) => edit.what)])).toEqual([
      ["Look", ["instruction"]],
      ["Clock", []],
    ]);
    const changed = one(view?.difference.changed ?? []);
    expect(changed.title).toBe("Rails");
    expect(changed.edits.map((edit) => `${edit.what}: ${edit.from} → ${edit.to}`.replaceAll("\u202f", " "))).toEqual([
      "expectation: Reading with limits: 4.75 … 5.25 V → Reading with limits: 4.9 … 5.1 V",
    ]);
    expect(view?.difference.added.map((check) => check.title)).toEqual(["Count"]);
    expect(view?.difference.dropped.map((check) => check.title)).toEqual(["Old habit"]);
  });

  it("keeps the attempts of unchanged checks and retires the rest with their history", async () => {
    const { project, maintainer, builder, board, unit } = await bench();
    await state(builder, unit, "Look", conforms);
    const rails = await checkOf(unit, "Rails");
    const measured = await must(send(builder, rails.id, { record: { typed: "5.2" } }));
    const clock = await state(builder, unit, "Clock", conforms);
    await board.issue(2, VERSION_2);
    expect(await must(move(maintainer, "CON-01", 1, 2))).toEqual({
      from: 1,
      to: 2,
      kept: 2,
      changed: 1,
      added: 1,
      dropped: 1,
    });
    expect(await statesOf(unit)).toBe("passed untested passed waiting");
    expect((await checkOf(unit, "Clock")).lastAttemptId).toBe(clock.attemptId);
    const loaded = await loadTraveler(maintainer, "CON-01");
    if (loaded.kind !== "traveler") throw new Error("no traveler");
    expect(loaded.traveler.procedure).toMatchObject({ number: 2, newestNumber: 2 });
    expect(loaded.traveler.retired.map((check) => check.title)).toEqual(["Rails", "Old habit"]);
    expect(loaded.traveler.retired[0]?.attempts.map((attempt) => attempt.id)).toEqual([measured.attemptId]);
    expect(await refusal(send(builder, rails.id, { record: { typed: "5.0" } }))).toMatchObject({ code: "conflict" });
    expect(await refusal(move(maintainer, "CON-01", 1, 2))).toMatchObject({ code: "conflict" });
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });

  it("carries what other units wait for over to the check that took its place, and lets go what waits for a dropped one", async () => {
    const { project, maintainer, builder, board, unit } = await bench();
    const sum = await makeUnit(
      maintainer,
      await makeBoard(project, "SUM", [{ title: "Add" }, { title: "Carry" }]),
      "SUM-01",
    );
    const [add, carry] = [await checkOf(sum, "Add"), await checkOf(sum, "Carry")];
    await must(tie(maintainer, add.id, (await checkOf(unit, "Rails")).id));
    await must(tie(maintainer, carry.id, (await checkOf(unit, "Old habit")).id));
    await must(send(builder, (await checkOf(unit, "Rails")).id, { record: { typed: "5.0" } }));
    expect(await statesOf(sum)).toBe("untested waiting");
    await board.issue(2, VERSION_2);
    await must(move(maintainer, "CON-01", 1, 2));
    expect(await statesOf(sum)).toBe("waiting untested");
    await must(send(builder, (await checkOf(unit, "Rails")).id, { record: { typed: "5.0" } }));
    expect(await statesOf(sum)).toBe("untested untested");
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });

  it("is refused when the differences one saw are not the ones that would apply", async () => {
    const { maintainer, board, unit } = await bench();
    await board.issue(2, VERSION_2);
    await board.issue(3, VERSION_2);
    const error = await refusal(move(maintainer, "CON-01", 1, 2));
    expect(error).toMatchObject({ code: "conflict", details: { current: { from: 1, to: 3 } } });
    expect(await statesOf(unit)).toBe("untested untested waiting waiting");
  });

  it("is refused when the new version closes a circle with a prerequisite added by hand", async () => {
    const { project, maintainer, board, unit } = await bench();
    await must(tie(maintainer, (await checkOf(unit, "Look")).id, (await checkOf(unit, "Rails")).id));
    await board.issue(2, [
      { title: "Look", stage: "inspection" },
      { title: "Rails", limits: "4.75 … 5.25 V", holdPoint: true, needs: ["Look"] },
    ]);
    expect(await refusal(move(maintainer, "CON-01", 1, 2))).toMatchObject({
      code: "conflict",
      message: expect.stringContaining("circle"),
    });
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });
});

describe("the traveler as it is shown", () => {
  it("has every check with its whole history, in few queries", async () => {
    const { project, maintainer, builder, unit } = await bench();
    await state(builder, unit, "Look", fails);
    const look = await checkOf(unit, "Look");
    await must(concede(maintainer, look.id, "Only the silk screen."));
    await must(reopen(maintainer, look.id, "Better light."));
    const photo = await makeEvidence(project);
    const second = await must(send(builder, look.id, { record: conforms, attachmentIds: [photo], note: "×10" }));
    await must(voiding(builder, second.attemptId, "Wrong board."));
    await must(lift(maintainer, (await checkOf(unit, "Rails")).id, "No supply today."));
    const loaded = await loadTraveler(builder, "CON-01");
    if (loaded.kind !== "traveler") throw new Error("no traveler");
    const { unit: head, board, revision, slot, checks: shown } = loaded.traveler;
    expect({ head, board: board.code, revision: revision.letter, slot }).toMatchObject({
      head: { serial: "CON-01" },
      board: "CON",
      revision: "A",
      slot: null,
    });
    expect(shown.map((check) => [check.number, check.title, check.state])).toEqual([
      [1, "Look", "reopened"],
      [2, "Rails", "untested"],
      [3, "Clock", "waiting"],
      [4, "Old habit", "untested"],
    ]);
    const [first, rails, clock] = shown;
    expect(
      first?.attempts.map((attempt) => [
        attempt.verdict,
        attempt.by.name,
        attempt.voided?.reason ?? null,
        attempt.evidence.map((file) => file.id),
      ]),
    ).toEqual([
      ["conforms", "Bram", "Wrong board.", [photo]],
      ["does-not-conform", "Bram", null, []],
    ]);
    expect(first?.concessions[0]).toMatchObject({
      by: { name: "Mira" },
      reason: "Only the silk screen.",
      withdrawn: null,
    });
    expect(first?.reopenings[0]).toMatchObject({ reason: "Better light." });
    expect(rails?.holdLifts[0]).toMatchObject({ reason: "No supply today." });
    expect(rails?.expectation.replaceAll("\u202f", " ")).toBe("4.75 … 5.25 V");
    expect(clock?.blockers).toEqual([
      { checkId: look.id, serial: "CON-01", title: "Look", state: "reopened", why: "prerequisite" },
    ]);
  });

  it("tells a unit without a traveler from one that is not there, or belongs to another project", async () => {
    const { project, maintainer, board } = await bench();
    await db
      .insert(units)
      .values({ projectId: project.id, boardId: board.id, revisionId: board.revisionId, serial: "CON-02" });
    expect(await loadTraveler(maintainer, "CON-02")).toMatchObject({ kind: "none", unit: { newestNumber: 1 } });
    expect(await loadTraveler(maintainer, "CON-99")).toEqual({ kind: "missing" });
    expect(await loadTraveler((await makeProject()).scopes.maintainer, "CON-01")).toEqual({ kind: "missing" });
  });

  it("loses nothing of what is retired", async () => {
    const { maintainer, builder, board, unit } = await bench();
    await must(send(builder, (await checkOf(unit, "Rails")).id, { record: { typed: "5.0" } }));
    await board.issue(2, [{ title: "Look" }]);
    await must(move(maintainer, "CON-01", 1, 2));
    const kept = await db
      .select({ id: checks.id })
      .from(checks)
      .innerJoin(attempts, eq(attempts.checkId, checks.id))
      .where(and(eq(checks.unitId, unit.id), isNotNull(checks.retiredAt)));
    expect(kept).toHaveLength(1);
  });
});
