import { eq } from "drizzle-orm";
import { afterEach, describe, expect, it } from "vitest";
import { users } from "@/db/schema/people";
import { digestSubscriptions, projects } from "@/db/schema/projects";
import { claimDue } from "@/lib/digest/claim-due";
import { findDueDigests } from "@/lib/digest/find-due-digests";
import { sendProjectDigests } from "@/lib/digest/send-project-digests";
import { checkOf, conforms, fails, must, state } from "../support/bench";
import { queriesOf } from "../support/count-queries";
import { one, useDatabase } from "../support/database";
import { concede, reopen } from "../support/decisions";
import {
  clearFaults,
  countMails,
  deliveriesOf,
  disable,
  endWaits,
  mailTo,
  orderFault,
  subscribe,
} from "../support/digest";
import { makeBoard, makeProject, makeUnit } from "../support/project";

const db = useDatabase();
afterEach(clearFaults);

const CHECKS = [{ title: "Look" }, { title: "Rails", holdPoint: true }, { title: "Clock" }, { title: "Count" }];
/** Changes are told a little later, when all that began with them is committed. */
const soon = () => new Date(Date.now() + 60_000);

async function busyProject() {
  const project = await makeProject();
  const unit = await makeUnit(project.scopes.maintainer, await makeBoard(project, "TIM", CHECKS), "TIM-01");
  await state(project.scopes.builder, unit, "Look", conforms);
  return { project, unit, run: (tuning = {}) => sendProjectDigests({ projectId: project.id, now: soon(), ...tuning }) };
}

const states = async (project: { id: string }) => (await deliveriesOf(project)).map((row) => row.state).sort();

describe("the weekly digest", () => {
  it("tells what passed, failed, was reopened and conceded, with reasons and links that land on the check", async () => {
    const { project, unit, run } = await busyProject();
    const { builder, maintainer } = project.scopes;
    const idOf = async (title: string) => (await checkOf(unit, title)).id;
    await state(builder, unit, "Rails", conforms);
    await state(builder, unit, "Clock", fails);
    await state(builder, unit, "Count", fails);
    await must(reopen(maintainer, await idOf("Look"), "The photo is blurred."));
    await must(concede(maintainer, await idOf("Count"), "Good enough until revision B."));
    const [reader] = await subscribe(project, 1);
    await run();
    const mail = await mailTo(reader?.email ?? "");
    expect(mail.subject).toBe("Tide computer: 2 checks passed, 2 did not conform");
    for (const form of [mail.html.replace(/<!-- -->|<[^>]+>/g, ""), mail.text]) {
      expect(form).toContain("2 checks passed: 2 for the first time.");
      expect(form).toContain("Not as it should be.");
      expect(form).toContain("Mira reopened it");
      expect(form).toContain("The photo is blurred.");
      expect(form).toContain("Good enough until revision B.");
    }
    const clock = await idOf("Clock");
    const address = `${process.env.APP_URL}/projects/${project.slug}/units/TIM-01?check=${clock}#check-${clock}`;
    expect(mail.links).toContain(address);
    expect(mail.text).toContain(address);
    expect(mail.text).toContain("Power-on 2 of 4 (1 fails).");
  });

  it("carries one address to end it, for the mail reader's own button", async () => {
    const { project, run } = await busyProject();
    const [reader] = await subscribe(project, 1);
    await run();
    const { headers } = await mailTo(reader?.email ?? "");
    expect(headers["list-unsubscribe-post"]).toBe("List-Unsubscribe=One-Click");
    expect(headers["list-unsubscribe"]).toMatch(
      new RegExp(`^<${process.env.APP_URL}/api/unsubscribe/${reader?.subscriptionId}/[\\w-]{43}>$`),
    );
  });

  it("says one line in a quiet week, or nothing, as each reader chose", async () => {
    const project = await makeProject();
    const [line] = await subscribe(project, 1, { quietWeek: "line" });
    const none = await subscribe(project, 1, { quietWeek: "nothing" });
    await sendProjectDigests({ projectId: project.id });
    expect((await mailTo(line?.email ?? "")).text).toContain("Nothing happened on the bench this week.");
    expect(await countMails(none)).toEqual({ 0: 1 });
    expect(await states(project)).toEqual(["quiet", "sent"]);
  });

  it("tells the next one from where the last one ended", async () => {
    const { project, run } = await busyProject();
    await subscribe(project, 1);
    await run();
    const first = one(await deliveriesOf(project));
    const [subscription] = await db
      .select()
      .from(digestSubscriptions)
      .where(eq(digestSubscriptions.projectId, project.id));
    const week = new Date((subscription?.nextDueAt.getTime() ?? 0) + 1000);
    await claimDue(project.id, week);
    const second = one((await deliveriesOf(project)).filter((row) => row.id !== first.id));
    expect(second.since).toEqual(first.until);
    expect(second.dueAt).toEqual(subscription?.nextDueAt);
  });
});

describe("each subscriber gets it once a week", () => {
  it("with two workers at once", async () => {
    const { project, run } = await busyProject();
    const readers = await subscribe(project, 30);
    await Promise.all([run(), run(), findDueDigests(soon())]);
    await run();
    expect(await countMails(readers)).toEqual({ 1: 30 });
    expect(new Set(await states(project))).toEqual(new Set(["sent"]));
  });

  it("at nine o'clock in the weeks in which the clocks change", async () => {
    const { project } = await busyProject();
    const rule = { zone: "Europe/Berlin", weekday: 1, hour: 9 };
    await subscribe(project, 1, { ...rule, dueAt: new Date("2026-03-23T08:00Z") });
    await subscribe(project, 1, { ...rule, dueAt: new Date("2026-10-19T07:00Z") });
    const hourly = async (from: string, days: number) => {
      for (let hour = 0; hour < days * 24; hour += 1)
        await claimDue(project.id, new Date(Date.parse(from) + hour * 3_600_000));
    };
    await hourly("2026-03-23T00:00Z", 15);
    await hourly("2026-10-19T00:00Z", 8);
    const dues = (await deliveriesOf(project)).map((row) => row.dueAt.toISOString().slice(0, 13)).sort();
    expect(dues).toEqual(
      expect.arrayContaining(["2026-03-23T08", "2026-03-30T07", "2026-04-06T07", "2026-10-19T07", "2026-10-26T08"]),
    );
    expect(new Set(dues.filter((due) => due < "2026-04-07")).size).toBe(3);
  });

  it("however often the mail service answers 500, with waits between the tries", async () => {
    const { project, run } = await busyProject();
    const readers = await subscribe(project, 3);
    await orderFault("mode=500&count=3&on=emails");
    await run();
    const rows = await deliveriesOf(project);
    for (const row of rows) {
      expect(row).toMatchObject({ state: "claimed", tries: 1, lastError: "Ordered by a test." });
      expect(row.nextTryAt.getTime()).toBeGreaterThan(Date.now() + 30_000);
    }
    await run();
    expect(await countMails(readers)).toEqual({ 0: 3 });
    await endWaits(project);
    await run();
    expect(await countMails(readers)).toEqual({ 1: 3 });
  });

  it("when the service hangs, or takes the mail and its answer is lost", async () => {
    const { project, run } = await busyProject();
    const readers = await subscribe(project, 4);
    await orderFault("mode=hang&count=2&on=emails");
    await orderFault("mode=lost&count=2&on=emails");
    await run({ timeoutMs: 1_000 });
    expect(new Set(await states(project))).toEqual(new Set(["claimed"]));
    await endWaits(project);
    await run();
    expect(await countMails(readers)).toEqual({ 1: 4 });
    expect(new Set(await states(project))).toEqual(new Set(["sent"]));
  });

  it("and does not ask a service that is away three hundred times", async () => {
    const { project, run } = await busyProject();
    await subscribe(project, 40);
    await orderFault("mode=500&count=1000&on=emails");
    await run();
    const tried = (await deliveriesOf(project)).filter((row) => row.lastError === "Ordered by a test.");
    expect(tried.length).toBeLessThan(12);
    expect(new Set(await states(project))).toEqual(new Set(["claimed"]));
  });

  it("though requests come faster than the service likes", async () => {
    const { project, run } = await busyProject();
    const readers = await subscribe(project, 4);
    await orderFault("mode=429&count=3&on=emails");
    await run();
    expect(await countMails(readers)).toEqual({ 1: 4 });
  });
});

describe("no digest goes to", () => {
  it("somebody who was removed from the project, also between two tries", async () => {
    const { project, run } = await busyProject();
    const before = await subscribe(project, 2);
    await disable(before);
    await run();
    expect(await deliveriesOf(project)).toEqual([]);
    const between = await subscribe(project, 2);
    await orderFault("mode=500&count=2&on=emails");
    await run();
    await disable(between);
    await endWaits(project);
    await run();
    expect(await countMails([...before, ...between])).toEqual({ 0: 4 });
    expect(await states(project)).toEqual(["failed", "failed"]);
  });

  it("readers of an archived project, addresses that bounced, addresses nobody confirmed", async () => {
    const { project, run } = await busyProject();
    const [bounced, unconfirmed] = await subscribe(project, 2);
    await db
      .update(users)
      .set({ mailBouncedAt: new Date() })
      .where(eq(users.id, bounced?.userId ?? ""));
    await db
      .update(users)
      .set({ emailVerified: null })
      .where(eq(users.id, unconfirmed?.userId ?? ""));
    await run();
    await subscribe(project, 1);
    await db.update(projects).set({ archivedAt: new Date() }).where(eq(projects.id, project.id));
    await run();
    expect(await deliveriesOf(project)).toEqual([]);
    const [next] = await db.select().from(digestSubscriptions).where(eq(digestSubscriptions.projectId, project.id));
    expect(next?.nextDueAt.getTime()).toBeGreaterThan(Date.now());
  });

  it("an address that the service refuses for good, ever again", async () => {
    const { project, run } = await busyProject();
    const [reader] = await subscribe(project, 1, { address: `no address ${project.id}` });
    await run();
    expect(await states(project)).toEqual(["failed"]);
    const user = one(
      await db
        .select()
        .from(users)
        .where(eq(users.id, reader?.userId ?? "")),
    );
    expect(user.mailBouncedAt).not.toBeNull();
  });
});

describe("what the database is asked", () => {
  it("is the same for five subscribers and for three hundred", async () => {
    const few = await busyProject();
    await subscribe(few.project, 5);
    const many = await busyProject();
    const readers = await subscribe(many.project, 300);
    const fewQueries = await queriesOf(() => few.run());
    const manyQueries = await queriesOf(() => many.run());
    expect(manyQueries.length).toBe(fewQueries.length);
    expect(await countMails(readers)).toEqual({ 1: 300 });
  });
});
