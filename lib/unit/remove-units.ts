import { and, eq, inArray } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { deleteFilesOf, findWaitingUnits } from "@/db/queries/holdings";
import { units } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { refreshStates } from "@/lib/check/refresh-states";
import { liftHistoryGuard } from "@/lib/event/lift-history-guard";

/**
 * Deletes units with their travelers, attempts and files, in the transaction of a purge that holds the structure of
 * the project alone. What waited for them waits no longer: the prerequisites go and the states of those checks follow.
 */
export async function removeUnits(tx: Transaction, scope: ProjectScope, unitIds: readonly string[]): Promise<void> {
  if (unitIds.length === 0) return;
  const { projectId, viewer } = scope;
  await liftHistoryGuard(tx);
  const waiting = await findWaitingUnits(tx, scope, unitIds);
  await deleteFilesOf(tx, scope, unitIds);
  await tx.delete(units).where(and(eq(units.projectId, projectId), inArray(units.id, [...unitIds])));
  if (waiting.length > 0) await refreshStates(tx, { projectId, actorId: viewer.userId }, waiting);
}
