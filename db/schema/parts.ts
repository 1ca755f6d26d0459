import { type AnyPgColumn, index, integer, jsonb, pgTable, text, unique, uuid } from "drizzle-orm/pg-core";
import { boards } from "./boards";
import { archivedAt, createdAt, id, instant } from "./columns";
import { projects } from "./projects";

/** What a project knows of a part: stock, price, and its own data where the built-in table has none or others. */
export const parts = pgTable(
  "parts",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    /** As on the parts list: 74HC283, 100 nF X7R 0805. */
    number: text("number").notNull(),
    description: text("description").notNull().default(""),
    /** Own logic data (LogicPart of lib/calc/logic-parts), checked by the schema of lib/part; null: none, or built in. */
    logic: jsonb("logic").$type<unknown>(),
    stock: integer("stock").notNull().default(0),
    /** Of one, in the smallest unit of the project's currency; null while nobody knows. */
    priceCents: integer("price_cents"),
    note: text("note").notNull().default(""),
    version: integer("version").notNull().default(1),
    archivedAt: archivedAt(),
    createdAt: createdAt(),
  },
  (table) => [unique("parts_number").on(table.projectId, table.number)],
);

export type BlockGates = { gateFunction: string; count: number };

export const blocks = pgTable(
  "blocks",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    name: text("name").notNull(),
    summary: text("summary").notNull().default(""),
    gates: jsonb("gates").$type<BlockGates[]>().notNull().default([]),
    version: integer("version").notNull().default(1),
    /** When its gates or children last changed: units built before are no longer described by it. */
    changedAt: instant("changed_at").notNull().defaultNow(),
    archivedAt: archivedAt(),
    createdAt: createdAt(),
  },
  (table) => [unique("blocks_name").on(table.projectId, table.name)],
);

export const blockChildren = pgTable(
  "block_children",
  {
    id: id(),
    blockId: uuid("block_id")
      .notNull()
      .references(() => blocks.id, { onDelete: "cascade" }),
    childId: uuid("child_id")
      .notNull()
      .references((): AnyPgColumn => blocks.id, { onDelete: "cascade" }),
    count: integer("count").notNull(),
  },
  (table) => [
    unique("block_children_once").on(table.blockId, table.childId),
    index("block_children_child").on(table.childId),
  ],
);

export const boardBlocks = pgTable(
  "board_blocks",
  {
    id: id(),
    boardId: uuid("board_id")
      .notNull()
      .references(() => boards.id, { onDelete: "cascade" }),
    blockId: uuid("block_id")
      .notNull()
      .references(() => blocks.id, { onDelete: "cascade" }),
    count: integer("count").notNull(),
  },
  (table) => [
    unique("board_blocks_once").on(table.boardId, table.blockId),
    index("board_blocks_block").on(table.blockId),
  ],
);

/** Parts of a board besides the packages that packing counts: memories, counters, resistors, connectors. */
export const bomLines = pgTable(
  "bom_lines",
  {
    id: id(),
    boardId: uuid("board_id")
      .notNull()
      .references(() => boards.id, { onDelete: "cascade" }),
    position: integer("position").notNull(),
    partNumber: text("part_number").notNull(),
    description: text("description").notNull().default(""),
    count: integer("count").notNull(),
    /** "R1–R8", as printed on the board. */
    designators: text("designators").notNull().default(""),
  },
  (table) => [index("bom_lines_board").on(table.boardId, table.position)],
);

/** A chain of parts whose delay matters. */
export const delayPaths = pgTable(
  "delay_paths",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    boardId: uuid("board_id").references(() => boards.id, { onDelete: "set null" }),
    name: text("name").notNull(),
    /** Steps, load, supply, clock: the path of lib/calc/delay, checked by the schema of lib/delay-path. */
    path: jsonb("path").$type<unknown>().notNull(),
    version: integer("version").notNull().default(1),
    archivedAt: archivedAt(),
    createdAt: createdAt(),
  },
  (table) => [unique("delay_paths_name").on(table.projectId, table.name)],
);
