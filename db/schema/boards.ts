import { sql } from "drizzle-orm";
import { index, integer, numeric, pgTable, text, unique, uniqueIndex, uuid } from "drizzle-orm/pg-core";
import { archivedAt, createdAt, id, instant } from "./columns";
import { projects } from "./projects";
import { users } from "./people";

export type BoardKind = "card" | "backplane";

export const boards = pgTable(
  "boards",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    /** Short code that begins the serial numbers of its units, e.g. TIM. */
    code: text("code").notNull(),
    name: text("name").notNull(),
    summary: text("summary").notNull().default(""),
    kind: text("kind").$type<BoardKind>().notNull().default("card"),
    version: integer("version").notNull().default(1),
    archivedAt: archivedAt(),
    createdAt: createdAt(),
  },
  (table) => [unique("boards_code").on(table.projectId, table.code)],
);

export const revisions = pgTable(
  "revisions",
  {
    id: id(),
    boardId: uuid("board_id")
      .notNull()
      .references(() => boards.id, { onDelete: "cascade" }),
    letter: text("letter").notNull(),
    notes: text("notes").notNull().default(""),
    releasedAt: instant("released_at"),
    createdAt: createdAt(),
  },
  (table) => [unique("revisions_letter").on(table.boardId, table.letter)],
);

export const units = pgTable(
  "units",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    boardId: uuid("board_id")
      .notNull()
      .references(() => boards.id, { onDelete: "cascade" }),
    revisionId: uuid("revision_id")
      .notNull()
      .references(() => revisions.id, { onDelete: "cascade" }),
    serial: text("serial").notNull(),
    note: text("note").notNull().default(""),
    version: integer("version").notNull().default(1),
    archivedAt: archivedAt(),
    createdAt: createdAt(),
  },
  (table) => [unique("units_serial").on(table.projectId, table.serial), index("units_board").on(table.boardId)],
);

export const slots = pgTable(
  "slots",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    position: integer("position").notNull(),
    label: text("label").notNull().default(""),
    /** Width along the backplane in HP (1 HP = 5.08 mm). */
    pitchHp: numeric("pitch_hp", { mode: "number" }).notNull().default(4),
    boardId: uuid("board_id").references(() => boards.id, { onDelete: "set null" }),
    version: integer("version").notNull().default(1),
    archivedAt: archivedAt(),
    createdAt: createdAt(),
  },
  (table) => [
    uniqueIndex("slots_position")
      .on(table.projectId, table.position)
      .where(sql`archived_at is null`),
  ],
);

/** Which unit sat in which slot, and when. Rows are closed, never deleted. */
export const slotOccupancies = pgTable(
  "slot_occupancies",
  {
    id: id(),
    slotId: uuid("slot_id")
      .notNull()
      .references(() => slots.id, { onDelete: "cascade" }),
    unitId: uuid("unit_id")
      .notNull()
      .references(() => units.id, { onDelete: "cascade" }),
    placedAt: instant("placed_at").notNull().defaultNow(),
    placedBy: uuid("placed_by").references(() => users.id, { onDelete: "set null" }),
    removedAt: instant("removed_at"),
    removedBy: uuid("removed_by").references(() => users.id, { onDelete: "set null" }),
  },
  (table) => [
    uniqueIndex("slot_occupancies_slot")
      .on(table.slotId)
      .where(sql`removed_at is null`),
    uniqueIndex("slot_occupancies_unit")
      .on(table.unitId)
      .where(sql`removed_at is null`),
  ],
);
