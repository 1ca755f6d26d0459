import { eq, sql } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { events } from "@/db/schema/events";
import { attempts, readings } from "@/db/schema/travelers";
import { checkOf, conforms, fails, must, refusal, send, state, stateOf, statesOf } from "../support/bench";
import { one, useDatabase } from "../support/database";
import { makeProject } from "../support/project";
import { pastTheHold, supplyBench } from "../support/supply-bench";

const db = useDatabase();

describe("recording an attempt", () => {
  it("is judged by the server, keeps the reading, and moves the check and what waits behind its hold point", async () => {
    const given = await supplyBench();
    expect(await statesOf(given.unit)).toBe("untested untested waiting");
    const hold = await checkOf(given.unit, "5 V rail to ground");
    const answer = await must(send(given.builder, hold.id, { record: { typed: "1k24" } }));
    expect(answer).toMatchObject({ verdict: "conforms", from: "untested", state: "passed", overtook: null });
    expect(answer.summary.replace("\u202f", " ")).toBe("1.24 kΩ");
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
    const given = await supplyBench();
    const check = await pastTheHold(given);
    const answer = await must(
      send(given.builder, check.id, { record: { typed: "5.6", verdict: "conforms", conforms: true } }),
    );
    expect(answer).toMatchObject({ verdict: "does-not-conform", state: "failed" });
    const kept = one(await db.select().from(attempts).where(eq(attempts.id, answer.attemptId)));
    expect(kept.record).toEqual({ typed: "5.6" });
  });

  it("is refused behind an open hold point, with the hold point's name, and nothing is kept", async () => {
    const given = await supplyBench();
    const check = await checkOf(given.unit, "5 V rail, no load");
    const error = await refusal(send(given.builder, check.id, { record: { typed: "5.0" } }));
    expect(error).toMatchObject({ code: "blocked" });
    expect(error.message).toContain("the hold point “5 V rail to ground”");
    expect(await db.select().from(attempts).where(eq(attempts.checkId, check.id))).toEqual([]);
  });

  it("needs a note where a statement does not conform", async () => {
    const { unit, builder } = await supplyBench();
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
    const given = await supplyBench();
    const check = await pastTheHold(given);
    expect(await refusal(send(given.builder, check.id, { record }))).toMatchObject({ code: "invalid" });
    expect(await stateOf(given.unit, "5 V rail, no load")).toBe("untested");
  });

  it("keeps the server's time and says so when the device's clock runs ahead", async () => {
    const { unit, builder } = await supplyBench();
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
    const { unit, builder, project } = await supplyBench();
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

describe("what was recorded", () => {
  it("cannot be updated or deleted, not even by SQL", async () => {
    const { unit, builder } = await supplyBench();
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
    const { unit } = await supplyBench();
    const stranger = await makeProject();
    const check = await checkOf(unit, "No bridges under the lens");
    expect(await refusal(send(stranger.scopes.builder, check.id, { record: conforms }))).toMatchObject({
      code: "not-found",
    });
    expect(await stateOf(unit, "No bridges under the lens")).toBe("untested");
  });
});
