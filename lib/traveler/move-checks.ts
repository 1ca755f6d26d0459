import { and, eq, inArray, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import type { findChecksOfUnit, ProcedureCheckRow } from "@/db/queries/travelers";
import { checkPrerequisites, checks } from "@/db/schema/travelers";
import type { Difference } from "./compare-versions";

type CheckRows = Awaited<ReturnType<typeof findChecksOfUnit>>;
type Place = { projectId: string; unitId: string; travelerId: string };
type Move = { rows: CheckRows; after: readonly ProcedureCheckRow[]; difference: Difference };

export type MovedChecks = {
  /** Live check id by key, after the move. */
  idOf: Map<string, string>;
  /** For checks that started afresh: the retired row's id → the new one's. */
  successors: Map<string, string>;
  retired: string[];
  /** Units that waited for a check that is dropped and no longer wait. */
  unitsLetGo: string[];
};

/** Rewrites the rows of kept checks, retires changed and dropped ones, and makes rows for changed and added ones. */
export async function moveChecks(
  tx: Transaction,
  place: Place,
  { rows, after, difference }: Move,
): Promise<MovedChecks> {
  const { projectId, unitId, travelerId } = place;
  const oldId = new Map(rows.map((row) => [row.key, row.id]));
  const kept = new Set(difference.kept.map((check) => check.key));
  const fresh = after.filter((check) => !kept.has(check.key) || !oldId.has(check.key));
  const stay = after.flatMap(({ id, key, position, holdPoint }) => {
    const checkId = kept.has(key) ? oldId.get(key) : undefined;
    return checkId ? [{ checkId, id, position, holdPoint }] : [];
  });
  const staying = new Set(stay.map((check) => check.checkId));
  const retired = rows.filter((row) => !staying.has(row.id)).map((row) => row.id);
  if (retired.length > 0)
    await tx
      .update(checks)
      .set({ retiredAt: sql`clock_timestamp()` })
      .where(inArray(checks.id, retired));
  if (stay.length > 0) {
    await tx.execute(sql`
      update checks set procedure_check_id = now.id, position = now.position, hold_point = now."holdPoint"
      from json_to_recordset(${JSON.stringify(stay)}::json)
        as now("checkId" uuid, id uuid, position int, "holdPoint" boolean)
      where checks.id = now."checkId" and checks.project_id = ${projectId}`);
  }
  const made = fresh.map(({ id: procedureCheckId, key, position, stage, holdPoint }) => {
    return {
      id: crypto.randomUUID(),
      projectId,
      unitId,
      travelerId,
      procedureCheckId,
      key,
      position,
      stage,
      holdPoint,
    };
  });
  if (made.length > 0) await tx.insert(checks).values(made);
  const idOf = new Map([
    ...rows.flatMap((row) => (staying.has(row.id) ? [[row.key, row.id] as const] : [])),
    ...made.map((row) => [row.key, row.id] as const),
  ]);
  const successors = new Map(rows.flatMap((row) => (staying.has(row.id) ? [] : successor(row, idOf))));
  return { idOf, successors, retired, unitsLetGo: await unitsWaitingFor(tx, projectId, unitId, retired) };
}

function successor(row: CheckRows[number], idOf: ReadonlyMap<string, string>): [string, string][] {
  const id = idOf.get(row.key);
  return id ? [[row.id, id]] : [];
}

async function unitsWaitingFor(
  tx: Transaction,
  projectId: string,
  unitId: string,
  checkIds: string[],
): Promise<string[]> {
  if (checkIds.length === 0) return [];
  const waiting = await tx
    .selectDistinct({ unitId: checks.unitId })
    .from(checkPrerequisites)
    .innerJoin(checks, eq(checks.id, checkPrerequisites.checkId))
    .where(and(eq(checks.projectId, projectId), inArray(checkPrerequisites.needsCheckId, checkIds)));
  return waiting.map((row) => row.unitId).filter((id) => id !== unitId);
}
