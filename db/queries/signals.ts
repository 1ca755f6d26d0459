import { and, eq, ne, sql } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { boards } from "@/db/schema/boards";
import { connectors, pins, signals } from "@/db/schema/wiring";

type InProject = { projectId: string };

/** The row stays locked until the transaction ends. */
export async function lockSignal(db: Queryable, scope: InProject, name: string) {
  const [row] = await db
    .select()
    .from(signals)
    .where(and(eq(signals.projectId, scope.projectId), eq(signals.name, name)))
    .for("update");
  return row;
}

/** Every name that pins of the project carry, with how many pins on which boards. */
export async function findCarriedSignals(db: Queryable, scope: InProject) {
  return db
    .select({
      name: pins.signal,
      pins: sql<number>`count(*)`.mapWith(Number),
      boards: sql<string[]>`array_agg(distinct ${boards.code})`,
    })
    .from(pins)
    .innerJoin(connectors, eq(connectors.id, pins.connectorId))
    .innerJoin(boards, eq(boards.id, connectors.boardId))
    .where(and(eq(connectors.projectId, scope.projectId), sql`${boards.archivedAt} is null`, ne(pins.signal, "")))
    .groupBy(pins.signal)
    .orderBy(pins.signal);
}

/** Names known to the project that differ from this one in nothing but case. */
export async function findCaseTwins(db: Queryable, { projectId }: InProject, name: string) {
  const rows = await db.execute<{ name: string; carried: boolean }>(sql`
    select ${signals.name} as name, false as carried from ${signals}
      where ${signals.projectId} = ${projectId} and lower(${signals.name}) = lower(${name}) and ${signals.name} <> ${name}
    union
    select ${pins.signal} as name, true as carried from ${pins}
      join ${connectors} on ${connectors.id} = ${pins.connectorId}
      where ${connectors.projectId} = ${projectId} and lower(${pins.signal}) = lower(${name})
        and ${pins.signal} <> ${name}
    order by carried desc, name`);
  return [...rows];
}

/** Signals that have this name as an alias. */
export async function findClaims(db: Queryable, { projectId }: InProject, name: string) {
  return db
    .select({ name: signals.name })
    .from(signals)
    .where(and(eq(signals.projectId, projectId), ne(signals.name, name), sql`${signals.aliases} ? ${name}`));
}
