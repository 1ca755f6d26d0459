import { timestamp, uuid } from "drizzle-orm/pg-core";

/** Primary key. Rows that a client creates carry the client's own UUID; the rest get one from the database. */
export const id = () => uuid("id").primaryKey().defaultRandom();

/** An instant with time zone, as a JavaScript Date. */
export const instant = (name: string) => timestamp(name, { withTimezone: true, mode: "date" });

export const createdAt = () => instant("created_at").notNull().defaultNow();

/** Archived rows stay with their history and can be restored. */
export const archivedAt = () => instant("archived_at");
