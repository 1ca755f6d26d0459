import { randomUUID } from "node:crypto";
import { eq, sql } from "drizzle-orm";
import { describe, expect, it, vi } from "vitest";
import type * as Enqueue from "@/lib/jobs/enqueue";
import { events } from "@/db/schema/events";
import { attempts, concessions } from "@/db/schema/travelers";
import { recomputeAll } from "@/lib/check/recompute-all";
import { reopenCheck } from "@/lib/check/reopen-check";
import { checkOf, conforms, fails, must, refusal, send, state, stateOf, statesOf } from "../support/bench";
import { one, useDatabase } from "../support/database";
import { concede, lift, reopen, voiding, withdraw } from "../support/decisions";
import { makeBoard, makeProject, makeUnit } from "../support/project";
import { makeViewer } from "../support/people";
import { memberships } from "@/db/schema/projects";

const db = useDatabase();

const CHECKS = [{ title: "Look" }, { title: "Rails", holdPoint: true }, { title: "Clock" }, { title: "Count" }];

async function bench() {
  const project = await makeProject();
  const { maintainer, builder } = project.scopes;
  const unit = await makeUnit(maintainer, await makeBoard(project, "TIM", CHECKS), "TIM-01");
  const idOf = async (title: string) => (await checkOf(unit, title)).id;
  return { project, maintainer, builder, unit, idOf };
}

/** Attempts cannot be edited; a test that needs an old one writes it as the purge may. */
async function makeOld(attemptId: string, minutes: number) {
  await db.transaction(async (tx) => {
    await tx.execute(sql`set local boardwake.purge = 'on'`);
    await tx.execute(
      sql`update attempts set recorded_at = now() - make_interval(mins => ${minutes}) where id = ${attemptId}`,
    );
  });
}

/** What was enqueued, in order; a worker may take the jobs before a test could look for them. */
const mails = vi.hoisted((): unknown[] => []);
vi.mock("@/lib/jobs/enqueue", async (original) => {
  const { enqueue } = await original<typeof Enqueue>();
  const watched: typeof enqueue = async (tx, name, payload, options) => {
    mails.push({ name, payload });
    return enqueue(tx, name, payload, options);
  };
  return { enqueue: watched };
});

describe("voiding an attempt", () => {
  it("returns the check to where it was, and keeps the attempt with the reason", async () => {
    const { builder, unit } = await bench();
    await state(builder, unit, "Look", conforms);
    const slip = await state(builder, unit, "Look", fails);
    expect(await stateOf(unit, "Look")).toBe("failed");
    expect(await must(voiding(builder, slip.attemptId))).toEqual({ state: "passed" });
    expect(one(await db.select().from(attempts).where(eq(attempts.id, slip.attemptId))).verdict).toBe(
      "does-not-conform",
    );
    const said = one(
      (await db.select().from(events).where(eq(events.subjectId, slip.attemptId))).filter(
        (row) => row.kind === "attempt.voided",
      ),
    );
    expect(said.payload).toEqual({ serial: "TIM-01", title: "Look", reason: "Probe slipped." });
  });

  it("makes checks wait again when a hold point's only pass is void", async () => {
    const { builder, unit } = await bench();
    const pass = await state(builder, unit, "Rails", conforms);
    expect(await statesOf(unit)).toBe("untested passed untested untested");
    await must(voiding(builder, pass.attemptId));
    expect(await statesOf(unit)).toBe("untested untested waiting waiting");
  });

  it("is its author's for ten minutes and a maintainer's at any time", async () => {
    const { project, builder, maintainer, unit } = await bench();
    const nils = await makeViewer({ name: "Nils" });
    await db.insert(memberships).values({ projectId: project.id, userId: nils.userId, role: "builder" });
    const fresh = await state(builder, unit, "Look", conforms);
    expect(await refusal(voiding({ ...builder, viewer: nils }, fresh.attemptId))).toMatchObject({ code: "forbidden" });
    const old = await state(builder, unit, "Look", conforms);
    await makeOld(old.attemptId, 11);
    expect(await refusal(voiding(builder, old.attemptId))).toMatchObject({
      code: "forbidden",
      message: expect.stringContaining("10 minutes"),
    });
    const justIn = await state(builder, unit, "Look", conforms);
    await makeOld(justIn.attemptId, 9);
    expect(await must(voiding(builder, justIn.attemptId))).toEqual({ state: "passed" });
    expect(await must(voiding(maintainer, old.attemptId))).toEqual({ state: "passed" });
  });

  it("happens once", async () => {
    const { builder, unit } = await bench();
    const { attemptId } = await state(builder, unit, "Look", conforms);
    const answers = await Promise.all([voiding(builder, attemptId), voiding(builder, attemptId)]);
    expect(answers.filter((answer) => answer.ok)).toHaveLength(1);
    expect(await stateOf(unit, "Look")).toBe("untested");
  });
});

describe("reopening a check", () => {
  it("asks for it to be repeated, with the reason on the traveler, until an attempt answers it", async () => {
    const { builder, maintainer, unit, idOf } = await bench();
    await state(builder, unit, "Look", conforms);
    expect(await must(reopen(maintainer, await idOf("Look"), "The photo is blurred."))).toEqual({ state: "reopened" });
    expect(await checkOf(unit, "Look")).toMatchObject({
      state: "reopened",
      stateReason: "Reopened: The photo is blurred.",
    });
    await state(builder, unit, "Look", conforms);
    expect(await checkOf(unit, "Look")).toMatchObject({ state: "passed", stateReason: "" });
  });

  it("mails the builder who carried it out, in the same change, unless it was oneself or they declined", async () => {
    const { project, builder, maintainer, unit, idOf } = await bench();
    await state(builder, unit, "Look", conforms);
    mails.length = 0;
    const writeId = randomUUID();
    await must(
      reopenCheck(maintainer, { project: project.slug, writeId, checkId: await idOf("Look"), reason: "Again." }),
    );
    const mail = { name: "send-mail", payload: { kind: "check-reopened", id: writeId } };
    expect(mails.splice(0)).toEqual([mail]);
    await state(maintainer, unit, "Look", conforms);
    await must(reopen(maintainer, await idOf("Look")));
    const quiet = await makeViewer({ name: "Nils", mailOnReopen: false });
    await db.insert(memberships).values({ projectId: project.id, userId: quiet.userId, role: "builder" });
    await state({ ...builder, viewer: quiet }, unit, "Look", conforms);
    await must(reopen(maintainer, await idOf("Look")));
    expect(mails).toEqual([]);
  });

  it("is refused while there is nothing to repeat", async () => {
    const { builder, maintainer, unit, idOf } = await bench();
    expect(await refusal(reopen(maintainer, await idOf("Look")))).toMatchObject({ code: "conflict" });
    await state(builder, unit, "Look", conforms);
    await must(reopen(maintainer, await idOf("Look")));
    expect(await refusal(reopen(maintainer, await idOf("Look")))).toMatchObject({ code: "conflict" });
  });

  it("of a hold point holds back what comes after, without taking what passed", async () => {
    const { builder, maintainer, unit, idOf } = await bench();
    await state(builder, unit, "Rails", conforms);
    await state(builder, unit, "Clock", conforms);
    await must(reopen(maintainer, await idOf("Rails")));
    expect(await statesOf(unit)).toBe("untested reopened passed waiting");
    expect(await refusal(send(builder, await idOf("Clock"), { record: conforms }))).toMatchObject({ code: "blocked" });
  });
});

describe("a concession", () => {
  it("accepts what does not conform, lets go what waited, and falls with the next attempt", async () => {
    const { builder, maintainer, unit, idOf } = await bench();
    await state(builder, unit, "Rails", fails);
    expect(await statesOf(unit)).toBe("untested failed waiting waiting");
    expect(await must(concede(maintainer, await idOf("Rails")))).toEqual({ state: "conceded" });
    expect(await statesOf(unit)).toBe("untested conceded untested untested");
    await state(builder, unit, "Rails", fails);
    expect(await statesOf(unit)).toBe("untested failed waiting waiting");
  });

  it("is only for a check that fails, and can be withdrawn once", async () => {
    const { builder, maintainer, unit, idOf } = await bench();
    expect(await refusal(concede(maintainer, await idOf("Look")))).toMatchObject({ code: "conflict" });
    await state(builder, unit, "Look", fails);
    await must(concede(maintainer, await idOf("Look")));
    expect(await refusal(concede(maintainer, await idOf("Look")))).toMatchObject({ code: "conflict" });
    const { id } = one(
      await db
        .select({ id: concessions.id })
        .from(concessions)
        .where(eq(concessions.checkId, await idOf("Look"))),
    );
    expect(await must(withdraw(maintainer, id))).toEqual({ state: "failed" });
    expect(await refusal(withdraw(maintainer, id))).toMatchObject({ code: "conflict" });
  });

  it("comes back when the attempt after it is void", async () => {
    const { builder, maintainer, unit, idOf } = await bench();
    await state(builder, unit, "Look", fails);
    await must(concede(maintainer, await idOf("Look")));
    const again = await state(builder, unit, "Look", conforms);
    await must(voiding(builder, again.attemptId));
    expect(await stateOf(unit, "Look")).toBe("conceded");
  });
});

describe("lifting a hold", () => {
  it("lets this unit go on, though the hold point stays open", async () => {
    const { builder, maintainer, unit, idOf } = await bench();
    await must(lift(maintainer, await idOf("Rails")));
    expect(await statesOf(unit)).toBe("untested untested untested untested");
    expect((await state(builder, unit, "Clock", conforms)).state).toBe("passed");
  });

  it("is for an open hold point, once", async () => {
    const { maintainer, unit, idOf } = await bench();
    expect(await refusal(lift(maintainer, await idOf("Look")))).toMatchObject({ code: "conflict" });
    await must(lift(maintainer, await idOf("Rails")));
    expect(await refusal(lift(maintainer, await idOf("Rails")))).toMatchObject({ code: "conflict" });
    const other = await bench();
    await state(other.builder, other.unit, "Rails", conforms);
    expect(await refusal(lift(other.maintainer, await other.idOf("Rails")))).toMatchObject({ code: "conflict" });
    expect(await stateOf(unit, "Clock")).toBe("untested");
  });
});

describe("a hold point that fails on repeat", () => {
  it("puts in doubt what passed after it, says so in the log, and the doubt ends with the repeat", async () => {
    const { project, builder, unit } = await bench();
    for (const title of ["Rails", "Clock", "Count"]) await state(builder, unit, title, conforms);
    await state(builder, unit, "Rails", fails);
    expect(await statesOf(unit)).toBe("untested failed doubtful doubtful");
    const said = (await db.select().from(events).where(eq(events.projectId, project.id))).filter(
      (row) => row.kind === "check.doubted",
    );
    expect(said.map((row) => row.payload)).toContainEqual({
      serial: "TIM-01",
      title: "Clock",
      reason: "“Rails” failed afterwards, and this check relies on it.",
    });
    await state(builder, unit, "Rails", conforms);
    expect(await statesOf(unit)).toBe("untested passed doubtful doubtful");
    await state(builder, unit, "Clock", conforms);
    expect(await statesOf(unit)).toBe("untested passed passed doubtful");
    expect(await recomputeAll(db, project.id)).toEqual([]);
  });
});

describe("from another project", () => {
  it("checks, attempts and concessions are not found, and nothing changes", async () => {
    const { builder, maintainer, unit, idOf } = await bench();
    const { attemptId } = await state(builder, unit, "Look", fails);
    await must(concede(maintainer, await idOf("Look")));
    const { id } = one(
      await db.select({ id: concessions.id }).from(concessions).where(eq(concessions.attemptId, attemptId)),
    );
    const stranger = (await makeProject()).scopes.maintainer;
    const before = await statesOf(unit);
    for (const attempt of [
      reopen(stranger, await idOf("Look")),
      lift(stranger, await idOf("Rails")),
      concede(stranger, await idOf("Look")),
      withdraw(stranger, id),
      voiding(stranger, attemptId),
    ]) {
      expect(await refusal(attempt)).toMatchObject({ code: "not-found" });
    }
    expect(await statesOf(unit)).toBe(before);
  });
});
