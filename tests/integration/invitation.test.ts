import { and, eq } from "drizzle-orm";
import { describe, expect, it, vi } from "vitest";
import { database } from "@/db/client";
import { findUserByEmail } from "@/db/queries/users";
import { events } from "@/db/schema/events";
import { digestSubscriptions, invitations, memberships, projects, type Role } from "@/db/schema/projects";
import type { ProjectScope } from "@/lib/access/scope";
import { checkPassword } from "@/lib/account/check-password";
import { tokenFor } from "@/lib/auth/token";
import { acceptInvitation } from "@/lib/invitation/accept-invitation";
import type * as EnvModule from "@/lib/env";
import { invitePerson } from "@/lib/invitation/invite-person";
import { lookAtInvitation } from "@/lib/invitation/look-at-invitation";
import { resendInvitation } from "@/lib/invitation/resend-invitation";
import { signUpByInvitation } from "@/lib/invitation/sign-up-by-invitation";
import { withdrawInvitation } from "@/lib/invitation/withdraw-invitation";
import { leaveProject } from "@/lib/member/leave-project";
import { freshAddress, freshCall, makeAccount, PASSWORD, writeId } from "../support/accounts";
import { one, useDatabase } from "../support/database";
import { scopeFor } from "../support/people";
import { makeProject } from "../support/project";

// People come in by invitation only here: everything has to work all the same.
vi.mock("@/lib/env", async (original) => {
  const real = await original<typeof EnvModule>();
  return { ...real, env: () => ({ ...real.env(), SIGN_UP: "invitation" }) };
});

useDatabase();

async function invite(scope: ProjectScope, email: string, role: Role = "collaborator") {
  const answer = await invitePerson(scope, { project: scope.slug, writeId: writeId(), email, role });
  if (!answer.ok) throw new Error(answer.error.message);
  return { id: answer.value.id, token: tokenFor("invitation", answer.value.id) };
}

async function expire(id: string) {
  await database()
    .update(invitations)
    .set({ expiresAt: new Date(Date.now() - 1000) })
    .where(eq(invitations.id, id));
}

const membershipOf = (projectId: string, userId: string) =>
  database()
    .select()
    .from(memberships)
    .where(and(eq(memberships.projectId, projectId), eq(memberships.userId, userId)));

const digestOf = (projectId: string, userId: string) =>
  database()
    .select()
    .from(digestSubscriptions)
    .where(and(eq(digestSubscriptions.projectId, projectId), eq(digestSubscriptions.userId, userId)));

const newcomer = (token: string) => ({
  writeId: writeId(),
  token,
  name: "Ines",
  password: PASSWORD,
  timeZone: "Europe/Lisbon",
});

describe("an invitation", () => {
  it("brings in somebody with an account by one press, with a weekly e-mail on Sunday at 18 in their zone", async () => {
    const project = await makeProject();
    const ines = await makeAccount({ name: "Ines" });
    const { token } = await invite(project.scopes.maintainer, ines.email);
    const scope = { viewer: { ...ines.scope.viewer, timeZone: "Europe/Lisbon" } };
    expect(await lookAtInvitation(scope.viewer, token)).toMatchObject({
      step: "accept",
      details: { role: "collaborator" },
    });

    expect(await acceptInvitation(scope, { writeId: writeId(), token })).toEqual({
      ok: true,
      value: { slug: project.slug },
    });
    expect(await membershipOf(project.id, ines.userId)).toMatchObject([{ role: "collaborator" }]);
    const digest = one(await digestOf(project.id, ines.userId));
    expect(digest).toMatchObject({ enabled: true, weekday: 7, hour: 18, zone: "Europe/Lisbon" });
    expect(digest.nextDueAt.getTime()).toBeGreaterThan(Date.now());
    const written = await database().select().from(events).where(eq(events.projectId, project.id));
    expect(written.map((event) => event.kind).sort()).toEqual(["invitation.sent", "member.joined"]);
  });

  it("leaves the weekly e-mail of a builder off", async () => {
    const project = await makeProject();
    const bram = await makeAccount();
    const { token } = await invite(project.scopes.maintainer, bram.email, "builder");
    await acceptInvitation(bram.scope, { writeId: writeId(), token });
    expect(await digestOf(project.id, bram.userId)).toMatchObject([{ enabled: false }]);
  });

  it("makes an account for somebody without one, whose address it confirms", async () => {
    const project = await makeProject();
    const email = freshAddress("ines");
    const { token } = await invite(project.scopes.maintainer, email);
    expect(await lookAtInvitation(undefined, token)).toMatchObject({ step: "sign-up", details: { email } });
    expect(await signUpByInvitation(newcomer(token), freshCall())).toEqual({
      ok: true,
      value: { slug: project.slug, email },
    });
    expect(await checkPassword({ email, password: PASSWORD }, freshCall())).toMatchObject({ ok: true });
  });

  it("takes an unconfirmed account over, so that a password which a stranger set there is worth nothing", async () => {
    const project = await makeProject();
    const prepared = await makeAccount({ isConfirmed: false });
    const { token } = await invite(project.scopes.maintainer, prepared.email);
    await signUpByInvitation({ ...newcomer(token), password: "the owner's own 22" }, freshCall());
    expect(await checkPassword({ email: prepared.email, password: PASSWORD }, freshCall())).toMatchObject({
      ok: false,
    });
    expect(await findUserByEmail(database(), prepared.email)).toMatchObject({ id: prepared.userId, name: "Ines" });
  });

  it("asks somebody with an account to sign in, and makes no second account", async () => {
    const project = await makeProject();
    const ines = await makeAccount();
    const { token } = await invite(project.scopes.maintainer, ines.email);
    expect(await lookAtInvitation(undefined, token)).toMatchObject({ step: "sign-in" });
    expect(await signUpByInvitation(newcomer(token), freshCall())).toMatchObject({
      ok: false,
      error: { code: "conflict" },
    });
    expect(await membershipOf(project.id, ines.userId)).toEqual([]);
  });

  it("says to who is signed in with another address which one it is for", async () => {
    const project = await makeProject();
    const eve = await makeAccount({ name: "Eve" });
    const email = freshAddress("ines");
    const { token } = await invite(project.scopes.maintainer, email);
    const view = await lookAtInvitation(eve.scope.viewer, token);
    expect(view).toMatchObject({ step: "wrong-address", sentence: expect.stringContaining(email) });
    const answer = await acceptInvitation(eve.scope, { writeId: writeId(), token });
    expect(answer).toMatchObject({
      ok: false,
      error: { code: "forbidden", message: expect.stringContaining(eve.email) },
    });
    expect(await membershipOf(project.id, eve.userId)).toEqual([]);
  });

  it("says when it was used already, and to the member where the project is", async () => {
    const project = await makeProject();
    const ines = await makeAccount();
    const { token } = await invite(project.scopes.maintainer, ines.email);
    await acceptInvitation(ines.scope, { writeId: writeId(), token });
    expect(await acceptInvitation(ines.scope, { writeId: writeId(), token })).toMatchObject({
      error: { code: "gone", message: expect.stringContaining("used already") },
    });
    expect(await lookAtInvitation(ines.scope.viewer, token)).toMatchObject({
      step: "failed",
      open: { path: `/projects/${project.slug}` },
    });
    expect(await lookAtInvitation(undefined, token)).not.toHaveProperty("open");
  });

  it("says when it has expired, and works again when it is sent again", async () => {
    const project = await makeProject();
    const maintainer = project.scopes.maintainer;
    const ines = await makeAccount();
    const { id, token } = await invite(maintainer, ines.email);
    await expire(id);
    expect(await acceptInvitation(ines.scope, { writeId: writeId(), token })).toMatchObject({
      error: { code: "gone", message: expect.stringContaining("expired") },
    });
    await resendInvitation(maintainer, { project: project.slug, writeId: writeId(), invitation: id });
    expect(await acceptInvitation(ines.scope, { writeId: writeId(), token })).toMatchObject({ ok: true });
  });

  it("says when it was withdrawn", async () => {
    const project = await makeProject();
    const ines = await makeAccount();
    const { id, token } = await invite(project.scopes.maintainer, ines.email);
    await withdrawInvitation(project.scopes.maintainer, { project: project.slug, writeId: writeId(), invitation: id });
    expect(await lookAtInvitation(undefined, token)).toMatchObject({
      step: "failed",
      sentence: expect.stringContaining("withdrawn"),
    });
    expect(await acceptInvitation(ines.scope, { writeId: writeId(), token })).toMatchObject({
      error: { code: "gone", message: expect.stringContaining("withdrawn") },
    });
  });

  it("waits while its project is archived", async () => {
    const project = await makeProject();
    const ines = await makeAccount();
    const { token } = await invite(project.scopes.maintainer, ines.email);
    await database().update(projects).set({ archivedAt: new Date() }).where(eq(projects.id, project.id));
    expect(await acceptInvitation(ines.scope, { writeId: writeId(), token })).toMatchObject({
      error: { message: expect.stringContaining("archived") },
    });
    await database().update(projects).set({ archivedAt: null }).where(eq(projects.id, project.id));
    expect(await acceptInvitation(ines.scope, { writeId: writeId(), token })).toMatchObject({ ok: true });
  });

  it("cannot be made up", async () => {
    const ines = await makeAccount();
    const answer = await acceptInvitation(ines.scope, { writeId: writeId(), token: "y".repeat(43) });
    expect(answer).toMatchObject({ ok: false, error: { code: "not-found" } });
  });

  it("is used once when two presses arrive at once", async () => {
    const project = await makeProject();
    const email = freshAddress();
    const { token } = await invite(project.scopes.maintainer, email);
    const answers = await Promise.all([
      signUpByInvitation(newcomer(token), freshCall()),
      signUpByInvitation(newcomer(token), freshCall()),
    ]);
    expect(answers.filter((answer) => answer.ok)).toHaveLength(1);
    expect(answers.find((answer) => !answer.ok)).toMatchObject({ error: { code: "gone" } });
  });
});

describe("inviting", () => {
  it("refuses a member and an address that is invited already, each with what to do", async () => {
    const project = await makeProject();
    const { maintainer } = project.scopes;
    const ask = (email: string) =>
      invitePerson(maintainer, { project: project.slug, writeId: writeId(), email, role: "builder" });
    expect(await ask(project.viewers.builder.email)).toMatchObject({
      error: { code: "conflict", message: expect.stringContaining("already a builder") },
    });
    const email = freshAddress();
    await ask(email);
    expect(await ask(email)).toMatchObject({
      error: { code: "conflict", message: expect.stringContaining("Send it again") },
    });
  });

  it("makes one invitation when the same address is invited twice at once", async () => {
    const project = await makeProject();
    const email = freshAddress();
    const ask = () =>
      invitePerson(project.scopes.maintainer, { project: project.slug, writeId: writeId(), email, role: "builder" });
    const answers = await Promise.all([ask(), ask()]);
    expect(answers.map((answer) => answer.ok).sort()).toEqual([false, true]);
  });

  it("lets a new invitation take the place of an expired one", async () => {
    const project = await makeProject();
    const email = freshAddress();
    const old = await invite(project.scopes.maintainer, email);
    await expire(old.id);
    const fresh = await invite(project.scopes.maintainer, email);
    expect(await lookAtInvitation(undefined, old.token)).toMatchObject({ step: "failed" });
    expect(await lookAtInvitation(undefined, fresh.token)).toMatchObject({ step: "sign-up" });
  });

  it("cannot touch an invitation of another project", async () => {
    const [ours, theirs] = [await makeProject(), await makeProject()];
    const { id, token } = await invite(ours.scopes.maintainer, freshAddress());
    const input = { project: theirs.slug, writeId: writeId(), invitation: id };
    expect(await withdrawInvitation(theirs.scopes.maintainer, input)).toMatchObject({ error: { code: "not-found" } });
    expect(await resendInvitation(theirs.scopes.maintainer, { ...input, writeId: writeId() })).toMatchObject({
      error: { code: "not-found" },
    });
    expect(await lookAtInvitation(undefined, token)).toMatchObject({ step: "sign-up" });
  });

  it("brings somebody back who had left, as the role now says", async () => {
    const project = await makeProject();
    const ines = await makeAccount();
    const first = await invite(project.scopes.maintainer, ines.email, "builder");
    await acceptInvitation(ines.scope, { writeId: writeId(), token: first.token });
    await leaveProject(await scopeFor(ines.scope.viewer, project), { project: project.slug, writeId: writeId() });
    const second = await invite(project.scopes.maintainer, ines.email, "collaborator");
    expect(await acceptInvitation(ines.scope, { writeId: writeId(), token: second.token })).toMatchObject({ ok: true });
    expect(await membershipOf(project.id, ines.userId)).toMatchObject([{ role: "collaborator" }]);
    expect(await digestOf(project.id, ines.userId)).toMatchObject([{ enabled: true }]);
  });
});
