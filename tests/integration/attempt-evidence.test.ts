import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { attachments } from "@/db/schema/evidence";
import { checkOf, conforms, must, refusal, send } from "../support/bench";
import { useDatabase } from "../support/database";
import { makeBoard, makeEvidence, makeProject, makeUnit } from "../support/project";

const db = useDatabase();

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
