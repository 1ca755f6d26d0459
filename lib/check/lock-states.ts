import { sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { affectedUnits } from "@/db/queries/check-histories";

/**
 * Locks, always taken in this order, so that nobody waits for anybody in a circle:
 * 1. the structure of the project (which checks there are, who waits for whom), shared by everybody who changes a
 *    state, alone for whoever changes the structure;
 * 2. units: alone for a change that may move several checks, the unit and every unit that depends on it, in the order
 *    of their keys; shared for an attempt that moves its own check only;
 * 3. in the second case that check, alone.
 * With them held, what the states depend on stands still and has all earlier changes in it. They end with the
 * transaction. Two names may share a key: then one waits without need, no more.
 */
const STRUCTURE = 4107;
const UNIT = 4108;
const CHECK = 4109;

/** For a change that may move checks of the units and of those that depend on them. */
export async function lockUnits(tx: Transaction, projectId: string, unitIds: readonly string[]): Promise<void> {
  await shareStructure(tx, projectId);
  await lockAffectedUnits(tx, projectId, unitIds);
}

/** First lock: the structure stays as it is. */
export async function shareStructure(tx: Transaction, projectId: string): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock_shared(${STRUCTURE}, hashtext(${projectId}))`);
}

/** Second lock, once the structure stands still. */
export async function lockAffectedUnits(tx: Transaction, projectId: string, unitIds: readonly string[]): Promise<void> {
  await tx.execute(sql`
    with recursive ${affectedUnits(projectId, unitIds)}
    select pg_advisory_xact_lock(${UNIT}, key)
    from (select distinct hashtext(unit_id::text) as key from affected order by 1) as keys`);
}

/** Second and third lock for one check that nobody waits for: others of its unit go on at the same time. */
export async function lockOneCheck(tx: Transaction, check: { id: string; unitId: string }): Promise<void> {
  // Columns of a row are worked out from left to right.
  await tx.execute(sql`
    select pg_advisory_xact_lock_shared(${UNIT}, hashtext(${check.unitId})),
      pg_advisory_xact_lock(${CHECK}, hashtext(${check.id}))`);
}

/** Alone with the project's structure: nobody records, reopens or moves a traveler until the transaction ends. */
export async function lockStructure(tx: Transaction, projectId: string): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock(${STRUCTURE}, hashtext(${projectId}))`);
}
