import type { CheckHistoryRow } from "@/db/queries/check-histories";
import type { CheckHistory } from "./check-history";

export function historyFromRow(row: CheckHistoryRow): CheckHistory {
  const {
    last_id: id,
    last_arrival: arrival,
    last_verdict: verdict,
    reopened_after: after,
    reworked_after: reworked,
  } = row;
  const last = id !== null && arrival !== null && verdict !== null ? { id, arrival, verdict } : null;
  return {
    id: row.id,
    unitId: row.unit_id,
    serial: row.serial,
    stage: row.stage,
    title: row.title,
    position: row.position,
    holdPoint: row.hold_point,
    lifted: row.lifted,
    needs: row.needs,
    last,
    failedArrival: row.failed_arrival,
    reopened: after === null ? null : { afterArrival: after, reason: row.reopened_reason ?? "" },
    reworked: reworked === null ? null : { afterArrival: reworked, reason: row.reworked_reason ?? "" },
    concessions: last && row.conceded_reason !== null ? [{ attemptId: last.id, reason: row.conceded_reason }] : [],
  };
}
