import type { History } from "./load-history";
import { nameRework } from "@/lib/rework/rework-words";
import { personView } from "./person-view";
import type { CheckDoubtView, ConcessionView, HoldLiftView, ReopeningView } from "./traveler-view";

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

/** From the point of view of a unit: a rework of another one is named with its serial. */
export function doubtView(row: History["doubts"][number], fromSerial: string): CheckDoubtView {
  const { id, serial, number, origin, reason, userId, byName, createdAt } = row;
  return {
    ...{ id, serial, number, reason },
    rework: serial === fromSerial ? nameRework(row) : `${nameRework(row)} on ${serial}`,
    isSpared: origin === "spared",
    by: personView(userId, byName),
    at: createdAt.toISOString(),
  };
}
