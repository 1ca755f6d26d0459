import { boolean, index, integer, jsonb, pgTable, real, text, unique, uuid } from "drizzle-orm/pg-core";
import { boards } from "./boards";
import { createdAt, id } from "./columns";
import { projects } from "./projects";

/** What the machine's plan takes for granted; one row a project, made with the first edit. */
export const planConditions = pgTable("plan_conditions", {
  projectId: uuid("project_id")
    .primaryKey()
    .references(() => projects.id, { onDelete: "cascade" }),
  ambientC: real("ambient_c").notNull().default(40),
  logicVolts: real("logic_volts").notNull().default(5),
  logicRail: text("logic_rail").notNull().default("+5V"),
  pinCapacitancePf: real("pin_capacitance_pf").notNull().default(5),
  /** Spare parts to order: at least this share, per cent. */
  sparesPercent: real("spares_percent").notNull().default(10),
  currency: text("currency").notNull().default("EUR"),
  version: integer("version").notNull().default(1),
});

/** One conductor of the backplane between two neighbouring slots. Null: not asked for. */
export type RailCopper = { segmentMm: number; widthMm: number; thicknessUm: number };

export const rails = pgTable(
  "rails",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    /** The signal that carries it: +5V. */
    name: text("name").notNull(),
    volts: real("volts").notNull(),
    tolerancePercent: real("tolerance_percent").notNull().default(5),
    /** What the supply gives at most, A; null while nobody knows. */
    capacityA: real("capacity_a"),
    /** The board that feeds it into the backplane. */
    sourceBoardId: uuid("source_board_id").references(() => boards.id, { onDelete: "set null" }),
    copper: jsonb("copper").$type<RailCopper>(),
    position: integer("position").notNull(),
    version: integer("version").notNull().default(1),
  },
  (table) => [unique("rails_name").on(table.projectId, table.name)],
);

/** Something of a board that takes current besides its packages, or figures typed in for the whole of it. */
export const powerLines = pgTable(
  "power_lines",
  {
    id: id(),
    boardId: uuid("board_id")
      .notNull()
      .references(() => boards.id, { onDelete: "cascade" }),
    position: integer("position").notNull(),
    /** led, pull-up, regulator, fixed, measured …: the kinds of lib/calc/power, checked by lib/power. */
    item: jsonb("item").$type<unknown>().notNull(),
  },
  (table) => [index("power_lines_board").on(table.boardId, table.position)],
);

/** How a board is planned; one row a board, made with the first edit. */
export const boardPlans = pgTable("board_plans", {
  boardId: uuid("board_id")
    .primaryKey()
    .references(() => boards.id, { onDelete: "cascade" }),
  /** pooled: gates of all blocks share packages; per-block: each block has its own. */
  packing: text("packing").$type<"pooled" | "per-block">().notNull().default("pooled"),
  family: text("family").notNull().default("HC"),
  /** How often the logic moves, Hz, and the share of its outputs that move each time. */
  clockHz: real("clock_hz").notNull().default(1_000_000),
  activity: real("activity").notNull().default(0.25),
  loadPf: real("load_pf").notNull().default(50),
  /** Units that are to be built; null: as many as there are. */
  unitsPlanned: integer("units_planned"),
  sparesTied: boolean("spares_tied").notNull().default(false),
  version: integer("version").notNull().default(1),
  createdAt: createdAt(),
});
