import {
  type AnyPgColumn,
  index,
  integer,
  jsonb,
  pgTable,
  real,
  text,
  unique,
  uniqueIndex,
  uuid,
} from "drizzle-orm/pg-core";
import { boards, slots } from "./boards";
import { createdAt, id, instant } from "./columns";
import { users } from "./people";
import { projects } from "./projects";

/** A face of one's own: rows by name, positions counted from 1, both at one pitch. */
export type ConnectorGrid = { rows: string[]; positions: number; pitchMm: number };

export const connectors = pgTable(
  "connectors",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    boardId: uuid("board_id")
      .notNull()
      .references(() => boards.id, { onDelete: "cascade" }),
    /** As printed on the board: J1, X3. */
    reference: text("reference").notNull(),
    /** Face, e.g. "din41612-b64"; "grid" for one of one's own. See lib/calc/connector. */
    type: text("type").notNull(),
    grid: jsonb("grid").$type<ConnectorGrid>(),
    /** In the board's own order from 1; the first is its edge connector, which the rack draws. */
    position: integer("position").notNull(),
    /** On the backplane: the slot that it makes. */
    slotId: uuid("slot_id").references(() => slots.id, { onDelete: "set null" }),
    /** On the backplane: which connector of the card plugs in here. */
    takes: text("takes").notNull().default("J1"),
    /** A cable to another connector, pin by pin. Said on one of the two ends. */
    cabledTo: uuid("cabled_to").references((): AnyPgColumn => connectors.id, { onDelete: "set null" }),
    /** Raised with every edit of the connector or its pins: a stale edit is refused with 409. */
    version: integer("version").notNull().default(1),
    createdAt: createdAt(),
  },
  (table) => [
    unique("connectors_reference").on(table.boardId, table.reference),
    unique("connectors_position").on(table.boardId, table.position),
    index("connectors_project").on(table.projectId),
    index("connectors_slot").on(table.slotId),
  ],
);

/** What a pin carries. A pin without a row carries nothing. Words of role: lib/calc/interconnect. */
export const pins = pgTable(
  "pins",
  {
    id: id(),
    connectorId: uuid("connector_id")
      .notNull()
      .references(() => connectors.id, { onDelete: "cascade" }),
    pin: text("pin").notNull(),
    signal: text("signal").notNull().default(""),
    role: text("role").notNull(),
    family: text("family").notNull().default(""),
    loads: integer("loads").notNull().default(0),
    enableGroup: text("enable_group").notNull().default(""),
    pullUpOhm: real("pull_up_ohm"),
    note: text("note").notNull().default(""),
  },
  (table) => [unique("pins_pin").on(table.connectorId, table.pin)],
);

/** What is known of a signal beyond its pins. A signal without a row is a data signal without aliases. */
export const signals = pgTable(
  "signals",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    name: text("name").notNull(),
    class: text("class").notNull().default("data"),
    aliases: jsonb("aliases").$type<string[]>().notNull().default([]),
    frequencyHz: real("frequency_hz"),
    note: text("note").notNull().default(""),
    version: integer("version").notNull().default(1),
  },
  (table) => [unique("signals_name").on(table.projectId, table.name)],
);

/** The project's own data-sheet values; a name of the built-in table replaces that family. */
export const families = pgTable(
  "families",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    name: text("name").notNull(),
    /** A Family of lib/calc/levels without its name, checked by the schema of lib/wiring. */
    figures: jsonb("figures").$type<unknown>().notNull(),
    version: integer("version").notNull().default(1),
  },
  (table) => [unique("families_name").on(table.projectId, table.name)],
);

export type FindingState = "open" | "accepted";

/** What the rule check found, with what a maintainer said about it. Rows of findings that are gone are deleted. */
export const ruleFindings = pgTable(
  "rule_findings",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    /** Key of the finding in lib/calc/interconnect. */
    key: text("key").notNull(),
    rule: text("rule").notNull(),
    weight: text("weight").notNull(),
    boards: jsonb("boards").$type<string[]>().notNull(),
    /** The whole finding as it was computed. */
    finding: jsonb("finding").$type<unknown>().notNull(),
    facts: text("facts").notNull(),
    state: text("state").$type<FindingState>().notNull().default("open"),
    reason: text("reason").notNull().default(""),
    /** The facts that the acceptance rests upon: other facts open the finding again. */
    acceptedFacts: text("accepted_facts"),
    acceptedBy: uuid("accepted_by").references(() => users.id, { onDelete: "set null" }),
    acceptedAt: instant("accepted_at"),
    foundAt: instant("found_at").notNull().defaultNow(),
  },
  (table) => [uniqueIndex("rule_findings_key").on(table.projectId, table.key)],
);
