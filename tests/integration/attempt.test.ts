import { randomUUID } from "node:crypto";
import { eq, sql } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { attachments } from "@/db/schema/evidence";
import { events } from "@/db/schema/events";
import { attempts, readings } from "@/db/schema/travelers";
import { checkOf, conforms, fails, must, refusal, send, state, stateOf, statesOf } from "../support/bench";
import { useDatabase, one } from "../support/database";
import { makeInstrument, makeViewer, scopeFor } from "../support/people";
import { makeBoard, makeEvidence, makeProject, makeUnit } from "../support/project";
import { memberships } from "@/db/schema/projects";

const db = useDatabase();

const CHECKS = [
  { title: "No bridges under the lens", stage: "inspection" as const },
  { title: "5 V rail to ground", limits: "200 Ω … 2 kΩ", stage: "continuity" as const, holdPoint: true },
  { title: "5 V rail, no load", limits: "4.75 … 5.25 V" },
];

async function bench(options: Parameters<typeof makeProject>[0] = {}) {
  const project = await makeProject(options);
  const board = await makeBoard(project, "PSU", CHECKS);
  const unit = await makeUnit(project.scopes.maintainer, board, "PSU-01");
  return { project, board, unit, builder: project.scopes.builder, maintainer: project.scopes.maintainer };
}

async function pastTheHold(given: Awaited<ReturnType<typeof bench>>) {
  await must(send(given.builder, (await checkOf(given.unit, "5 V rail to ground")).id, { record: { typed: "1k2" } }));
  return checkOf(given.unit, "5 V rail, no load");
}

describe("recording an attempt", () => {
  it("is judged by the server, keeps the reading, and moves the check and what waits behind its hold point", async () => {
    const given = await bench();
    expect(await statesOf(given.unit)).toBe("untested untested waiting");
    const hold = await checkOf(given.unit, "5 V rail to ground");
    const answer = await must(send(given.builder, hold.id, { record: { typed: "1k24" } }));
    expect(answer).toMatchObject({ verdict: "conforms", from: "untested", state: "passed", overtook: null });
    expect(answer.summary.replace("\u2009", " ")).toBe("1.24 kΩ");
    expect(await statesOf(given.unit)).toBe("untested passed untested");
    const reading = one(await db.select().from(readings).where(eq(readings.attemptId, answer.attemptId)));
    expect(reading).toMatchObject({
      typed: "1k24",
      value: 1240,
      unit: "Ω",
      lower: 200,
      upper: 2000,
      verdict: "conforms",
    });
  });

  it("takes no verdict from the client", async () => {
    const given = await bench();
    const check = await pastTheHold(given);
    const answer = await must(
      send(given.builder, check.id, { record: { typed: "5.6", verdict: "conforms", conforms: true } }),
    );
    expect(answer).toMatchObject({ verdict: "does-not-conform", state: "failed" });
    const kept = one(await db.select().from(attempts).where(eq(attempts.id, answer.attemptId)));
    expect(kept.record).toEqual({ typed: "5.6" });
  });

  it("is refused behind an open hold point, with the hold point's name, and nothing is kept", async () => {
    const given = await bench();
    const check = await checkOf(given.unit, "5 V rail, no load");
    const error = await refusal(send(given.builder, check.id, { record: { typed: "5.0" } }));
    expect(error).toMatchObject({ code: "blocked" });
    expect(error.message).toContain("the hold point “5 V rail to ground”");
    expect(await db.select().from(attempts).where(eq(attempts.checkId, check.id))).toEqual([]);
  });

  it("needs a note where a statement does not conform", async () => {
    const { unit, builder } = await bench();
    const check = await checkOf(unit, "No bridges under the lens");
    expect(await refusal(send(builder, check.id, { record: fails }))).toMatchObject({
      code: "invalid",
      fields: { note: expect.any(String) },
    });
    expect(await must(send(builder, check.id, { record: fails, note: "U3 pins 4 and 5" }))).toMatchObject({
      state: "failed",
    });
  });

  it.each([
    { record: { typed: "five" } },
    { record: { typed: "" } },
    { record: { typed: 5 } },
    { record: null },
    { record: [] },
    { record: { typed: "5\u0000" } },
    { record: { typed: "5 A" } },
    { record: { typed: "9".repeat(5000) } },
  ])("is refused with a sentence and leaves nothing when the reading is no reading: %j", async ({ record }) => {
    const given = await bench();
    const check = await pastTheHold(given);
    expect(await refusal(send(given.builder, check.id, { record }))).toMatchObject({ code: "invalid" });
    expect(await stateOf(given.unit, "5 V rail, no load")).toBe("untested");
  });

  it("keeps the server's time and says so when the device's clock runs ahead", async () => {
    const { unit, builder } = await bench();
    const check = await checkOf(unit, "No bridges under the lens");
    const answer = await must(send(builder, check.id, { record: conforms, performedAt: "2199-01-01T00:00:00Z" }));
    expect(answer.sentences.join(" ")).toContain("2199-01-01");
    const kept = one(await db.select().from(attempts).where(eq(attempts.id, answer.attemptId)));
    expect(Math.abs(kept.performedAt.getTime() - kept.recordedAt.getTime())).toBeLessThan(60_000);
    const earlier = await must(send(builder, check.id, { record: conforms, performedAt: "2026-01-01T20:15:00+01:00" }));
    expect(
      one(await db.select().from(attempts).where(eq(attempts.id, earlier.attemptId))).performedAt.toISOString(),
    ).toBe("2026-01-01T19:15:00.000Z");
  });

  it("says whether it passed the first time, in the event", async () => {
    const { unit, builder, project } = await bench();
    const first = await state(builder, unit, "No bridges under the lens", conforms);
    const second = await state(builder, unit, "No bridges under the lens", conforms);
    const rows = await db.select().from(events).where(eq(events.projectId, project.id));
    const payloadOf = (id: string) =>
      rows.find((row) => row.kind === "attempt.recorded" && row.subjectId === id)?.payload;
    expect(payloadOf(first.attemptId)).toMatchObject({
      firstPass: true,
      from: "untested",
      to: "passed",
      serial: "PSU-01",
    });
    expect(payloadOf(second.attemptId)).toMatchObject({ firstPass: false, from: "passed", to: "passed" });
  });
});

describe("the same attempt sent again", () => {
  it("gives the first answer and makes no second row, also when it arrives many times at once", async () => {
    const given = await bench();
    const check = await pastTheHold(given);
    const id = randomUUID();
    const answers = await Promise.all(
      Array.from({ length: 8 }, () => must(send(given.builder, check.id, { id, record: { typed: "5.02" } }))),
    );
    const later = await must(send(given.builder, check.id, { id, record: { typed: "5.02" } }));
    for (const answer of answers) expect(answer).toEqual(later);
    expect(await db.select().from(attempts).where(eq(attempts.checkId, check.id))).toHaveLength(1);
    const told = await db.select().from(events).where(eq(events.subjectId, id));
    expect(told).toHaveLength(1);
  });

  it("is refused when somebody else used the id", async () => {
    const given = await bench();
    const check = await checkOf(given.unit, "No bridges under the lens");
    const id = randomUUID();
    await must(send(given.builder, check.id, { id, record: conforms }));
    expect(await refusal(send(given.maintainer, check.id, { id, record: conforms }))).toMatchObject({
      code: "conflict",
    });
  });

  it("may succeed after it was refused", async () => {
    const given = await bench();
    const check = await checkOf(given.unit, "5 V rail, no load");
    const id = randomUUID();
    await refusal(send(given.builder, check.id, { id, record: { typed: "5.0" } }));
    await pastTheHold(given);
    expect(await must(send(given.builder, check.id, { id, record: { typed: "5.0" } }))).toMatchObject({
      state: "passed",
    });
  });

  it("stays held when another person is signed in on the device", async () => {
    const given = await bench();
    const check = await checkOf(given.unit, "No bridges under the lens");
    const madeBy = given.builder.viewer.userId;
    expect(await refusal(send(given.maintainer, check.id, { record: conforms, madeBy }))).toMatchObject({
      code: "signed-out",
    });
  });
});

describe("two builders at once", () => {
  it("are both kept in order of arrival, the later one counts and is told of the other", async () => {
    const given = await bench();
    const { project, builder } = given;
    const other = await makeViewer({ name: "Nils" });
    await db.insert(memberships).values({ projectId: project.id, userId: other.userId, role: "builder" });
    const nils = await scopeFor(other, project);
    const check = await pastTheHold(given);
    const [a, b] = await Promise.all([
      must(send(builder, check.id, { record: { typed: "5.01" } })),
      must(send(nils, check.id, { record: { typed: "5.61" } })),
    ]);
    const [first, second] = a.arrival < b.arrival ? [a, b] : [b, a];
    expect(first.overtook).toBeNull();
    expect(second.overtook).toMatchObject({ by: second === b ? "Bram" : "Nils" });
    expect(second.overtook?.summary.replace("\u2009", " ")).toBe(first === a ? "5.01 V" : "5.61 V");
    const kept = await db.select().from(attempts).where(eq(attempts.checkId, check.id)).orderBy(attempts.arrival);
    expect(kept.map((row) => row.id)).toEqual([first.attemptId, second.attemptId]);
    expect(await stateOf(given.unit, "5 V rail, no load")).toBe(second.state);
  });

  it("are told of an attempt that arrived since the client last looked", async () => {
    const given = await bench();
    const check = await checkOf(given.unit, "No bridges under the lens");
    const seen = await must(send(given.maintainer, check.id, { record: conforms }));
    const again = await must(send(given.builder, check.id, { record: conforms, seenArrival: seen.arrival - 1 }));
    expect(again.overtook).toMatchObject({ by: "Mira", summary: "conforms" });
  });

  it("leave every check of a unit in a true state when twenty record at the same time", async () => {
    const project = await makeProject();
    const checks = Array.from({ length: 10 }, (_, n) => ({ title: `Check ${n}`, holdPoint: n === 0 }));
    const board = await makeBoard(project, "TIM", checks);
    const unit = await makeUnit(project.scopes.maintainer, board, "TIM-01");
    await state(project.scopes.builder, unit, "Check 0", conforms);
    await Promise.all(
      Array.from({ length: 20 }, (_, n) => state(project.scopes.builder, unit, `Check ${n % 10}`, conforms)),
    );
    expect(await statesOf(unit)).toBe(Array.from({ length: 10 }, () => "passed").join(" "));
  });
});

describe("a reading at the limits", () => {
  // 0.5 % of the reading and 2 counts of 10 mV: U at 5.25 V is about 53 mV (rectangular, k = 2).
  const RANGE = { unit: "V", fullScale: 20, resolution: 0.01, percentOfReading: 0.5, counts: 2, percentOfRange: 0 };

  it.each([
    ["4.749", "does-not-conform"],
    ["4.750", "conforms"],
    ["4.751", "conforms"],
    ["5.249", "conforms"],
    ["5.250", "conforms"],
    ["5.251", "does-not-conform"],
  ])("without an instrument %s V in 4.75 … 5.25 V %s", async (typed, verdict) => {
    const given = await bench();
    const check = await pastTheHold(given);
    expect(await must(send(given.builder, check.id, { record: { typed } }))).toMatchObject({ verdict });
  });

  it.each([
    ["4.749", "does-not-conform"],
    ["4.750", "guard-band"],
    ["4.800", "guard-band"],
    ["4.802", "conforms"],
    ["5.196", "conforms"],
    ["5.198", "guard-band"],
    ["5.250", "guard-band"],
    ["5.251", "does-not-conform"],
  ])(
    "with a meter of ±(0.5 % + 2 counts) %s V in 4.75 … 5.25 V is %s under the guarded rule",
    async (typed, verdict) => {
      const given = await bench();
      const check = await pastTheHold(given);
      const instrumentId = await makeInstrument(given.builder.viewer, [RANGE]);
      const answer = await must(send(given.builder, check.id, { record: { typed }, instrumentId }));
      expect(answer.verdict).toBe(verdict);
      const row = await checkOf(given.unit, "5 V rail, no load");
      expect(row).toMatchObject({
        state: verdict === "does-not-conform" ? "failed" : "passed",
        insideGuardBand: verdict === "guard-band",
      });
    },
  );

  it("conforms inside the guard band when the project decides by simple acceptance", async () => {
    const given = await bench({ decisionRule: "simple" });
    const check = await pastTheHold(given);
    const instrumentId = await makeInstrument(given.builder.viewer, [RANGE]);
    expect(await must(send(given.builder, check.id, { record: { typed: "5.25" }, instrumentId }))).toMatchObject({
      verdict: "conforms",
    });
  });

  it("keeps the instrument's name and accuracy as they were, and takes nobody else's instrument", async () => {
    const given = await bench();
    const check = await pastTheHold(given);
    const foreign = await makeInstrument(given.maintainer.viewer, [RANGE]);
    expect(
      await refusal(send(given.builder, check.id, { record: { typed: "5" }, instrumentId: foreign })),
    ).toMatchObject({
      code: "invalid",
      fields: { instrumentId: expect.any(String) },
    });
    const own = await makeInstrument(given.builder.viewer, [RANGE]);
    const answer = await must(send(given.builder, check.id, { record: { typed: "5" }, instrumentId: own }));
    const kept = one(await db.select().from(attempts).where(eq(attempts.id, answer.attemptId)));
    expect(kept.instrumentSnapshot).toEqual({ name: "Bench meter", ranges: [RANGE], calibrationNote: "" });
  });
});

describe("a table of readings", () => {
  const TYPED = {
    columns: ["no load", "half load"],
    rows: [
      { label: "+5 V", unit: "V", limits: "4.75 … 5.25 V", cells: ["", "4.9 … 5.1 V"] },
      { label: "+12 V", unit: "V", limits: "12 V ± 5 %", cells: ["", ""] },
    ],
  };

  it("goes by its worst cell, each cell by its own limits, and keeps every cell as a reading", async () => {
    const project = await makeProject();
    const board = await makeBoard(project, "PSU", [{ title: "Rails", kind: "table", typed: TYPED }]);
    const unit = await makeUnit(project.scopes.maintainer, board, "PSU-01");
    const check = await checkOf(unit, "Rails");
    const open = await refusal(send(project.scopes.builder, check.id, { record: { cells: [["5.0"], ["12", "12"]] } }));
    expect(open).toMatchObject({ code: "invalid", fields: { "cells.0.1": expect.any(String) } });
    const answer = await must(
      send(project.scopes.builder, check.id, {
        record: {
          cells: [
            ["5.2", "5.2"],
            ["12.1", "11.9"],
          ],
        },
      }),
    );
    expect(answer).toMatchObject({ verdict: "does-not-conform", state: "failed", summary: "1 of 4 do not conform" });
    const rows = await db
      .select()
      .from(readings)
      .where(eq(readings.attemptId, answer.attemptId))
      .orderBy(readings.position);
    expect(rows.map(({ label, verdict }) => [label, verdict])).toEqual([
      ["+5 V, no load", "conforms"],
      ["+5 V, half load", "does-not-conform"],
      ["+12 V, no load", "conforms"],
      ["+12 V, half load", "conforms"],
    ]);
  });
});

describe("evidence", () => {
  async function photoCheck() {
    const project = await makeProject();
    const board = await makeBoard(project, "PSU", [
      { title: "Solder side", kind: "photo", typed: { expects: "whole board", minimum: "2" } },
      { title: "Clock", kind: "capture" },
    ]);
    const unit = await makeUnit(project.scopes.maintainer, board, "PSU-01");
    return {
      project,
      unit,
      builder: project.scopes.builder,
      check: await checkOf(unit, "Solder side"),
      capture: await checkOf(unit, "Clock"),
    };
  }

  it("is tied to the attempt it came with, and a photo check asks for as many as the procedure says", async () => {
    const { project, builder, check } = await photoCheck();
    const photos = [await makeEvidence(project), await makeEvidence(project)];
    const few = await refusal(send(builder, check.id, { record: conforms, attachmentIds: photos.slice(0, 1) }));
    expect(few).toMatchObject({ code: "invalid", message: "Take 2 photos first." });
    const answer = await must(send(builder, check.id, { record: conforms, attachmentIds: photos }));
    const rows = await db.select().from(attachments).where(eq(attachments.attemptId, answer.attemptId));
    expect(rows.map((row) => row.id).sort()).toEqual([...photos].sort());
    expect(rows.every((row) => row.checkId === check.id)).toBe(true);
  });

  it("counts once: not for a second attempt, and not from another project", async () => {
    const { project, builder, check } = await photoCheck();
    const photos = [await makeEvidence(project), await makeEvidence(project)];
    await must(send(builder, check.id, { record: conforms, attachmentIds: photos }));
    expect(await refusal(send(builder, check.id, { record: conforms, attachmentIds: photos }))).toMatchObject({
      code: "invalid",
    });
    const foreign = await makeProject();
    const others = [await makeEvidence(foreign), await makeEvidence(foreign)];
    expect(await refusal(send(builder, check.id, { record: conforms, attachmentIds: others }))).toMatchObject({
      code: "invalid",
    });
  });

  it("is a scope picture or scope data where a capture is asked for, not a photo", async () => {
    const { project, builder, capture } = await photoCheck();
    expect(
      await refusal(send(builder, capture.id, { record: conforms, attachmentIds: [await makeEvidence(project)] })),
    ).toMatchObject({ code: "invalid" });
    const data = await makeEvidence(project, "scope-data");
    expect(await must(send(builder, capture.id, { record: conforms, attachmentIds: [data] }))).toMatchObject({
      state: "passed",
    });
  });
});

describe("what was recorded", () => {
  it("cannot be updated or deleted, not even by SQL", async () => {
    const { unit, builder } = await bench();
    const { attemptId } = await state(builder, unit, "No bridges under the lens", conforms);
    const refused = (error: unknown) =>
      error instanceof Error && error.cause instanceof Error ? error.cause.message : String(error);
    const change = db
      .execute(sql`update attempts set verdict = 'does-not-conform' where id = ${attemptId}`)
      .catch(refused);
    expect(await change).toMatch(/never changed/);
    expect(await db.execute(sql`delete from attempts where id = ${attemptId}`).catch(refused)).toMatch(/never deleted/);
    expect(one(await db.select().from(attempts).where(eq(attempts.id, attemptId))).verdict).toBe("conforms");
  });

  it("is out of reach from another project: its checks are not found", async () => {
    const { unit } = await bench();
    const stranger = await makeProject();
    const check = await checkOf(unit, "No bridges under the lens");
    expect(await refusal(send(stranger.scopes.builder, check.id, { record: conforms }))).toMatchObject({
      code: "not-found",
    });
    expect(await stateOf(unit, "No bridges under the lens")).toBe("untested");
  });
});
