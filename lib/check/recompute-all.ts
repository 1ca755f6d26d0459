import type { Queryable } from "@/db/client";
import { findCheckHistories } from "@/db/queries/check-histories";
import { findUnitIds } from "@/db/queries/travelers";
import { deriveStates } from "./derive-states";
import { historyFromRow } from "./history-from-row";
import { differs } from "./refresh-states";

export type Difference = { checkId: string; serial: string; title: string; cached: string; fromHistory: string };

/** Recomputes every state of a project from history and names the checks whose cached columns say otherwise. Changes nothing. */
export async function recomputeAll(db: Queryable, projectId: string): Promise<Difference[]> {
  const rows = await findCheckHistories(db, projectId, await findUnitIds(db, projectId));
  const derived = deriveStates(rows.map(historyFromRow));
  return rows.flatMap((row) => {
    const now = derived.get(row.id);
    if (!now || !differs(row, now)) return [];
    const { id: checkId, serial, title } = row;
    return [
      {
        checkId,
        serial,
        title,
        cached: `${row.state}: ${row.state_reason}`,
        fromHistory: `${now.state}: ${now.reason}`,
      },
    ];
  });
}
