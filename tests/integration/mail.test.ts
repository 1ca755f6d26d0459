import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { afterEach, describe, expect, it } from "vitest";
import { accountTokens, users } from "@/db/schema/people";
import { invitations } from "@/db/schema/projects";
import { reopenings } from "@/db/schema/travelers";
import { tokenFor, tokenHash } from "@/lib/auth/token";
import { mailFor } from "@/lib/mail/mails";
import { sendMail } from "@/lib/mail/send";
import { sendQueuedMail } from "@/lib/mail/send-queued-mail";
import { sendBySmtp } from "@/lib/mail/smtp-transport";
import { checkOf, conforms, must, state } from "../support/bench";
import { one, useDatabase } from "../support/database";
import { reopen } from "../support/decisions";
import { clearFaults, countMails, mailTo, orderFault } from "../support/digest";
import { makeViewer } from "../support/people";
import { makeBoard, makeProject, makeUnit } from "../support/project";

const db = useDatabase();
afterEach(clearFaults);

const hour = 3_600_000;
const message = (to: string) => ({ to, subject: "Rails", html: "<p>All up.</p>", text: "All up." });

async function accountLink(
  purpose: "confirm-address" | "reset-password",
  more: { expiresAt?: Date; usedAt?: Date } = {},
) {
  const viewer = await makeViewer();
  const id = randomUUID();
  const values = { id, userId: viewer.userId, purpose, tokenHash: tokenHash(tokenFor(purpose, id)) };
  await db.insert(accountTokens).values({ ...values, expiresAt: new Date(Date.now() + 2 * hour), ...more });
  return { viewer, id };
}

describe("a mail is written from its row", () => {
  it("with the link that opens the page, in both forms", async () => {
    for (const [purpose, page] of [
      ["confirm-address", "confirm"],
      ["reset-password", "reset"],
    ] as const) {
      const { viewer, id } = await accountLink(purpose);
      const mail = await mailFor({ kind: purpose, id });
      const link = `${process.env.APP_URL}/${page}/${tokenFor(purpose, id)}`;
      expect(mail?.to).toBe(viewer.email);
      expect(mail?.html).toContain(`href="${link}"`);
      expect(mail?.text).toContain(link);
      expect(mail?.text).toContain("works for 2 hours, once");
    }
  });

  it("not any more when the link is used or has expired", async () => {
    const used = await accountLink("reset-password", { usedAt: new Date() });
    const late = await accountLink("reset-password", { expiresAt: new Date(Date.now() - 1000) });
    for (const { id } of [used, late]) expect(await mailFor({ kind: "reset-password", id })).toBeUndefined();
    expect(await mailFor({ kind: "reset-password", id: randomUUID() })).toBeUndefined();
  });

  it("of an invitation only while it is open", async () => {
    const project = await makeProject();
    const id = randomUUID();
    const token = tokenFor("invitation", id);
    await db.insert(invitations).values({
      id,
      projectId: project.id,
      email: "nils@example.org",
      role: "builder",
      tokenHash: tokenHash(token),
      expiresAt: new Date(Date.now() + hour),
      invitedBy: project.viewers.maintainer.userId,
    });
    const mail = await mailFor({ kind: "invitation", id });
    expect(mail).toMatchObject({ to: "nils@example.org", subject: "Join Tide computer on Boardwake" });
    expect(mail?.text).toContain(`${process.env.APP_URL}/invitation/${token}`);
    expect(mail?.text).toContain("Mira asks you to join");
    await db.update(invitations).set({ withdrawnAt: new Date() }).where(eq(invitations.id, id));
    expect(await mailFor({ kind: "invitation", id })).toBeUndefined();
  });

  it("of a reopened check for whoever carried it out, until somebody repeats it", async () => {
    const project = await makeProject();
    const { maintainer, builder } = project.scopes;
    const unit = await makeUnit(maintainer, await makeBoard(project, "TIM", [{ title: "Look" }]), "TIM-01");
    await state(builder, unit, "Look", conforms);
    const check = await checkOf(unit, "Look");
    await must(reopen(maintainer, check.id, "The photo is blurred."));
    const { id } = one(await db.select().from(reopenings).where(eq(reopenings.checkId, check.id)));
    const mail = await mailFor({ kind: "check-reopened", id });
    expect(mail).toMatchObject({ to: builder.viewer.email, subject: "Reopened: Look (TIM-01)" });
    expect(mail?.text).toContain("The photo is blurred.");
    expect(mail?.text).toContain(`/units/TIM-01?check=${check.id}#check-${check.id}`);
    await db.update(users).set({ mailOnReopen: false }).where(eq(users.id, builder.viewer.userId));
    expect(await mailFor({ kind: "check-reopened", id })).toBeUndefined();
    await db.update(users).set({ mailOnReopen: true }).where(eq(users.id, builder.viewer.userId));
    await state(builder, unit, "Look", conforms);
    expect(await mailFor({ kind: "check-reopened", id })).toBeUndefined();
  });
});

describe("a mail is sent", () => {
  it("once under its key, also when the first answer was lost", async () => {
    const to = `lost.${randomUUID()}@example.org`;
    const options = { idempotencyKey: randomUUID(), timeoutMs: 2_000 };
    await orderFault("mode=lost&count=1&on=emails");
    expect(await sendMail(message(to), options)).toMatchObject({ ok: false, retry: true });
    expect(await sendMail(message(to), options)).toMatchObject({ ok: true });
    expect(await sendMail({ ...message(to), text: "Changed since." }, options)).toMatchObject({ ok: true });
    expect(await countMails([{ email: to }])).toEqual({ 1: 1 });
  });

  it("within its time limit, whatever the service does", async () => {
    await orderFault("mode=hang&count=1&on=emails");
    const begun = Date.now();
    const sent = await sendMail(message("a@example.org"), { idempotencyKey: randomUUID(), timeoutMs: 300 });
    expect(sent).toMatchObject({ ok: false, retry: true });
    expect(Date.now() - begun).toBeLessThan(3_000);
  });

  it("never with a header that a name or a title wrote", async () => {
    const to = `header.${randomUUID()}@example.org`;
    const subject = "Rails\r\nBcc: everybody@example.org";
    await sendMail({ ...message(to), subject }, { idempotencyKey: randomUUID() });
    expect((await mailTo(to)).subject).toBe("Rails Bcc: everybody@example.org");
    const split = await sendMail(message("a@example.org\r\nBcc: b@example.org"), { idempotencyKey: randomUUID() });
    expect(split).toMatchObject({ ok: false, bounced: true });
  });

  it("by SMTP with the key as its Message-ID, and tells a bounce from a mailbox that is full today", async () => {
    const options = { idempotencyKey: randomUUID(), timeoutMs: 5_000 };
    expect(await sendBySmtp(message(`smtp.${randomUUID()}@example.org`), options)).toEqual({
      ok: true,
      id: expect.stringContaining(options.idempotencyKey),
    });
    expect(await sendBySmtp(message("bounce@example.org"), options)).toMatchObject({ retry: false, bounced: true });
    expect(await sendBySmtp(message("later@example.org"), options)).toMatchObject({ retry: true, bounced: false });
  });
});

describe("a queued mail", () => {
  it("is tried again by the queue when the service fails", async () => {
    const { id } = await accountLink("reset-password");
    await orderFault("mode=500&count=1&on=emails");
    await expect(sendQueuedMail({ kind: "reset-password", id }, "1")).rejects.toThrow("did not take the mail");
  });

  it("to an address that is refused for good is noted with the person and not tried again", async () => {
    const { viewer, id } = await accountLink("confirm-address");
    await db
      .update(users)
      .set({ email: `no address ${id}` })
      .where(eq(users.id, viewer.userId));
    await sendQueuedMail({ kind: "confirm-address", id }, "1");
    expect(one(await db.select().from(users).where(eq(users.id, viewer.userId))).mailBouncedAt).not.toBeNull();
  });
});
