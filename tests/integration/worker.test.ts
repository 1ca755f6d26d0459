import { randomUUID } from "node:crypto";
import { eq, sql } from "drizzle-orm";
import { afterEach, describe, expect, it } from "vitest";
import { accountTokens, sessions, users, verificationTokens } from "@/db/schema/people";
import { writes } from "@/db/schema/events";
import { tokenFor, tokenHash } from "@/lib/auth/token";
import { findDueDigests } from "@/lib/digest/find-due-digests";
import { enqueue } from "@/lib/jobs/enqueue";
import { releaseStuckJobs } from "@/lib/jobs/release-stuck-jobs";
import { sweepRows } from "@/lib/jobs/sweep";
import { one, useDatabase } from "../support/database";
import {
  clearFaults,
  countMails,
  deliveriesOf,
  endWaits,
  mailTo,
  orderFault,
  subscribe,
  until,
} from "../support/digest";
import { makeViewer } from "../support/people";
import { makeProject } from "../support/project";
import { jobsLike, releaseJobsOfTheDead, startWorkerProcess, type Worker } from "../support/worker";

const db = useDatabase();
const running: Worker[] = [];
const start = () => {
  const worker = startWorkerProcess();
  running.push(worker);
  return worker;
};
afterEach(async () => {
  await clearFaults();
  for (const worker of running.splice(0)) {
    worker.process.kill("SIGKILL");
    await worker.ended;
  }
});

describe("a worker that is killed in the middle of a run of sixty digests", () => {
  it("leaves the rest to the next one, and nobody gets two", { timeout: 120_000 }, async () => {
    const project = await makeProject();
    const readers = await subscribe(project, 60);
    await orderFault("mode=slow&ms=120&count=60&on=emails");
    await findDueDigests();
    const first = start();
    const arrived = await until(
      () => countMails(readers),
      (counts) => (counts[1] ?? 0) >= 10,
    );
    first.process.kill("SIGKILL");
    await first.ended;
    expect(arrived[0]).toBeGreaterThan(0);
    expect((await deliveriesOf(project)).filter((row) => row.state === "claimed").length).toBeGreaterThan(0);

    await endWaits(project);
    await releaseJobsOfTheDead();
    await findDueDigests();
    start();
    start();
    await until(
      () => deliveriesOf(project),
      (rows) => rows.every((row) => row.state === "sent"),
    );
    expect(await countMails(readers)).toEqual({ 1: 60 });
  });
});

describe("the worker", () => {
  it(
    "mails what was enqueued with a change, tries again when the service fails, and says nothing secret",
    { timeout: 60_000 },
    async () => {
      const viewer = await makeViewer();
      const id = randomUUID();
      const token = tokenFor("reset-password", id);
      const expiresAt = new Date(Date.now() + 7_200_000);
      await orderFault("mode=500&count=1&on=emails");
      await db.transaction(async (tx) => {
        await tx
          .insert(accountTokens)
          .values({ id, userId: viewer.userId, purpose: "reset-password", tokenHash: tokenHash(token), expiresAt });
        await enqueue(tx, "send-mail", { kind: "reset-password", id });
      });
      const worker = start();
      await until(
        () => countMails([viewer]),
        (counts) => counts[1] === 1,
      );
      expect((await mailTo(viewer.email)).links).toContain(`${process.env.APP_URL}/reset/${token}`);
      const said = worker.lines.join("");
      expect(said).toContain("Ordered by a test.");
      for (const secret of [token, viewer.email, process.env.RESEND_API_KEY ?? "", process.env.AUTH_SECRET ?? ""])
        expect(said).not.toContain(secret);
    },
  );

  it("ends by itself when asked to", { timeout: 60_000 }, async () => {
    const worker = start();
    await until(
      async () => worker.lines.join(""),
      (said) => said.includes("the worker takes jobs"),
    );
    worker.process.kill("SIGTERM");
    expect(await worker.ended).toBe(0);
  });

  it("drops a job whose payload nobody understands", { timeout: 60_000 }, async () => {
    await db.execute(sql`select graphile_worker.add_job('send-mail', '{"kind":"rumour"}'::json)`);
    start();
    await until(
      () => jobsLike("send-mail"),
      (jobs) => jobs.length === 0,
    );
  });
});

describe("jobs of a worker that is gone", () => {
  it("are given back after a quarter of an hour, not before", async () => {
    for (const [worker, minutes] of [
      ["long-gone", 16],
      ["busy", 14],
    ] as const) {
      await enqueue(db, "make-thumbnails", { attachmentId: randomUUID() });
      await db.execute(sql`
        update graphile_worker._private_jobs set locked_by = ${worker}, locked_at = now() - make_interval(mins => ${minutes})
        where id = (select max(id) from graphile_worker._private_jobs)`);
    }
    await releaseStuckJobs();
    const held = await db.execute<{ locked_by: string }>(
      // Workers that other tests ended in the middle of a job have left locks of their own.
      sql`select locked_by from graphile_worker.jobs where locked_by in ('long-gone', 'busy')`,
    );
    expect(held.map((row) => row.locked_by)).toEqual(["busy"]);
    await db.execute(sql`delete from graphile_worker._private_jobs where task_id in
      (select id from graphile_worker._private_tasks where identifier = 'make-thumbnails')`);
  });
});

describe("the sweep", () => {
  it("takes expired sessions, links and old write ids, and leaves what still works", async () => {
    const { userId } = await makeViewer();
    const past = new Date(Date.now() - 60_000);
    const future = new Date(Date.now() + 60_000);
    const days = (count: number) => new Date(Date.now() - count * 86_400_000);
    const mark = randomUUID();
    for (const [name, expires] of [
      ["past", past],
      ["future", future],
    ] as const) {
      await db.insert(sessions).values({ sessionToken: `${mark}-${name}`, userId, expires });
      await db.insert(verificationTokens).values({ identifier: mark, token: name, expires });
    }
    const token = { userId, purpose: "reset-password" as const };
    await db.insert(accountTokens).values({ ...token, tokenHash: `${mark}-old`, expiresAt: days(31) });
    await db.insert(accountTokens).values({ ...token, tokenHash: `${mark}-late`, expiresAt: days(1) });
    await db.insert(writes).values({ id: randomUUID(), userId, action: "old", at: days(91) });
    await db.insert(writes).values({ id: randomUUID(), userId, action: "young", at: days(89) });
    await sweepRows();
    expect(one(await db.select().from(sessions).where(eq(sessions.userId, userId))).sessionToken).toBe(
      `${mark}-future`,
    );
    expect(one(await db.select().from(verificationTokens).where(eq(verificationTokens.identifier, mark))).token).toBe(
      "future",
    );
    expect(one(await db.select().from(accountTokens).where(eq(accountTokens.userId, userId))).tokenHash).toBe(
      `${mark}-late`,
    );
    expect(one(await db.select().from(writes).where(eq(writes.userId, userId))).action).toBe("young");
    expect(await db.select().from(users).where(eq(users.id, userId))).toHaveLength(1);
  });
});
