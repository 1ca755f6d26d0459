import { randomUUID } from "node:crypto";
import { and, eq } from "drizzle-orm";
import { describe, expect, test } from "vitest";
import { events } from "@/db/schema/events";
import { procedureChecks } from "@/db/schema/procedures";
import { deleteCheck } from "@/lib/procedure/delete-check";
import { discardDraft } from "@/lib/procedure/discard-draft";
import { issueProcedure } from "@/lib/procedure/issue-procedure";
import { loadProcedure, loadVersion } from "@/lib/procedure/load-procedure";
import { reorderChecks } from "@/lib/procedure/reorder-checks";
import { saveCheck } from "@/lib/procedure/save-check";
import { checkFields } from "@/lib/procedure/schema";
import { startDraft } from "@/lib/procedure/start-draft";
import type { StarterId } from "@/lib/procedure/starters/starter-ids";
import { compareVersions } from "@/lib/traveler/compare-versions";
import { createBoard } from "@/lib/board/create-board";
import { createUnit } from "@/lib/unit/create-unit";
import { loadBoard } from "@/lib/board/load-board";
import { useDatabase } from "../support/database";
import { makeProject } from "../support/project";

const db = useDatabase();

/** A board without a procedure, and everything a maintainer does with its draft, always against the newest version. */
async function desk() {
  const project = await makeProject();
  const scope = project.scopes.maintainer;
  const write = () => ({ project: project.slug, writeId: randomUUID(), board: "TIM" });
  await createBoard(scope, {
    ...write(),
    code: "TIM",
    name: "Timebase",
    summary: "",
    kind: "card",
    connectorType: null,
    connectorReference: "J1",
  });
  const load = async () => {
    const view = await loadProcedure(scope, "TIM");
    if (!view) throw new Error("no board");
    return view;
  };
  const version = async () => (await load()).draft?.version ?? 0;
  const check = (title: string, more: object = {}) =>
    checkFields.parse({
      stage: "function",
      title,
      instruction: "",
      caution: "",
      reference: "",
      holdPoint: false,
      kind: "statement",
      typed: { expects: "" },
      covers: { signals: [], pins: [], rails: [], blocks: [] },
      needs: [],
      ...more,
    });
  return {
    ...{ project, scope, load, check },
    start: (from: "scratch" | "issued" | StarterId) => startDraft(scope, { ...write(), from }),
    add: async (title: string, more: object = {}, key: string | null = null) => {
      const answer = await saveCheck(scope, {
        ...write(),
        version: await version(),
        key,
        after: null,
        check: check(title, more),
      });
      if (!answer.ok) return answer;
      return answer;
    },
    remove: async (key: string) => deleteCheck(scope, { ...write(), version: await version(), key }),
    reorder: async (keys: string[]) => reorderChecks(scope, { ...write(), version: await version(), keys }),
    issue: async (note = "") => issueProcedure(scope, { ...write(), version: await version(), note }),
    discard: async () => discardDraft(scope, { ...write(), version: await version() }),
    saveAt: (at: number, title: string, key: string | null) =>
      saveCheck(scope, { ...write(), version: at, key, after: null, check: check(title) }),
    titles: async () => ((await load()).draft?.checks ?? []).map((row) => row.title),
    keyOf: async (title: string) => (await load()).draft?.checks.find((row) => row.title === title)?.key ?? "",
  };
}

describe("a draft", () => {
  test.each(["supply-card", "logic-card", "passive-backplane", "mixed-signal-card"] as const)(
    "begins with the starter %s and can be issued as it is",
    async (id) => {
      const { start, issue, load } = await desk();
      await start(id);
      const count = (await load()).draft?.checks.length ?? 0;
      expect(count).toBeGreaterThan(14);
      expect((await issue()).ok).toBe(true);
      expect((await load()).newest).toHaveLength(count);
    },
  );

  test("there is one a board, also when two begin at once", async () => {
    const { start } = await desk();
    const both = await Promise.all([start("scratch"), start("logic-card")]);
    expect(both.filter((answer) => answer.ok)).toHaveLength(1);
    expect(await start("scratch")).toMatchObject({ ok: false, error: { code: "conflict" } });
  });

  test("keeps stages in order, wherever a check is added or put", async () => {
    const { start, add, reorder, titles, keyOf } = await desk();
    await start("scratch");
    await add("Clock");
    await add("Joints", { stage: "inspection" });
    await add("Reset");
    expect(await titles()).toEqual(["Joints", "Clock", "Reset"]);
    await reorder([await keyOf("Reset"), await keyOf("Clock"), await keyOf("Joints")]);
    expect(await titles()).toEqual(["Joints", "Reset", "Clock"]);
  });

  test("refuses an order that leaves a check out", async () => {
    const { start, add, reorder, titles, keyOf } = await desk();
    await start("scratch");
    await add("Clock");
    await add("Reset");
    expect(await reorder([await keyOf("Reset")])).toMatchObject({ ok: false, error: { code: "invalid" } });
    expect(await titles()).toEqual(["Clock", "Reset"]);
  });

  test("refuses a circle and names its members", async () => {
    const { start, add, keyOf, load } = await desk();
    await start("scratch");
    await add("Clock");
    await add("Reset", { needs: [await keyOf("Clock")] });
    const circle = await add("Clock", { needs: [await keyOf("Reset")] }, await keyOf("Clock"));
    expect(circle).toMatchObject({ ok: false, error: { code: "conflict" } });
    expect(!circle.ok && circle.error.message).toMatch(/“Clock” would wait for “Reset”, which waits for “Clock”/);
    expect((await load()).draft?.checks.find((row) => row.title === "Clock")?.needs).toEqual([]);
  });

  test("says under the field of the kind what is wrong with the limits", async () => {
    const { start, add, titles } = await desk();
    await start("scratch");
    const answer = await add("5 V", { kind: "reading", typed: { unit: "V", limits: "4.75 … five", expected: "" } });
    expect(answer).toMatchObject({
      ok: false,
      error: { code: "invalid", fields: { "check.typed.limits": expect.any(String) } },
    });
    expect(await titles()).toEqual([]);
  });

  test("a deleted check comes back under its own key, and what needed it is told", async () => {
    const { start, add, remove, keyOf, load } = await desk();
    await start("scratch");
    await add("Clock");
    const clock = await keyOf("Clock");
    await add("Reset", { needs: [clock] });
    expect(await remove(clock)).toMatchObject({ ok: true, value: { neededBy: [await keyOf("Reset")] } });
    expect((await load()).draft?.checks.map((row) => row.needs)).toEqual([[]]);
    await add("Clock", {}, clock);
    expect(await keyOf("Clock")).toBe(clock);
  });

  test("a stale edit is refused with the draft as it is, and nothing of it is lost", async () => {
    const { start, add, saveAt, keyOf, load, titles } = await desk();
    await start("scratch");
    await add("Clock");
    const key = await keyOf("Clock");
    const seen = (await load()).draft?.version ?? 0;
    expect((await saveAt(seen, "Clock at U9", key)).ok).toBe(true);
    const stale = await saveAt(seen, "Clock at U3", key);
    expect(stale).toMatchObject({
      ok: false,
      error: { code: "conflict", details: { current: { version: seen + 1, checks: [{ title: "Clock at U9" }] } } },
    });
    expect(await titles()).toEqual(["Clock at U9"]);
  });

  test("two save the same version at once: one wins, the other is refused", async () => {
    const { start, add, saveAt, keyOf, load } = await desk();
    await start("scratch");
    await add("Clock");
    const key = await keyOf("Clock");
    const seen = (await load()).draft?.version ?? 0;
    const both = await Promise.all([saveAt(seen, "One", key), saveAt(seen, "Two", key)]);
    expect(both.map((answer) => answer.ok).sort()).toEqual([false, true]);
  });
});

describe("an issued version", () => {
  test("cannot be changed any more; the next draft is another one", async () => {
    const { scope, start, add, issue, saveAt, remove, keyOf } = await desk();
    await start("scratch");
    await add("Clock");
    const key = await keyOf("Clock");
    await issue("First light");
    expect(await saveAt(2, "Changed", key)).toMatchObject({ ok: false, error: { code: "not-found" } });
    expect(await remove(key)).toMatchObject({ ok: false });
    await start("issued");
    await add("Clock, renamed", {}, key);
    expect((await loadVersion(scope, "TIM", 1))?.map((row) => row.title)).toEqual(["Clock"]);
  });

  test("is not issued empty", async () => {
    const { start, issue } = await desk();
    await start("scratch");
    expect(await issue()).toMatchObject({ ok: false, error: { code: "invalid" } });
  });

  test("becomes the traveler of units that waited for one, and is told in the log", async () => {
    const { project, scope, start, add, issue, load } = await desk();
    const board = await loadBoard(scope, "TIM");
    const revisionId = board?.revisions[0]?.id ?? "";
    await createUnit(scope, {
      project: project.slug,
      writeId: randomUUID(),
      boardId: board?.id ?? "",
      serial: "TIM-01",
      revisionId,
      note: "",
    });
    expect((await load()).without).toEqual(["TIM-01"]);
    await start("scratch");
    await add("Clock");
    expect(await issue("First light")).toEqual({ ok: true, value: { number: 1, started: 1 } });
    expect((await load()).without).toEqual([]);
    const told = await db
      .select({ payload: events.payload })
      .from(events)
      .where(and(eq(events.projectId, project.id), eq(events.kind, "procedure.issued")));
    expect(told).toEqual([{ payload: { code: "TIM", number: 1, note: "First light" } }]);
  });

  test("differs from the next by what was really changed", async () => {
    const { scope, start, add, issue, remove, keyOf } = await desk();
    await start("scratch");
    await add("Clock");
    await add("Reset");
    await issue();
    await start("issued");
    await add("Clock at U9", {}, await keyOf("Clock"));
    await remove(await keyOf("Reset"));
    await add("Levels");
    await issue();
    const [one, two] = [await loadVersion(scope, "TIM", 1), await loadVersion(scope, "TIM", 2)];
    const difference = compareVersions(one ?? [], two ?? []);
    expect(difference.kept.map(({ title }) => title)).toEqual(["Clock at U9"]);
    expect(difference.added.map(({ title }) => title)).toEqual(["Levels"]);
    expect(difference.dropped.map(({ title }) => title)).toEqual(["Reset"]);
  });
});

test("a draft that is thrown away leaves nothing behind, and its number is given again", async () => {
  const { start, add, discard, issue, load, scope } = await desk();
  await start("logic-card");
  const rows = (await load()).draft?.checks ?? [];
  expect((await discard()).ok).toBe(true);
  const key = rows[0]?.key ?? "";
  expect(await db.select().from(procedureChecks).where(eq(procedureChecks.key, key))).toEqual([]);
  await start("scratch");
  await add("Clock");
  await issue();
  expect(await loadVersion(scope, "TIM", 1)).toHaveLength(1);
});
