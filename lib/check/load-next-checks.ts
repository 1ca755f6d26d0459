import type { Queryable } from "@/db/client";
import { findStandingChecks } from "@/db/queries/travelers";
import { nextChecks, type NextCheck } from "./next-checks";
import { standingFromRow } from "./standing-from-row";

/** What the bench should do next in a project, in one query. */
export async function loadNextChecks(
  db: Queryable,
  scope: { projectId: string },
  limit?: number,
): Promise<NextCheck[]> {
  const rows = await findStandingChecks(db, scope.projectId);
  return nextChecks(rows.map(standingFromRow)).slice(0, limit);
}
