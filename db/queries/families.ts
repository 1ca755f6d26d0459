import { and, eq, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards } from "@/db/schema/boards";
import { connectors, families, pins } from "@/db/schema/wiring";

type InProject = { projectId: string };

/** The row stays locked until the transaction ends. */
export async function lockFamily(db: Queryable, scope: InProject, familyId: string) {
  const [row] = await db
    .select()
    .from(families)
    .where(and(eq(families.projectId, scope.projectId), eq(families.id, familyId)))
    .for("update");
  return row;
}

/** What pins name as their family, with how many pins do. */
export async function findFamilyUse(db: Queryable, scope: InProject) {
  return db
    .select({ name: pins.family, pins: sql<number>`count(*)`.mapWith(Number) })
    .from(pins)
    .innerJoin(connectors, eq(connectors.id, pins.connectorId))
    .innerJoin(boards, eq(boards.id, connectors.boardId))
    .where(and(eq(connectors.projectId, scope.projectId), sql`${boards.archivedAt} is null and ${pins.family} <> ''`))
    .groupBy(pins.family);
}
