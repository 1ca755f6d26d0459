import { asc, eq } from "drizzle-orm";
import type { Queryable } from "@/db/client";
import { instruments } from "@/db/schema/people";

export type InstrumentRow = typeof instruments.$inferSelect;

/** A person's own instruments, archived ones last. */
export function listInstruments(db: Queryable, userId: string): Promise<InstrumentRow[]> {
  return db
    .select()
    .from(instruments)
    .where(eq(instruments.userId, userId))
    .orderBy(asc(instruments.archivedAt), asc(instruments.name));
}
