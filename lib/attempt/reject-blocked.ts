import type { Transaction } from "@/db/client";
import { findCheckHistories } from "@/db/queries/check-histories";
import type { CheckRow } from "@/db/queries/checks";
import { reject } from "@/lib/actions/answer";
import { deriveStates } from "@/lib/check/derive-states";
import { historyFromRow } from "@/lib/check/history-from-row";
import { nameBlockers } from "@/lib/check/state-reason";

/** Says by name what a check waits for, and rolls the change back. */
export async function rejectBlocked(tx: Transaction, projectId: string, check: CheckRow): Promise<never> {
  const rows = await findCheckHistories(tx, projectId, [check.unitId]);
  const blockers = deriveStates(rows.map(historyFromRow)).get(check.id)?.blockers ?? [];
  const names = nameBlockers(blockers, check.serial);
  return reject("blocked", `“${check.title}” waits for ${names}. Nothing was recorded.`, { details: { blockers } });
}
