import { sql } from "drizzle-orm";
import { database } from "@/db/client";
import { sweepObjects } from "@/lib/attachment/sweep-objects";
import { log } from "@/lib/http/log";

/** A link that has expired still says so for a while, instead of "unknown". */
const TOKEN_DAYS = 30;
/** Longer than any device holds attempts back. */
const WRITE_DAYS = 90;
/** How long the page of the digest can show what became of each. */
const DELIVERY_DAYS = 400;

/** Removes what nobody can use any more: objects without a row, and rows past their time. */
export async function sweep(): Promise<void> {
  await sweepRows();
  log().info(await sweepObjects(), "swept");
}

/** Expired links and sessions, old write ids, what became of digests long ago. */
export async function sweepRows(): Promise<void> {
  const db = database();
  const days = (count: number) => sql`now() - make_interval(days => ${count})`;
  await db.execute(sql`delete from account_tokens where expires_at < ${days(TOKEN_DAYS)}`);
  await db.execute(sql`delete from verification_tokens where expires < now()`);
  await db.execute(sql`delete from sessions where expires < now()`);
  await db.execute(sql`delete from rate_limits where expire < now()`);
  await db.execute(sql`delete from writes where created_at < ${days(WRITE_DAYS)}`);
  await db.execute(sql`delete from digest_deliveries where created_at < ${days(DELIVERY_DAYS)} and state <> 'claimed'`);
}
