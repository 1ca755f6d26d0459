import { boolean, index, integer, jsonb, pgTable, text, unique, uuid } from "drizzle-orm/pg-core";
import { boards } from "./boards";
import { createdAt, id, instant } from "./columns";
import { users } from "./people";

export type Stage = "inspection" | "continuity" | "power-on" | "function" | "integration";

/** What a check proves: decides which checks a rework puts in doubt, and lights the pins on the bench. */
export type Coverage = { signals: string[]; pins: string[]; rails: string[]; blocks: string[] };

/** draft: being written, one per board at most. issued: units get it as their traveler; never changed again. */
export type ProcedureState = "draft" | "issued";

export const procedures = pgTable(
  "procedures",
  {
    id: id(),
    boardId: uuid("board_id")
      .notNull()
      .references(() => boards.id, { onDelete: "cascade" }),
    number: integer("number").notNull(),
    state: text("state").$type<ProcedureState>().notNull().default("draft"),
    note: text("note").notNull().default(""),
    /** Raised with every edit of the draft: a stale edit is refused with 409. */
    version: integer("version").notNull().default(1),
    createdBy: uuid("created_by").references(() => users.id, { onDelete: "set null" }),
    issuedAt: instant("issued_at"),
    createdAt: createdAt(),
  },
  (table) => [unique("procedures_number").on(table.boardId, table.number)],
);

export const procedureChecks = pgTable(
  "procedure_checks",
  {
    id: id(),
    procedureId: uuid("procedure_id")
      .notNull()
      .references(() => procedures.id, { onDelete: "cascade" }),
    /** Stays the same from version to version, so that travelers can be moved over. */
    key: uuid("key").notNull(),
    position: integer("position").notNull(),
    stage: text("stage").$type<Stage>().notNull(),
    title: text("title").notNull(),
    instruction: text("instruction").notNull().default(""),
    caution: text("caution").notNull().default(""),
    /** Where the practice comes from, e.g. "IPC-A-610, in outline". */
    reference: text("reference").notNull().default(""),
    holdPoint: boolean("hold_point").notNull().default(false),
    kind: text("kind").notNull(),
    /** Checked by the schema of the kind; see lib/check-kinds. */
    spec: jsonb("spec").$type<unknown>().notNull(),
    covers: jsonb("covers").$type<Coverage>().notNull(),
    /** Keys of the checks of the same procedure that must hold first, besides earlier hold points. */
    needs: jsonb("needs").$type<string[]>().notNull().default([]),
  },
  (table) => [
    unique("procedure_checks_key").on(table.procedureId, table.key),
    index("procedure_checks_order").on(table.procedureId, table.position),
  ],
);
