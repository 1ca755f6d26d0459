import { inArray, or, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findStandingChecks, type ProcedureCheckRow } from "@/db/queries/travelers";
import { checkPrerequisites } from "@/db/schema/travelers";
import { reject } from "@/lib/actions/answer";
import { standingFromRow } from "@/lib/check/standing-from-row";
import { describeCircle, findCircle, waitsFor } from "@/lib/prerequisite/find-circle";
import type { MovedChecks } from "./move-checks";

type Edge = { checkId: string; needsCheckId: string };
type Moving = Omit<MovedChecks, "unitsLetGo"> & {
  before: readonly ProcedureCheckRow[];
  after: readonly ProcedureCheckRow[];
  rows: readonly { id: string; key: string }[];
};

/**
 * Who waits for whom after the move: the old version's own prerequisites go, the new version's come, and what a
 * maintainer added by hand stays, moved on to the row that took a changed check's place. What needed a dropped check no
 * longer waits for it.
 */
export async function movePrerequisites(tx: Transaction, projectId: string, moving: Moving): Promise<void> {
  const { before, after, rows, idOf, successors, retired } = moving;
  const touched = rows.map((row) => row.id);
  const edges =
    touched.length === 0
      ? []
      : await tx
          .select()
          .from(checkPrerequisites)
          .where(or(inArray(checkPrerequisites.checkId, touched), inArray(checkPrerequisites.needsCheckId, touched)));
  const oldIdOf = new Map(rows.map((row) => [row.key, row.id]));
  const fromOldVersion = new Set(edgesOf(before, oldIdOf).map(name));
  const gone = new Set(retired);
  const live = (id: string) => successors.get(id) ?? (gone.has(id) ? undefined : id);
  const byHand = edges
    .filter((edge) => !fromOldVersion.has(name(edge)))
    .flatMap((edge): Edge[] => {
      const [checkId, needsCheckId] = [live(edge.checkId), live(edge.needsCheckId)];
      return checkId && needsCheckId ? [{ checkId, needsCheckId }] : [];
    });
  const wanted = [...edgesOf(after, idOf), ...byHand];
  if (edges.length > 0) {
    await tx.execute(sql`
      delete from check_prerequisites using json_to_recordset(${JSON.stringify(edges)}::json)
        as old("checkId" uuid, "needsCheckId" uuid)
      where check_prerequisites.check_id = old."checkId" and check_prerequisites.needs_check_id = old."needsCheckId"`);
  }
  if (wanted.length > 0) await tx.insert(checkPrerequisites).values(wanted).onConflictDoNothing();
  await refuseCircles(tx, projectId, [...idOf.values()]);
}

const name = ({ checkId, needsCheckId }: Edge) => `${checkId} ${needsCheckId}`;

function edgesOf(checks: readonly ProcedureCheckRow[], idOf: ReadonlyMap<string, string>): Edge[] {
  return checks.flatMap((check) =>
    check.needs.flatMap((key) => {
      const [checkId, needsCheckId] = [idOf.get(check.key), idOf.get(key)];
      return checkId && needsCheckId ? [{ checkId, needsCheckId }] : [];
    }),
  );
}

/** A new order or a new hold point may close a circle with a prerequisite that was added by hand. */
async function refuseCircles(tx: Transaction, projectId: string, checkIds: readonly string[]): Promise<void> {
  const placed = (await findStandingChecks(tx, projectId, true)).map(standingFromRow);
  const byId = new Map(placed.map((one) => [one.id, one]));
  const edges = waitsFor(placed);
  for (const id of checkIds) {
    const circle = findCircle(edges, id)?.flatMap((member) => byId.get(member) ?? []);
    if (!circle) continue;
    reject(
      "conflict",
      `With the new version checks wait for each other in a circle: ${describeCircle(circle)} Remove one of these prerequisites first; nothing was changed.`,
    );
  }
}
