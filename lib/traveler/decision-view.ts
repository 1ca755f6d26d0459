import type { History } from "./load-history";
import { personView } from "./person-view";
import type { ConcessionView, HoldLiftView, ReopeningView } from "./traveler-view";

type Decision = { row: { id: string; userId: string | null; createdAt: Date; reason: string }; byName: string | null };

/** A reopening or a lifted hold: who, when, why. */
export function decisionView({ row, byName }: Decision): ReopeningView & HoldLiftView {
  return { id: row.id, by: personView(row.userId, byName), at: row.createdAt.toISOString(), reason: row.reason };
}

export function concessionView({ row, byName, withdrawnByName }: History["concessions"][number]): ConcessionView {
  return {
    ...decisionView({ row, byName }),
    withdrawn: row.withdrawnAt
      ? {
          by: personView(row.withdrawnBy, withdrawnByName),
          at: row.withdrawnAt.toISOString(),
          reason: row.withdrawnReason ?? "",
        }
      : null,
  };
}
