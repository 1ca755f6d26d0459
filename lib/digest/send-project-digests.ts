import { database } from "@/db/client";
import { settleDeliveries, takeDeliveries } from "@/db/queries/digest-deliveries";
import { log } from "@/lib/http/log";
import { enqueue } from "@/lib/jobs/enqueue";
import { claimDue } from "./claim-due";
import { createDigestWriter } from "./digest-writer";
import { loadProjectWeek } from "./project-week";
import { sendDeliveries } from "./send-deliveries";

/** Within these a run has ended; if its process was killed, another worker takes what it left. */
const LEASE_SECONDS = 300;
const BUDGET_MS = 200_000;

export type Tuning = { now?: Date; timeoutMs?: number; signal?: AbortSignal | undefined };

/**
 * Sends the digests of one project that are due. The number of queries is the same for three subscribers and for three
 * hundred: everything is read once and written back once, only the mail service is asked one by one.
 */
export async function sendProjectDigests({ projectId, ...tuning }: { projectId: string } & Tuning): Promise<void> {
  const db = database();
  await claimDue(projectId, tuning.now ?? new Date());
  const taken = await takeDeliveries(db, { projectId }, LEASE_SECONDS);
  if (taken.length === 0) return;
  const since = new Date(Math.min(...taken.map((one) => one.since.getTime())));
  const until = new Date(Math.max(...taken.map((one) => one.until.getTime())));
  const week = await loadProjectWeek(projectId, { since, until });
  if (!week) return;
  const outcomes = await sendDeliveries(taken, createDigestWriter(week), {
    deadline: Date.now() + BUDGET_MS,
    ...tuning,
  });
  await settleDeliveries(db, outcomes);
  const again = outcomes.filter((one) => one.state === "claimed");
  log().info({ projectId, deliveries: outcomes.length, left: again.length }, "digests of a project");
  if (again.length === 0) return;
  const runAt = new Date(Math.min(...again.map((one) => one.nextTryAt.getTime())));
  await enqueue(db, "send-project-digests", { projectId }, { key: `digests-${projectId}`, runAt, maxAttempts: 5 });
}
