import { and, eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import { database } from "@/db/client";
import { events } from "@/db/schema/events";
import { attachments, logEntries } from "@/db/schema/evidence";
import { plainSentence } from "@/lib/event/sentence";
import { archiveLogEntry } from "@/lib/log-entry/archive-log-entry";
import { editLogEntry } from "@/lib/log-entry/edit-log-entry";
import { loadEntry } from "@/lib/log-entry/load-entries";
import { loadLog, type LogQuery } from "@/lib/log-entry/load-log";
import { restoreLogEntry } from "@/lib/log-entry/restore-log-entry";
import { writeEntryInput } from "@/lib/log-entry/schema";
import { writeLogEntry } from "@/lib/log-entry/write-log-entry";
import { conforms, fails, must, refusal, state } from "@/tests/support/bench";
import { useDatabase } from "@/tests/support/database";
import { makeEvidence } from "@/tests/support/project";
import { openWorkshop, type Workshop } from "@/tests/support/workshop";

useDatabase();
let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});

const everything: LogQuery = { show: undefined, unit: undefined, by: undefined, before: undefined };
const entry = (given: Partial<ReturnType<typeof writeEntryInput.parse>> = {}) => ({
  project: workshop.slug,
  writeId: crypto.randomUUID(),
  title: "The clock rings",
  body: "Ringing at **48 MHz**.",
  unit: "CON-01",
  pictures: [],
  ...given,
});
const write = (given: Parameters<typeof entry>[0] = {}) => must(writeLogEntry(workshop.scopes.builder, entry(given)));
const load = async (id: string) => {
  const found = await loadEntry(workshop.scopes.collaborator, id);
  if (!found) throw new Error("no entry");
  return found;
};
const picturesOf = async (id: string) => (await load(id)).pictures.map(({ id: one, caption }) => [one, caption]);

describe("an entry", () => {
  it("stands in the log with its unit and its pictures in their order", async () => {
    const [one, two] = [await makeEvidence({ id: workshop.projectId }), await makeEvidence({ id: workshop.projectId })];
    const pictures = [
      { id: two, caption: "after" },
      { id: one, caption: "before" },
    ];
    const { id } = await write({ pictures });
    expect(await load(id)).toMatchObject({
      title: "The clock rings",
      unit: { serial: "CON-01" },
      by: { name: "Bram" },
    });
    expect(await picturesOf(id)).toEqual([
      [two, "after"],
      [one, "before"],
    ]);
    const [row] = await database().select().from(attachments).where(eq(attachments.id, one));
    expect(row).toMatchObject({ unitId: workshop.unit.id, logEntryId: id });
  });

  it("is written once however often it is sent", async () => {
    const input = entry({ title: "Sent twice" });
    const scope = workshop.scopes.builder;
    const [a, b] = await Promise.all([must(writeLogEntry(scope, input)), must(writeLogEntry(scope, input))]);
    expect(a).toEqual(b);
    const rows = await database().select().from(logEntries).where(eq(logEntries.title, "Sent twice"));
    expect(rows.filter((row) => row.projectId === workshop.projectId)).toHaveLength(1);
  });

  it("takes no picture of a check, of another entry or of another project, and then nothing is written", async () => {
    const other = await openWorkshop();
    const foreign = await makeEvidence({ id: other.projectId });
    const taken = await makeEvidence({ id: workshop.projectId });
    await write({ title: "First owner", pictures: [{ id: taken, caption: "" }] });
    const ofCheck = await makeEvidence({ id: workshop.projectId });
    await database().update(attachments).set({ checkId: workshop.check.id }).where(eq(attachments.id, ofCheck));
    for (const id of [foreign, taken, ofCheck]) {
      const input = entry({ title: `With ${id}`, pictures: [{ id, caption: "" }] });
      const refused = await refusal(writeLogEntry(workshop.scopes.builder, input));
      expect(refused).toMatchObject({ code: "conflict", details: { missing: [id] } });
      expect(
        await database()
          .select()
          .from(logEntries)
          .where(eq(logEntries.title, `With ${id}`)),
      ).toEqual([]);
    }
  });

  it("names a unit of this project or none", async () => {
    const refused = await refusal(writeLogEntry(workshop.scopes.builder, entry({ unit: "XYZ-99" })));
    expect(refused).toMatchObject({ code: "invalid", fields: { unit: expect.stringContaining("XYZ-99") } });
    const { id } = await write({ unit: "" });
    expect((await load(id)).unit).toBeNull();
  });

  it("says what is wrong with what was typed", () => {
    const problem = (given: object) => writeEntryInput.safeParse({ ...entry(), ...given }).error?.issues[0]?.message;
    expect(problem({ title: "  " })).toBe("Give the entry a title.");
    expect(problem({ title: "x".repeat(200) })).toBeUndefined();
    expect(problem({ title: "x".repeat(201) })).toMatch(/At most 200/);
    expect(problem({ body: "x".repeat(50_000) })).toBeUndefined();
    expect(problem({ body: "x".repeat(50_001) })).toMatch(/At most 50,000/);
    expect(problem({ body: "bell \u0007" })).toMatch(/control character/);
    const id = crypto.randomUUID();
    expect(
      problem({
        pictures: [
          { id, caption: "" },
          { id, caption: "" },
        ],
      }),
    ).toMatch(/twice/);
  });
});

describe("editing an entry", () => {
  it("keeps what was left in, takes out what was left out, and counts the version", async () => {
    const [one, two] = [await makeEvidence({ id: workshop.projectId }), await makeEvidence({ id: workshop.projectId })];
    const { id } = await write({ pictures: [one, two].map((picture) => ({ id: picture, caption: "" })) });
    const edit = entry({ title: "It rang", pictures: [{ id: two, caption: "mended" }] });
    const { version } = await must(editLogEntry(workshop.scopes.builder, { ...edit, entryId: id, version: 1 }));
    expect(version).toBe(2);
    expect(await load(id)).toMatchObject({ title: "It rang", version: 2 });
    expect(await picturesOf(id)).toEqual([[two, "mended"]]);
    const removed = and(eq(events.subjectId, one), eq(events.kind, "evidence.removed"));
    expect(await database().select().from(events).where(removed)).toHaveLength(1);
  });

  it("of two people at once only the first saves, the second gets the text that stands there now", async () => {
    const { id } = await write();
    const save = (title: string) =>
      editLogEntry(workshop.scopes.maintainer, { ...entry({ title }), entryId: id, version: 1 });
    const answers = await Promise.all([save("Mine"), save("Yours")]);
    const won = answers[0]?.ok ? "Mine" : "Yours";
    const lost = answers.find((answer) => !answer.ok);
    expect(answers.filter((answer) => answer.ok)).toHaveLength(1);
    expect(lost).toMatchObject({ error: { code: "conflict", details: { current: { title: won, version: 2 } } } });
    expect((await load(id)).title).toBe(won);
  });

  it("an entry of another project is not found, by any verb", async () => {
    const { id } = await write();
    const scope = (await openWorkshop()).scopes.maintainer;
    const named = { project: scope.slug, writeId: crypto.randomUUID(), entryId: id };
    expect(await loadEntry(scope, id)).toBeUndefined();
    expect((await refusal(archiveLogEntry(scope, named))).code).toBe("not-found");
    const edit = { ...entry({ unit: "" }), ...named, writeId: crypto.randomUUID(), version: 1 };
    expect((await refusal(editLogEntry(scope, edit))).code).toBe("not-found");
  });

  it("an archived entry leaves the log, cannot be edited, and comes back", async () => {
    const scope = workshop.scopes.builder;
    const { id } = await write({ title: "To and fro" });
    const named = () => ({ project: workshop.slug, writeId: crypto.randomUUID(), entryId: id });
    const standing = async () => (await loadLog(scope, everything)).items.some((item) => item.entry?.id === id);
    expect(await standing()).toBe(true);
    await must(archiveLogEntry(scope, named()));
    expect(await standing()).toBe(false);
    expect((await refusal(editLogEntry(scope, { ...entry(), ...named(), version: 1 }))).code).toBe("conflict");
    await must(restoreLogEntry(scope, named()));
    expect(await standing()).toBe(true);
  });
});

describe("the log", () => {
  it("tells what happened, newest first, and by kind, unit and person", async () => {
    const place = await openWorkshop();
    const { builder, maintainer, collaborator } = place.scopes;
    await state(builder, place.unit, "Rise time of CLK", fails);
    await state(maintainer, place.unit, "Rise time of CLK", conforms);
    const input = writeEntryInput.parse({ ...entry(), project: place.slug, writeId: crypto.randomUUID(), unit: "" });
    await must(writeLogEntry(maintainer, input));

    const said = async (query: Partial<LogQuery>) =>
      (await loadLog(collaborator, { ...everything, ...query })).items.map((item) => plainSentence(item.sentence));
    const attempts = [
      "Mira recorded “Rise time of CLK” on CON-01: conforms.",
      "Bram recorded “Rise time of CLK” on CON-01: does not conform.",
    ];
    expect((await said({})).slice(0, 3)).toEqual(["Mira wrote “The clock rings”.", ...attempts]);
    expect(await said({ show: "attempts" })).toEqual(attempts);
    expect(await said({ show: "failures" })).toEqual(attempts.slice(1));
    expect(await said({ show: "entries" })).toEqual(["Mira wrote “The clock rings”."]);
    expect(await said({ show: "attempts", by: place.builder.userId })).toEqual(attempts.slice(1));
    expect(await said({ show: "attempts", unit: "CON-01" })).toEqual(attempts);
    expect(await said({ unit: "CON-99" })).toEqual([]);
    expect(await said({ show: "people", unit: "CON-01" })).toEqual([]);
  });

  it("pages by the last event, without a gap and without a double", async () => {
    const place = await openWorkshop();
    const scope = place.scopes.builder;
    const payload = { what: "a note" };
    const row = { projectId: place.projectId, actorId: place.builder.userId, kind: "project.edited", payload };
    await database()
      .insert(events)
      .values(Array.from({ length: 130 }, () => row));
    const seen: number[] = [];
    let before: number | undefined;
    do {
      const page = await loadLog(scope, { ...everything, before });
      seen.push(...page.items.map((item) => item.id));
      before = page.older ?? undefined;
    } while (before !== undefined);
    expect(seen.length).toBeGreaterThanOrEqual(130);
    expect(new Set(seen).size).toBe(seen.length);
    expect(seen).toEqual([...seen].sort((a, b) => b - a));
  });
});
