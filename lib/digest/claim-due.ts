import { database } from "@/db/client";
import { claimDeliveries, lockDueSubscriptions } from "@/db/queries/digest-deliveries";
import { nextDue } from "./next-due";

const SECOND = 1000;
const DAY = 86_400 * SECOND;

/** A change that began before and is not committed yet would be missed by this digest and by the next. */
const SETTLING = 30 * SECOND;
/** After a long silence (switched off, no worker) the mail goes back so far at most. */
const FURTHEST = 21 * DAY;

/**
 * Claims what is due: the delivery is kept and the subscription moves on in one transaction, so that a due instant is
 * claimed once however many workers ask. Whoever may not get digests just now is moved on without a delivery.
 */
export async function claimDue(projectId: string, now: Date): Promise<void> {
  const until = new Date(now.getTime() - SETTLING);
  await database().transaction(async (tx) => {
    const due = await lockDueSubscriptions(tx, { projectId }, now);
    const claims = due.map((one) => ({
      id: one.id,
      due: one.due,
      next: nextDue(one, now),
      since: startOf(one.last, until),
      until,
      gets: one.gets,
    }));
    await claimDeliveries(tx, { projectId }, claims);
  });
}

/** Where the last digest ended, so that nothing is told twice or left out; a week back for the first. */
export function startOf(last: Date | null, until: Date): Date {
  const end = until.getTime();
  const start = last?.getTime() ?? end - 7 * DAY;
  return new Date(Math.min(end, Math.max(start, end - FURTHEST)));
}
