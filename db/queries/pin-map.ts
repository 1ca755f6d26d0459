import { and, asc, count, desc, eq, inArray, ne, sql } from "drizzle-orm";
import type { Queryable, Transaction } from "@/db/client";
import { boards, slots } from "@/db/schema/boards";
import { events } from "@/db/schema/events";
import { users } from "@/db/schema/people";
import { connectors, families, pins } from "@/db/schema/wiring";
import { rails } from "@/db/schema/power";

type InProject = { projectId: string };
type PinRow = Omit<typeof pins.$inferInsert, "id" | "connectorId">;

export async function findPinsOf(db: Queryable, connectorId: string) {
  return db.select().from(pins).where(eq(pins.connectorId, connectorId)).orderBy(asc(pins.pin));
}

/** Notes beside pins; most pins have none. */
export async function findPinNotes(db: Queryable, scope: InProject) {
  return db
    .select({ connectorId: pins.connectorId, pin: pins.pin, note: pins.note })
    .from(pins)
    .innerJoin(connectors, eq(connectors.id, pins.connectorId))
    .where(and(eq(connectors.projectId, scope.projectId), ne(pins.note, "")));
}

export async function countPinsOf(db: Queryable, connectorId: string): Promise<number> {
  const [row] = await db.select({ pins: count() }).from(pins).where(eq(pins.connectorId, connectorId));
  return row?.pins ?? 0;
}

/** A row for each pin, in place of what was there; other pins stay. */
export async function putPins(tx: Transaction, connectorId: string, rows: readonly PinRow[]): Promise<void> {
  if (rows.length === 0) return;
  await tx
    .insert(pins)
    .values(rows.map((row) => ({ ...row, connectorId })))
    .onConflictDoUpdate({
      target: [pins.connectorId, pins.pin],
      set: {
        signal: sql`excluded.signal`,
        role: sql`excluded.role`,
        family: sql`excluded.family`,
        loads: sql`excluded.loads`,
        enableGroup: sql`excluded.enable_group`,
        pullUpOhm: sql`excluded.pull_up_ohm`,
        note: sql`excluded.note`,
      },
    });
}

export async function takePins(tx: Transaction, connectorId: string, names: readonly string[]): Promise<void> {
  if (names.length === 0) return;
  await tx.delete(pins).where(and(eq(pins.connectorId, connectorId), inArray(pins.pin, [...names])));
}

/** Raises the version, so that an edit made against the old one is refused. */
export async function raiseConnector(tx: Transaction, connectorId: string): Promise<number> {
  const [row] = await tx
    .update(connectors)
    .set({ version: sql`${connectors.version} + 1` })
    .where(eq(connectors.id, connectorId))
    .returning({ version: connectors.version });
  return row?.version ?? 0;
}

/** Names of the project's own families and of its rails. */
export async function findOwnNames(db: Queryable, scope: InProject) {
  const [own, carried] = await Promise.all([
    db.select({ name: families.name }).from(families).where(eq(families.projectId, scope.projectId)),
    db.select({ name: rails.name }).from(rails).where(eq(rails.projectId, scope.projectId)),
  ]);
  return { families: own.map(({ name }) => name), rails: carried.map(({ name }) => name) };
}

/** Who changed the connector last, and when. */
export async function findLastWiringChange(db: Queryable, scope: InProject, connectorId: string) {
  const [row] = await db
    .select({ by: users.name, at: events.at })
    .from(events)
    .leftJoin(users, eq(users.id, events.actorId))
    .where(and(eq(events.projectId, scope.projectId), eq(events.subjectId, connectorId)))
    .orderBy(desc(events.id))
    .limit(1);
  return row;
}

/** The connectors that make a slot of the backplane, with the board they stand on. */
export async function findSlotConnectors(db: Queryable, scope: InProject) {
  return db
    .select({ connector: connectors, position: slots.position, code: boards.code })
    .from(connectors)
    .innerJoin(slots, eq(slots.id, connectors.slotId))
    .innerJoin(boards, eq(boards.id, connectors.boardId))
    .where(eq(connectors.projectId, scope.projectId))
    .orderBy(asc(slots.position), asc(connectors.reference));
}
