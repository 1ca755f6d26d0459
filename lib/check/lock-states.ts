import { sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { affectedUnits } from "@/db/queries/check-histories";

/**
 * Locks, always taken in this order, so that nobody waits for anybody in a circle:
 * 1. the structure of the project (which checks there are, who waits for whom), shared by everybody who records and
 *    alone for whoever changes it;
 * 2. the travelers of the unit and of every unit that depends on it, in the order of their ids.
 * What the states of those units depend on is then read with all earlier changes in it.
 */
export async function lockUnits(tx: Transaction, projectId: string, unitIds: readonly string[]): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock_shared(${STRUCTURE}, hashtext(${projectId}))`);
  await tx.execute(sql`
    with recursive ${affectedUnits(projectId, unitIds)}
    select id from travelers where unit_id in (select unit_id from affected) order by id for update`);
}

/** Alone with the project's structure: nobody records, reopens or moves a traveler until the transaction ends. */
export async function lockStructure(tx: Transaction, projectId: string): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock(${STRUCTURE}, hashtext(${projectId}))`);
}

/** First half of the advisory key: this program's locks on a project's structure. */
const STRUCTURE = 4107;
