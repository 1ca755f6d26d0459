import { bigserial, index, integer, jsonb, pgTable, primaryKey, real, text, unique, uuid } from "drizzle-orm/pg-core";
import { revisions, units } from "./boards";
import { createdAt, id, instant } from "./columns";
import { users } from "./people";
import { projects } from "./projects";
import { attempts, checks } from "./travelers";

/** open: only the symptom is known; traced: the cause is found; mended: it works again; no-fault: it was none. */
export type FaultState = "open" | "traced" | "mended" | "no-fault";

export const faults = pgTable(
  "faults",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    /** F1, F2 … within the project. */
    number: integer("number").notNull(),
    unitId: uuid("unit_id")
      .notNull()
      .references(() => units.id, { onDelete: "cascade" }),
    checkId: uuid("check_id").references(() => checks.id, { onDelete: "set null" }),
    attemptId: uuid("attempt_id").references(() => attempts.id, { onDelete: "set null" }),
    probePlanId: uuid("probe_plan_id"),
    title: text("title").notNull(),
    symptom: text("symptom").notNull().default(""),
    suspected: text("suspected").notNull().default(""),
    tried: text("tried").notNull().default(""),
    cause: text("cause").notNull().default(""),
    mend: text("mend").notNull().default(""),
    lesson: text("lesson").notNull().default(""),
    /** What the next revision should change. */
    nextRevision: text("next_revision").notNull().default(""),
    hours: real("hours"),
    signals: jsonb("signals").$type<string[]>().notNull().default([]),
    pins: jsonb("pins").$type<string[]>().notNull().default([]),
    state: text("state").$type<FaultState>().notNull().default("open"),
    version: integer("version").notNull().default(1),
    createdBy: uuid("created_by").references(() => users.id, { onDelete: "set null" }),
    closedAt: instant("closed_at"),
    createdAt: createdAt(),
  },
  (table) => [unique("faults_number").on(table.projectId, table.number), index("faults_unit").on(table.unitId)],
);

export type ReworkKind = "bodge-wire" | "cut-track" | "part-swap" | "reflow" | "firmware" | "connector";
/** out: the wire was taken out again. */
export type Wire = { number: string; from: string; to: string; colour: string; out: boolean };

/** A physical change to a unit. Never changed or deleted: taking a wire out again is another rework. */
export const reworks = pgTable(
  "reworks",
  {
    id: uuid("id").primaryKey(),
    /** Order of arrival, for lists; what it puts in doubt says which attempts it came after. */
    arrival: bigserial("arrival", { mode: "number" }).notNull().unique(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    unitId: uuid("unit_id")
      .notNull()
      .references(() => units.id, { onDelete: "cascade" }),
    /** R1, R2 … within the unit. */
    number: integer("number").notNull(),
    kind: text("kind").$type<ReworkKind>().notNull(),
    what: text("what").notNull(),
    why: text("why").notNull().default(""),
    wire: jsonb("wire").$type<Wire | null>(),
    faultId: uuid("fault_id").references(() => faults.id, { onDelete: "set null" }),
    /** The same rework on another unit, from which it was carried over. */
    carriedFrom: uuid("carried_from"),
    userId: uuid("user_id").references(() => users.id, { onDelete: "set null" }),
    performedAt: instant("performed_at").notNull(),
    createdAt: createdAt(),
  },
  (table) => [unique("reworks_number").on(table.unitId, table.number), index("reworks_project").on(table.projectId)],
);

export type TouchKind = "signal" | "pin" | "part" | "block" | "rail";

export const reworkTouches = pgTable(
  "rework_touches",
  {
    reworkId: uuid("rework_id")
      .notNull()
      .references(() => reworks.id, { onDelete: "cascade" }),
    kind: text("kind").$type<TouchKind>().notNull(),
    name: text("name").notNull(),
  },
  (table) => [primaryKey({ columns: [table.reworkId, table.kind, table.name] })],
);

/** touched, depends: computed; added: by hand; spared: computed, but taken out by hand with a reason. */
export type DoubtOrigin = "touched" | "depends" | "added" | "spared";

/** Which checks a rework put in doubt, as it was shown before it was saved. Written with the rework, never changed. */
export const reworkDoubts = pgTable(
  "rework_doubts",
  {
    reworkId: uuid("rework_id")
      .notNull()
      .references(() => reworks.id, { onDelete: "cascade" }),
    checkId: uuid("check_id")
      .notNull()
      .references(() => checks.id, { onDelete: "cascade" }),
    origin: text("origin").$type<DoubtOrigin>().notNull(),
    reason: text("reason").notNull(),
    /** Arrival of the last attempt before it: a later attempt answers the doubt. */
    afterArrival: integer("after_arrival").notNull(),
  },
  (table) => [primaryKey({ columns: [table.reworkId, table.checkId] }), index("rework_doubts_check").on(table.checkId)],
);

export type PunchSource = "fault" | "concession" | "rework";

/** What a new revision took over from the units of the old one, to be ticked off. */
export const punchItems = pgTable(
  "punch_items",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    /** The new revision. */
    revisionId: uuid("revision_id")
      .notNull()
      .references(() => revisions.id, { onDelete: "cascade" }),
    source: text("source").$type<PunchSource>().notNull(),
    sourceId: uuid("source_id").notNull(),
    unitId: uuid("unit_id").references(() => units.id, { onDelete: "set null" }),
    text: text("text").notNull(),
    /** How it was dealt with; empty while it is open. */
    dealtWith: text("dealt_with").notNull().default(""),
    dealtBy: uuid("dealt_by").references(() => users.id, { onDelete: "set null" }),
    dealtAt: instant("dealt_at"),
    version: integer("version").notNull().default(1),
    createdAt: createdAt(),
  },
  (table) => [unique("punch_items_once").on(table.revisionId, table.source, table.sourceId)],
);
