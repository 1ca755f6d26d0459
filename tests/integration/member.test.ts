import { and, eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { database } from "@/db/client";
import { countMaintainers, findMember } from "@/db/queries/members";
import { events } from "@/db/schema/events";
import { digestSubscriptions } from "@/db/schema/projects";
import { grant } from "@/lib/access/grant";
import { updateSubscription } from "@/lib/digest/update-subscription";
import { changeRole } from "@/lib/member/change-role";
import { joinProject } from "@/lib/member/join-project";
import { leaveProject } from "@/lib/member/leave-project";
import { loadPeople } from "@/lib/member/load-people";
import { removeMember } from "@/lib/member/remove-member";
import { writeId } from "../support/accounts";
import { useDatabase } from "../support/database";
import { makeViewer, scopeFor } from "../support/people";
import { makeProject } from "../support/project";

useDatabase();

/** A project with two maintainers and a builder. */
async function twoMaintainers() {
  const project = await makeProject();
  const second = await makeViewer({ name: "Sanne" });
  const joining = { projectId: project.id, userId: second.userId, role: "maintainer" as const, zone: "UTC" };
  await database().transaction((tx) => joinProject(tx, joining));
  return { project, first: project.scopes.maintainer, second: await scopeFor(second, project) };
}

const to = (project: { slug: string }, member: string) => ({ project: project.slug, writeId: writeId(), member });

describe("the last maintainer", () => {
  it("can neither leave nor be removed nor be demoted, and is told what to do instead", async () => {
    const project = await makeProject();
    const scope = project.scopes.maintainer;
    const self = to(project, scope.viewer.userId);
    const answers = [
      await leaveProject(scope, { project: project.slug, writeId: writeId() }),
      await removeMember(scope, { ...self, writeId: writeId() }),
      await changeRole(scope, { ...self, writeId: writeId(), role: "builder" }),
    ];
    for (const answer of answers) {
      expect(answer).toMatchObject({
        ok: false,
        error: { code: "blocked", message: expect.stringContaining("Make somebody else maintainer first") },
      });
    }
    expect(await countMaintainers(database(), project.id)).toBe(1);
  });

  it("remains when two maintainers demote each other at the same moment", async () => {
    const { project, first, second } = await twoMaintainers();
    const answers = await Promise.all([
      changeRole(first, { ...to(project, second.viewer.userId), role: "builder" }),
      changeRole(second, { ...to(project, first.viewer.userId), role: "builder" }),
    ]);
    expect(answers.map((answer) => answer.ok).sort()).toEqual([false, true]);
    expect(await countMaintainers(database(), project.id)).toBe(1);
  });

  it("remains when two maintainers leave at the same moment", async () => {
    const { project, first, second } = await twoMaintainers();
    const leave = { project: project.slug };
    const answers = await Promise.all([
      leaveProject(first, { ...leave, writeId: writeId() }),
      leaveProject(second, { ...leave, writeId: writeId() }),
    ]);
    expect(answers.map((answer) => answer.ok).sort()).toEqual([false, true]);
    expect(await countMaintainers(database(), project.id)).toBe(1);
  });

  it("can leave once somebody else is maintainer", async () => {
    const project = await makeProject();
    const scope = project.scopes.maintainer;
    await changeRole(scope, { ...to(project, project.viewers.builder.userId), role: "maintainer" });
    expect(await leaveProject(scope, { project: project.slug, writeId: writeId() })).toMatchObject({ ok: true });
    expect(await grant(database(), scope.viewer, project.slug, "project.see")).toMatchObject({
      ok: false,
      error: { code: "not-found" },
    });
  });
});

describe("a member", () => {
  it("has another role at once, and the log says from which to which", async () => {
    const project = await makeProject();
    const { builder } = project.viewers;
    await changeRole(project.scopes.maintainer, { ...to(project, builder.userId), role: "collaborator" });
    expect((await scopeFor(builder, project)).role).toBe("collaborator");
    const rows = await database().select().from(events).where(eq(events.projectId, project.id));
    expect(rows.map((row) => row.payload)).toContainEqual({ name: "Bram", from: "builder", to: "collaborator" });
  });

  it("who is removed sees nothing of the project any more and gets no weekly e-mail", async () => {
    const project = await makeProject();
    const { builder } = project.viewers;
    const subscription = {
      project: project.slug,
      writeId: writeId(),
      enabled: true,
      weekday: 1,
      hour: 7,
      zone: "Europe/Paris",
      quietWeek: "line" as const,
    };
    await updateSubscription(project.scopes.builder, subscription);
    expect(await removeMember(project.scopes.maintainer, to(project, builder.userId))).toEqual({
      ok: true,
      value: { name: "Bram" },
    });
    expect(await grant(database(), builder, project.slug, "project.see")).toMatchObject({
      ok: false,
      error: { code: "not-found" },
    });
    const own = and(eq(digestSubscriptions.projectId, project.id), eq(digestSubscriptions.userId, builder.userId));
    expect(await database().select().from(digestSubscriptions).where(own)).toMatchObject([{ enabled: false }]);
  });

  it("of another project cannot be changed or removed from here", async () => {
    const [ours, theirs] = [await makeProject(), await makeProject()];
    const stranger = ours.viewers.builder.userId;
    expect(await removeMember(theirs.scopes.maintainer, to(theirs, stranger))).toMatchObject({
      error: { code: "not-found" },
    });
    expect(await changeRole(theirs.scopes.maintainer, { ...to(theirs, stranger), role: "collaborator" })).toMatchObject(
      { error: { code: "not-found" } },
    );
    expect(await findMember(database(), ours.id, stranger)).toMatchObject({ role: "builder" });
  });

  it("is removed once when the same press arrives twice", async () => {
    const project = await makeProject();
    const input = to(project, project.viewers.builder.userId);
    const both = await Promise.all([
      removeMember(project.scopes.maintainer, input),
      removeMember(project.scopes.maintainer, input),
    ]);
    expect(both).toEqual([
      { ok: true, value: { name: "Bram" } },
      { ok: true, value: { name: "Bram" } },
    ]);
  });
});

describe("the list of people", () => {
  it("shows addresses and invitations to maintainers only", async () => {
    const project = await makeProject();
    const seen = await loadPeople(project.scopes.builder);
    expect(seen.invitations).toEqual([]);
    expect(seen.members.map((member) => member.email)).toEqual([null, project.viewers.builder.email]);
    const managed = await loadPeople(project.scopes.maintainer);
    expect(managed.members.map((member) => member.email)).toEqual([
      project.viewers.maintainer.email,
      project.viewers.builder.email,
    ]);
    expect(managed.members.map((member) => member.isLast)).toEqual([true, false]);
  });
});

describe("one's own weekly e-mail", () => {
  it("comes next at the hour and in the zone one chose, never in the past", async () => {
    const project = await makeProject();
    const input = {
      project: project.slug,
      writeId: writeId(),
      enabled: true,
      weekday: 3,
      hour: 6,
      zone: "Asia/Kathmandu",
      quietWeek: "nothing" as const,
    };
    const answer = await updateSubscription(project.scopes.builder, input);
    const due = new Date(answer.ok ? answer.value.nextDueAt : Number.NaN);
    expect(due.getTime()).toBeGreaterThan(Date.now());
    const parts = new Intl.DateTimeFormat("en-GB", {
      timeZone: "Asia/Kathmandu",
      weekday: "long",
      hour: "2-digit",
      hourCycle: "h23",
    }).format(due);
    expect(parts).toContain("Wednesday");
    expect(parts).toContain("06");
  });
});
