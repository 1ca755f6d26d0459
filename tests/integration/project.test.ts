import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { describe, expect, test } from "vitest";
import { events } from "@/db/schema/events";
import { digestSubscriptions, memberships, projects } from "@/db/schema/projects";
import { attempts, checks } from "@/db/schema/travelers";
import { grant } from "@/lib/access/grant";
import { recordAttempt } from "@/lib/attempt/record-attempt";
import { recordAttemptInput } from "@/lib/attempt/schema";
import { loadSubscriptions } from "@/lib/digest/load-subscriptions";
import { archiveProject } from "@/lib/project/archive-project";
import { createProject } from "@/lib/project/create-project";
import { editProject } from "@/lib/project/edit-project";
import { loadProjects } from "@/lib/project/load-projects";
import { loadSettings } from "@/lib/project/load-settings";
import { purgeProject } from "@/lib/project/purge-project";
import { restoreProject } from "@/lib/project/restore-project";
import { one, useDatabase } from "../support/database";
import { makeViewer, scopeFor } from "../support/people";
import { makeBoard, makeProject, makeUnit } from "../support/project";

const db = useDatabase();

const given = {
  name: "Tide computer",
  summary: "",
  timeZone: "Europe/Berlin",
  decisionRule: "guarded",
  layout: "tower",
} as const;

describe("setting a project up", () => {
  test("whoever does it is its maintainer, and a second of the same name gets an address of its own", async () => {
    const viewer = await makeViewer({ name: "Mira" });
    const name = `Wind vane ${randomUUID().slice(0, 8)}`;
    const first = await createProject({ viewer }, { ...given, name, writeId: randomUUID() });
    const second = await createProject({ viewer }, { ...given, name, writeId: randomUUID() });
    if (!first.ok || !second.ok) throw new Error("not created");
    expect(second.value.slug).toBe(`${first.value.slug}-2`);
    expect((await scopeFor(viewer, first.value)).role).toBe("maintainer");
  });

  test("whoever does it can have the weekly e-mail, which is off at first as for any maintainer", async () => {
    const viewer = await makeViewer();
    const made = await createProject({ viewer }, { ...given, writeId: randomUUID() });
    if (!made.ok) throw new Error("not created");
    const kept = await db.select().from(digestSubscriptions).where(eq(digestSubscriptions.userId, viewer.userId));
    expect(one(kept)).toMatchObject({ enabled: false, weekday: 7, hour: 18, zone: viewer.timeZone });
    expect(await loadSubscriptions({ viewer })).toMatchObject([{ project: made.value.slug, enabled: false }]);
  });

  test("a double click makes one project", async () => {
    const viewer = await makeViewer();
    const writeId = randomUUID();
    const twice = await Promise.all([
      createProject({ viewer }, { ...given, writeId }),
      createProject({ viewer }, { ...given, writeId }),
    ]);
    expect(twice[0]).toEqual(twice[1]);
    expect(await db.select().from(memberships).where(eq(memberships.userId, viewer.userId))).toHaveLength(1);
  });
});

describe("changing the settings", () => {
  test("a stale edit is refused with what stands there now, and changes nothing", async () => {
    const { scopes } = await makeProject();
    const scope = scopes.maintainer;
    const { version } = await loadSettings(scope);
    const edit = (name: string) =>
      editProject(scope, { ...given, name, project: scope.slug, writeId: randomUUID(), version });
    expect((await edit("Tide computer II")).ok).toBe(true);
    const stale = await edit("Somebody else's name");
    expect(stale).toMatchObject({
      ok: false,
      error: { code: "conflict", details: { current: { name: "Tide computer II", version: version + 1 } } },
    });
    expect((await loadSettings(scope)).name).toBe("Tide computer II");
  });
});

describe("archiving", () => {
  test("leaves looking, refuses changing, and is undone by restoring", async () => {
    const { scopes, viewers, slug } = await makeProject();
    await archiveProject(scopes.maintainer, { project: slug, writeId: randomUUID() });
    expect((await grant(db, viewers.maintainer, slug, "project.see")).ok).toBe(true);
    expect(await grant(db, viewers.builder, slug, "attempt.record")).toMatchObject({
      ok: false,
      error: { code: "conflict" },
    });
    expect((await loadProjects({ viewer: viewers.builder })).map((project) => project.archived)).toEqual([true]);
    await restoreProject(await scopeFor(viewers.maintainer, { slug }), { project: slug, writeId: randomUUID() });
    expect((await grant(db, viewers.builder, slug, "attempt.record")).ok).toBe(true);
  });
});

describe("purging", () => {
  async function provenProject() {
    const project = await makeProject();
    const board = await makeBoard(project, "TIM", [{ title: "Joints" }]);
    const unit = await makeUnit(project.scopes.maintainer, board, "TIM-01");
    const check = one(await db.select().from(checks).where(eq(checks.unitId, unit.id)));
    const given = { project: project.slug, id: randomUUID(), checkId: check.id, performedAt: new Date().toISOString() };
    const input = recordAttemptInput.parse({ ...given, record: { conforms: true } });
    const attempt = await recordAttempt(project.scopes.builder, input);
    if (!attempt.ok) throw new Error(attempt.error.message);
    return project;
  }

  test("is refused while the project is in work, and with the wrong name", async () => {
    const { scopes, viewers, slug, id } = await makeProject();
    const purge = async (confirmation: string) =>
      purgeProject(await scopeFor(viewers.maintainer, { slug }), {
        project: slug,
        writeId: randomUUID(),
        confirmation,
      });
    expect(await purge("Tide computer")).toMatchObject({ ok: false, error: { code: "conflict" } });
    await archiveProject(scopes.maintainer, { project: slug, writeId: randomUUID() });
    expect(await purge("tide")).toMatchObject({ ok: false, error: { fields: { confirmation: expect.any(String) } } });
    expect(await db.select().from(projects).where(eq(projects.id, id))).toHaveLength(1);
  });

  test("takes the whole history with it, which nothing else can do", async () => {
    const { scopes, viewers, slug, id } = await provenProject();
    await expect(db.delete(projects).where(eq(projects.id, id))).rejects.toThrow();
    await archiveProject(scopes.maintainer, { project: slug, writeId: randomUUID() });
    const scope = await scopeFor(viewers.maintainer, { slug });
    const input = { project: slug, writeId: randomUUID(), confirmation: "Tide computer" };
    expect(await purgeProject(scope, input)).toEqual({ ok: true, value: null });
    expect(await db.select().from(attempts).where(eq(attempts.projectId, id))).toEqual([]);
    expect(await db.select().from(events).where(eq(events.projectId, id))).toEqual([]);
  });

  test("lifts the guard on history for its own transaction only", async () => {
    const kept = await provenProject();
    const gone = await makeProject();
    await archiveProject(gone.scopes.maintainer, { project: gone.slug, writeId: randomUUID() });
    const scope = await scopeFor(gone.viewers.maintainer, gone);
    await purgeProject(scope, { project: gone.slug, writeId: randomUUID(), confirmation: "Tide computer" });
    await expect(db.delete(attempts).where(eq(attempts.projectId, kept.id))).rejects.toThrow();
  });
});
