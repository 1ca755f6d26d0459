import { sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findCheckHistories, type CheckHistoryRow } from "@/db/queries/check-histories";
import type { CheckState } from "@/db/schema/travelers";
import { recordEvents } from "@/lib/event/record-event";
import type { DerivedCheck } from "./check-history";
import { deriveStates } from "./derive-states";
import { historyFromRow } from "./history-from-row";

export type RefreshedCheck = DerivedCheck & { from: CheckState; serial: string; title: string };

type Cause = { projectId: string; actorId: string };

/**
 * Recomputes the cached states of the units' checks and of everything that depends on them, in one query and at most
 * two writes. Call it after the change, in its transaction, with the locks of lock-states.ts held.
 */
export async function refreshStates(
  tx: Transaction,
  cause: Cause,
  unitIds: readonly string[],
): Promise<Map<string, RefreshedCheck>> {
  const rows = await findCheckHistories(tx, cause.projectId, unitIds);
  const derived = deriveStates(rows.map(historyFromRow));
  const changed: RefreshedCheck[] = [];
  const all = new Map<string, RefreshedCheck>();
  for (const row of rows) {
    const now = derived.get(row.id);
    if (!now || !row.affected) continue;
    const refreshed = { ...now, from: row.state, serial: row.serial, title: row.title };
    all.set(row.id, refreshed);
    if (differs(row, now)) changed.push(refreshed);
  }
  if (changed.length > 0) await writeStates(tx, cause.projectId, changed);
  const doubted = changed.filter((check) => check.state === "doubtful" && check.from !== "doubtful");
  if (doubted.length > 0) {
    const unitOf = new Map(rows.map((row) => [row.id, row.unit_id]));
    await recordEvents(
      tx,
      doubted.map(({ id, serial, title, reason }) => ({
        subject: { ...cause, unitId: unitOf.get(id), checkId: id },
        kind: "check.doubted",
        payload: { serial, title, reason },
      })),
    );
  }
  return all;
}

/** Whether the cached columns say something else than history. */
export function differs(row: CheckHistoryRow, now: DerivedCheck): boolean {
  return (
    row.state !== now.state ||
    row.state_reason !== now.reason ||
    row.inside_guard_band !== now.insideGuardBand ||
    row.last_attempt_id !== now.lastAttemptId
  );
}

async function writeStates(tx: Transaction, projectId: string, changed: readonly RefreshedCheck[]): Promise<void> {
  const rows = changed.map(({ id, state, reason, insideGuardBand, lastAttemptId }) => ({
    id,
    state,
    reason,
    insideGuardBand,
    lastAttemptId,
  }));
  await tx.execute(sql`
    update checks set state = now.state, state_reason = now.reason, inside_guard_band = now."insideGuardBand",
      last_attempt_id = now."lastAttemptId",
      state_since = case when checks.state = now.state then checks.state_since else clock_timestamp() end
    from json_to_recordset(${JSON.stringify(rows)}::json)
      as now(id uuid, state text, reason text, "insideGuardBand" boolean, "lastAttemptId" uuid)
    where checks.id = now.id and checks.project_id = ${projectId}`);
}
