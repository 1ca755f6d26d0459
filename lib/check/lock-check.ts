import type { Transaction } from "@/db/client";
import { findCheck, type CheckRow } from "@/db/queries/checks";
import { reject } from "@/lib/actions/answer";
import { lockUnits } from "./lock-states";

export const NO_SUCH_CHECK = "There is no such check in this project.";

/** The check as it stands with the locks of its unit held, or the refusal that fits. */
export async function lockCheck(tx: Transaction, projectId: string, checkId: string): Promise<CheckRow> {
  const found = await findCheck(tx, projectId, checkId);
  if (!found) return reject("not-found", NO_SUCH_CHECK);
  await lockUnits(tx, projectId, [found.unitId]);
  const check = await findCheck(tx, projectId, checkId);
  return check ? insist(check) : reject("not-found", NO_SUCH_CHECK);
}

/** Refuses checks that are history only. */
export function insist(check: CheckRow): CheckRow {
  if (check.retiredAt) rejectRetired(check.title);
  if (check.unitArchivedAt) reject("conflict", `${check.serial} is archived. Restore it first; nothing was changed.`);
  return check;
}

export function rejectRetired(title: string): never {
  reject(
    "conflict",
    `“${title}” belongs to an earlier version of the procedure and is kept as history. Reload to see the check that took its place.`,
  );
}
