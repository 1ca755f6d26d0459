import { TZDate } from "@date-fns/tz";
import { subDays } from "date-fns";
import { sql } from "drizzle-orm";
import type { Database } from "@/db/client";

/** An evening so many days ago, by the harbour's clock. */
export function eveningAt(now: Date, daysAgo: number, minutes: number, zone: string): Date {
  const day = subDays(new TZDate(now, zone), daysAgo);
  const at = new Date(
    new TZDate(day.getFullYear(), day.getMonth(), day.getDate(), 19, 10 + minutes, 0, zone).getTime(),
  );
  return at > now ? new Date(now.getTime() - (60 - Math.min(minutes, 59)) * 1000) : at;
}

/** Tables whose rows the story's use cases make, and the column that says when. */
const DATED = [
  ["attempts", "recorded_at"],
  ["attempt_voids", "created_at"],
  ["reopenings", "created_at"],
  ["concessions", "created_at"],
  ["hold_lifts", "created_at"],
  ["events", "created_at"],
  ["attachments", "created_at"],
  ["log_entries", "created_at"],
  ["units", "created_at"],
  ["boards", "created_at"],
  ["revisions", "created_at"],
  ["memberships", "created_at"],
  ["procedures", "issued_at"],
  ["slot_occupancies", "placed_at"],
  ["rule_findings", "found_at"],
  ["rule_findings", "accepted_at"],
  ["blocks", "created_at"],
  ["blocks", "changed_at"],
  ["board_plans", "created_at"],
  ["faults", "created_at"],
  ["faults", "closed_at"],
  ["reworks", "performed_at"],
  ["reworks", "created_at"],
  ["punch_items", "created_at"],
  ["punch_items", "dealt_at"],
  ["netlists", "created_at"],
  ["probe_plans", "created_at"],
  ["probe_results", "recorded_at"],
] as const;

/** One thing that happens in the story, and when. */
export type Happening = { at: Date; work: () => Promise<void> };

/** Plays what happened in the order in which it happened, so that events stand in that order too. */
export async function play(db: Database, happenings: Happening[]): Promise<void> {
  const inOrder = [...happenings].sort((a, b) => a.at.getTime() - b.at.getTime());
  for (const { at, work } of inOrder) await happen(db, at, work);
}

/**
 * Lets `work` happen through the product's own use cases, then dates what it wrote back to `at`. Only the seed may: the
 * triggers that keep history final are told so for this one transaction.
 */
async function happen(db: Database, at: Date, work: () => Promise<void>): Promise<void> {
  const [started] = await db.execute<{ now: string }>(sql`select clock_timestamp()::text as now`);
  await work();
  await db.transaction(async (tx) => {
    await tx.execute(sql`select set_config('boardwake.purge', 'on', true)`);
    for (const [table, column] of DATED) {
      const name = sql.identifier(column);
      await tx.execute(
        sql`update ${sql.identifier(table)} set ${name} = ${at.toISOString()}::timestamptz where ${name} >= ${started?.now}::timestamptz`,
      );
    }
    await tx.execute(
      sql`update attempts set performed_at = recorded_at - interval '20 seconds' where performed_at >= ${started?.now}::timestamptz - interval '1 minute'`,
    );
    await tx.execute(
      sql`update checks set state_since = ${at.toISOString()}::timestamptz where state_since >= ${started?.now}::timestamptz`,
    );
  });
}
