import type { Queryable } from "@/db/client";
import { findAttemptsOf, findReadingsOf } from "@/db/queries/faults";
import type { Verdict } from "@/db/schema/travelers";
import { checkKind } from "@/lib/check-kinds/list";

export type SeenAttempt = { id: string; verdict: Verdict; summary: string; note: string; by: string; at: string };

/** The newest valid attempts of a check in a few words each. */
export async function attemptsOf(
  db: Queryable,
  scope: { projectId: string },
  checkId: string,
  limit: number,
): Promise<SeenAttempt[]> {
  const rows = await findAttemptsOf(db, scope, checkId, limit);
  const readings = await findReadingsOf(
    db,
    rows.map(({ id }) => id),
  );
  return rows.map(({ id, verdict, note, kind, spec, record, byName, performedAt }) => ({
    ...{ id, verdict, note },
    summary: checkKind(kind).summary(
      spec,
      record,
      readings.filter(({ attemptId }) => attemptId === id),
    ),
    by: byName ?? "Somebody who left",
    at: performedAt.toISOString(),
  }));
}
