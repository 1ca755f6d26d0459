import { boolean, doublePrecision, index, integer, jsonb, pgTable, text, unique, uuid } from "drizzle-orm/pg-core";
import { revisions, units } from "./boards";
import { createdAt, id, instant } from "./columns";
import { users } from "./people";
import { projects } from "./projects";
import { attempts } from "./travelers";

export type NetlistSource = "ipc-d-356" | "pin-list" | "pin-map";

/** What the copper of a revision should join. Every reading of a file is a version of its own; none is changed. */
export const netlists = pgTable(
  "netlists",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    revisionId: uuid("revision_id")
      .notNull()
      .references(() => revisions.id, { onDelete: "cascade" }),
    /** Version within the revision, from 1. */
    number: integer("number").notNull(),
    source: text("source").$type<NetlistSource>().notNull(),
    fileName: text("file_name").notNull().default(""),
    sha256: text("sha256").notNull(),
    /** The Netlist of lib/calc/netlist. */
    content: jsonb("content").$type<unknown>().notNull(),
    nets: integer("nets").notNull(),
    points: integer("points").notNull(),
    /** Lines of the file that were passed over, with the reason; at most the first few hundred. */
    passedOver: jsonb("passed_over").$type<{ line: number; reason: string }[]>().notNull().default([]),
    createdBy: uuid("created_by").references(() => users.id, { onDelete: "set null" }),
    createdAt: createdAt(),
  },
  (table) => [
    unique("netlists_number").on(table.revisionId, table.number),
    index("netlists_project").on(table.projectId),
  ],
);

/** One round of probing of a unit. It keeps the netlist version that it was made from. */
export const probePlans = pgTable(
  "probe_plans",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    unitId: uuid("unit_id")
      .notNull()
      .references(() => units.id, { onDelete: "cascade" }),
    netlistId: uuid("netlist_id")
      .notNull()
      .references(() => netlists.id, { onDelete: "cascade" }),
    /** Options and probes of lib/calc/continuity. */
    options: jsonb("options").$type<unknown>().notNull(),
    probes: jsonb("probes").$type<unknown>().notNull(),
    count: integer("count").notNull(),
    /** The continuity check whose attempt this round becomes. */
    checkId: uuid("check_id"),
    attemptId: uuid("attempt_id").references(() => attempts.id, { onDelete: "set null" }),
    createdBy: uuid("created_by").references(() => users.id, { onDelete: "set null" }),
    closedAt: instant("closed_at"),
    createdAt: createdAt(),
  },
  (table) => [index("probe_plans_unit").on(table.unitId, table.createdAt)],
);

/** What one probing said. Never changed: a slip is voided and probed again. The id is the client's own UUID. */
export const probeResults = pgTable(
  "probe_results",
  {
    id: uuid("id").primaryKey(),
    planId: uuid("plan_id")
      .notNull()
      .references(() => probePlans.id, { onDelete: "cascade" }),
    /** Place of the probe in the plan, from 0. */
    probe: integer("probe").notNull(),
    beeps: boolean("beeps"),
    ohm: doublePrecision("ohm"),
    typed: text("typed").notNull().default(""),
    userId: uuid("user_id").references(() => users.id, { onDelete: "set null" }),
    performedAt: instant("performed_at").notNull(),
    recordedAt: instant("recorded_at").notNull().defaultNow(),
    voidedAt: instant("voided_at"),
    voidedBy: uuid("voided_by").references(() => users.id, { onDelete: "set null" }),
  },
  (table) => [index("probe_results_plan").on(table.planId, table.probe)],
);
