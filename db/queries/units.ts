import { and, eq } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { units } from "@/db/schema/boards";

type InProject = { projectId: string };

export async function findUnitBySerial(db: Queryable, scope: InProject, serial: string) {
  const [row] = await db
    .select()
    .from(units)
    .where(and(eq(units.projectId, scope.projectId), eq(units.serial, serial)))
    .limit(1);
  return row;
}

export async function findUnit(db: Queryable, scope: InProject, unitId: string) {
  const [row] = await db
    .select()
    .from(units)
    .where(and(eq(units.projectId, scope.projectId), eq(units.id, unitId)))
    .limit(1);
  return row;
}

/** The row stays locked until the transaction ends: changes of one unit come one after another. */
export async function lockUnit(db: Queryable, scope: InProject, unitId: string) {
  const [row] = await db
    .select()
    .from(units)
    .where(and(eq(units.projectId, scope.projectId), eq(units.id, unitId)))
    .for("update");
  return row;
}
