import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { archiveBoard } from "@/lib/board/archive-board";
import { createBoard } from "@/lib/board/create-board";
import { createRevision } from "@/lib/board/create-revision";
import { editBoard } from "@/lib/board/edit-board";
import { loadBoard } from "@/lib/board/load-board";
import { loadBoards } from "@/lib/board/load-boards";
import { releaseRevision } from "@/lib/board/release-revision";
import { restoreBoard } from "@/lib/board/restore-board";
import { archiveUnit } from "@/lib/unit/archive-unit";
import { createUnit } from "@/lib/unit/create-unit";
import { editUnit } from "@/lib/unit/edit-unit";
import { restoreUnit } from "@/lib/unit/restore-unit";
import { useDatabase } from "../support/database";
import { makeBoard, makeProject } from "../support/project";

useDatabase();

const design = {
  name: "Timebase",
  summary: "",
  kind: "card",
  connectorType: "din41612-c64",
  connectorReference: "J1",
} as const;

const write = (project: { slug: string }) => ({ project: project.slug, writeId: randomUUID() });

describe("a new board", () => {
  test("begins with revision A in design and without units", async () => {
    const project = await makeProject();
    const scope = project.scopes.maintainer;
    expect((await createBoard(scope, { ...write(project), code: "TIM", ...design })).ok).toBe(true);
    const board = await loadBoard(scope, "tim");
    expect(board?.revisions.map(({ letter, releasedAt }) => [letter, releasedAt])).toEqual([["A", null]]);
    expect(board?.nextSerial).toBe("TIM-01");
    expect((await loadBoards(scope)).boards).toMatchObject([{ code: "TIM", revision: "A", units: 0, issued: null }]);
  });

  test("cannot take a code that is taken, also when two ask at once", async () => {
    const project = await makeProject();
    const scope = project.scopes.maintainer;
    const both = await Promise.all([
      createBoard(scope, { ...write(project), code: "TIM", ...design }),
      createBoard(scope, { ...write(project), code: "TIM", ...design }),
    ]);
    expect(both.filter((answer) => answer.ok)).toHaveLength(1);
    expect(both.find((answer) => !answer.ok)).toMatchObject({ error: { fields: { code: expect.any(String) } } });
  });
});

test("a stale edit of a board is refused with the board as it is", async () => {
  const project = await makeProject();
  const scope = project.scopes.maintainer;
  const board = await makeBoard(project, "TIM");
  const edit = (name: string) =>
    editBoard(scope, { ...write(project), boardId: board.id, version: board.version, code: "TIM", ...design, name });
  expect((await edit("Clock card")).ok).toBe(true);
  expect(await edit("Other")).toMatchObject({
    ok: false,
    error: { code: "conflict", details: { current: { name: "Clock card", version: board.version + 1 } } },
  });
});

test("revisions go from letter to letter, and a released one stays released", async () => {
  const project = await makeProject();
  const scope = project.scopes.maintainer;
  const board = await makeBoard(project, "TIM");
  const next = await createRevision(scope, { ...write(project), boardId: board.id, notes: "Ground by the crystal." });
  expect(next).toEqual({ ok: true, value: { letter: "B" } });
  const release = () => releaseRevision(scope, { ...write(project), revisionId: board.revisionId });
  await release();
  const first = (await loadBoard(scope, "TIM"))?.revisions.find(({ letter }) => letter === "A")?.releasedAt;
  await release();
  expect(first).not.toBeNull();
  expect((await loadBoard(scope, "TIM"))?.revisions.find(({ letter }) => letter === "A")?.releasedAt).toBe(first);
});

describe("a unit", () => {
  async function workshop() {
    const project = await makeProject();
    const board = await makeBoard(project, "TIM", [{ title: "Joints", stage: "inspection" }]);
    const scope = project.scopes.builder;
    const make = (serial: string, revisionId = board.revisionId) =>
      createUnit(scope, { ...write(project), boardId: board.id, serial, revisionId, note: "" });
    return { project, board, scope, make };
  }

  test("gets the newest issued procedure as its traveler when it is made", async () => {
    const { scope, make } = await workshop();
    expect((await make("TIM-01")).ok).toBe(true);
    const [unit] = (await loadBoard(scope, "TIM"))?.units ?? [];
    expect(unit).toMatchObject({ procedure: 1, total: 1, holding: 0 });
  });

  test("cannot carry a serial number twice, nor a revision of another board", async () => {
    const { project, make } = await workshop();
    const other = await makeBoard(project, "CON");
    await make("TIM-01");
    expect(await make("TIM-01")).toMatchObject({ ok: false, error: { fields: { serial: expect.any(String) } } });
    expect(await make("TIM-02", other.revisionId)).toMatchObject({
      ok: false,
      error: { fields: { revisionId: expect.any(String) } },
    });
  });

  test("is put away and comes back; a stale edit of it is refused", async () => {
    const { project, scope, board, make } = await workshop();
    const made = await make("TIM-01");
    if (!made.ok) throw new Error(made.error.message);
    const unitId = made.value.id;
    await archiveUnit(scope, { ...write(project), unitId });
    expect((await loadBoard(scope, "TIM"))?.units[0]?.archived).toBe(true);
    await restoreUnit(scope, { ...write(project), unitId });
    expect((await loadBoard(scope, "TIM"))?.units[0]?.archived).toBe(false);
    const edit = (note: string) =>
      editUnit(scope, { ...write(project), unitId, version: 1, serial: "TIM-01", revisionId: board.revisionId, note });
    expect((await edit("From the first panel.")).ok).toBe(true);
    expect(await edit("Other")).toMatchObject({
      ok: false,
      error: { details: { current: { note: "From the first panel." } } },
    });
  });

  test("of an archived board goes and comes with it, unless it was put away before", async () => {
    const { project, scope, board, make } = await workshop();
    const [spare] = [await make("TIM-01"), await make("TIM-02")];
    if (!spare.ok) throw new Error(spare.error.message);
    await archiveUnit(scope, { ...write(project), unitId: spare.value.id });
    const input = { ...write(project), boardId: board.id };
    expect(await archiveBoard(project.scopes.maintainer, input)).toEqual({ ok: true, value: { units: 1 } });
    expect(await restoreUnit(scope, { ...write(project), unitId: spare.value.id })).toMatchObject({ ok: false });
    await restoreBoard(project.scopes.maintainer, { ...write(project), boardId: board.id });
    const units = (await loadBoard(scope, "TIM"))?.units.map(({ serial, archived }) => [serial, archived]);
    expect(units).toEqual([
      ["TIM-01", true],
      ["TIM-02", false],
    ]);
  });
});

test("a board of another project cannot be reached, whatever its id", async () => {
  const [mine, theirs] = [await makeProject(), await makeProject()];
  const board = await makeBoard(theirs, "TIM");
  const answer = await archiveBoard(mine.scopes.maintainer, { ...write(mine), boardId: board.id });
  expect(answer).toMatchObject({ ok: false, error: { code: "not-found" } });
  expect((await loadBoard(theirs.scopes.maintainer, "TIM"))?.archived).toBe(false);
});
