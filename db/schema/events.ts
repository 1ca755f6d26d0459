import { bigserial, index, jsonb, pgTable, text, uuid } from "drizzle-orm/pg-core";
import { createdAt } from "./columns";
import { users } from "./people";
import { projects } from "./projects";

/**
 * One append-only row for everything that changes state, written in the transaction of the change.
 * kind and payload are checked by lib/event/schema.ts. Log, live view, digest and audit read it.
 */
export const events = pgTable(
  "events",
  {
    id: bigserial("id", { mode: "number" }).primaryKey(),
    projectId: uuid("project_id").references(() => projects.id, { onDelete: "cascade" }),
    actorId: uuid("actor_id").references(() => users.id, { onDelete: "set null" }),
    kind: text("kind").notNull(),
    unitId: uuid("unit_id"),
    checkId: uuid("check_id"),
    subjectId: uuid("subject_id"),
    payload: jsonb("payload").$type<unknown>().notNull(),
    at: createdAt(),
  },
  (table) => [
    index("events_project").on(table.projectId, table.id),
    index("events_project_time").on(table.projectId, table.at),
    index("events_check").on(table.checkId),
  ],
);

/** Answers already given, by the client's UUID of the write: a repeat gets the first answer. */
export const writes = pgTable(
  "writes",
  {
    id: uuid("id").primaryKey(),
    userId: uuid("user_id").references(() => users.id, { onDelete: "cascade" }),
    action: text("action").notNull(),
    answer: jsonb("answer").$type<unknown>(),
    at: createdAt(),
  },
  (table) => [index("writes_at").on(table.at)],
);
