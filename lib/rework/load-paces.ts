import type { Queryable } from "@/db/client";
import { findOwnAttempts } from "@/db/queries/reworks";
import type { ProjectScope } from "@/lib/access/scope";
import { findPaces, inferSessions, type Paces } from "@/lib/calc/forecast";

/** Enough for a pace, and quick to read. */
const NEWEST = 2000;

/** How long a check of each stage takes the person who asks, from their own attempts in this project. */
export async function loadPaces(db: Queryable, scope: ProjectScope): Promise<Paces> {
  const builder = scope.viewer.userId;
  const rows = await findOwnAttempts(db, scope, builder, NEWEST);
  return findPaces(
    inferSessions(rows.map(({ at, checkId, stage }) => ({ atMs: at.getTime(), checkId, stage, builder }))),
  );
}
