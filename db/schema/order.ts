import { index, pgTable, text, unique, uuid } from "drizzle-orm/pg-core";
import { boards } from "./boards";
import { createdAt, id, instant } from "./columns";
import { users } from "./people";
import { projects } from "./projects";

export type OrderRule = "needs" | "despite";

/**
 * What people say about the order of boards. needs: `boardId` waits for `otherId`. despite: the derived rule that
 * `otherId` must be proven before `boardId` is set aside, with the reason.
 */
export const boardOrders = pgTable(
  "board_orders",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    boardId: uuid("board_id")
      .notNull()
      .references(() => boards.id, { onDelete: "cascade" }),
    otherId: uuid("other_id")
      .notNull()
      .references(() => boards.id, { onDelete: "cascade" }),
    rule: text("rule").$type<OrderRule>().notNull(),
    reason: text("reason").notNull().default(""),
    createdBy: uuid("created_by").references(() => users.id, { onDelete: "set null" }),
    createdAt: createdAt(),
  },
  (table) => [unique("board_orders_once").on(table.boardId, table.otherId, table.rule)],
);

/** An evening at the bench that somebody started and stopped by hand; others are inferred from attempts. */
export const benchSessions = pgTable(
  "bench_sessions",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    userId: uuid("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    startedAt: instant("started_at").notNull().defaultNow(),
    endedAt: instant("ended_at"),
    note: text("note").notNull().default(""),
  },
  (table) => [index("bench_sessions_project").on(table.projectId, table.startedAt)],
);
