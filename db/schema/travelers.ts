import { sql } from "drizzle-orm";
import {
  bigserial,
  boolean,
  doublePrecision,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from "drizzle-orm/pg-core";
import { units } from "./boards";
import { createdAt, id, instant } from "./columns";
import { instruments, users, type InstrumentRange } from "./people";
import { procedureChecks, procedures, type Stage } from "./procedures";
import { projects } from "./projects";

export type CheckState = "waiting" | "untested" | "passed" | "failed" | "reopened" | "doubtful" | "conceded";
export type Verdict = "conforms" | "guard-band" | "does-not-conform";

export const travelers = pgTable("travelers", {
  id: id(),
  projectId: uuid("project_id")
    .notNull()
    .references(() => projects.id, { onDelete: "cascade" }),
  unitId: uuid("unit_id")
    .notNull()
    .unique()
    .references(() => units.id, { onDelete: "cascade" }),
  procedureId: uuid("procedure_id")
    .notNull()
    .references(() => procedures.id),
  createdAt: createdAt(),
});

export const checks = pgTable(
  "checks",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    unitId: uuid("unit_id")
      .notNull()
      .references(() => units.id, { onDelete: "cascade" }),
    travelerId: uuid("traveler_id")
      .notNull()
      .references(() => travelers.id, { onDelete: "cascade" }),
    procedureCheckId: uuid("procedure_check_id")
      .notNull()
      .references(() => procedureChecks.id),
    key: uuid("key").notNull(),
    position: integer("position").notNull(),
    stage: text("stage").$type<Stage>().notNull(),
    holdPoint: boolean("hold_point").notNull().default(false),
    /** Cached result of lib/check/state; recomputed in the transaction of every change. */
    state: text("state").$type<CheckState>().notNull().default("untested"),
    stateReason: text("state_reason").notNull().default(""),
    stateSince: instant("state_since").notNull().defaultNow(),
    /** True when the last valid attempt conforms only inside the guard band. */
    insideGuardBand: boolean("inside_guard_band").notNull().default(false),
    lastAttemptId: uuid("last_attempt_id"),
    /** Set when a newer procedure version changed or dropped the check; its attempts stay. */
    retiredAt: instant("retired_at"),
    createdAt: createdAt(),
  },
  (table) => [
    index("checks_unit").on(table.unitId, table.position),
    index("checks_project").on(table.projectId, table.state),
  ],
);

/** Edges of the prerequisite graph: checkId waits for needsCheckId, also across units. Never a cycle. */
export const checkPrerequisites = pgTable(
  "check_prerequisites",
  {
    checkId: uuid("check_id")
      .notNull()
      .references(() => checks.id, { onDelete: "cascade" }),
    needsCheckId: uuid("needs_check_id")
      .notNull()
      .references(() => checks.id, { onDelete: "cascade" }),
  },
  (table) => [
    primaryKey({ columns: [table.checkId, table.needsCheckId] }),
    index("check_prerequisites_needs").on(table.needsCheckId),
  ],
);

/** One carrying-out of a check. Never updated, never deleted. The id is the client's own UUID. */
export const attempts = pgTable(
  "attempts",
  {
    id: uuid("id").primaryKey(),
    /** Order of arrival at the server: the later one counts. */
    arrival: bigserial("arrival", { mode: "number" }).notNull().unique(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    unitId: uuid("unit_id")
      .notNull()
      .references(() => units.id, { onDelete: "cascade" }),
    checkId: uuid("check_id")
      .notNull()
      .references(() => checks.id, { onDelete: "cascade" }),
    /** The wording and limits it was judged against. */
    procedureCheckId: uuid("procedure_check_id")
      .notNull()
      .references(() => procedureChecks.id),
    userId: uuid("user_id").references(() => users.id, { onDelete: "set null" }),
    /** When it was carried out, by the device's clock; recordedAt is the server's. */
    performedAt: instant("performed_at").notNull(),
    recordedAt: instant("recorded_at").notNull().defaultNow(),
    verdict: text("verdict").$type<Verdict>().notNull(),
    /** What the builder entered, as the kind's record schema has it. */
    record: jsonb("record").$type<unknown>().notNull(),
    /** Sentences of the judgement, kept as they were said. */
    sentences: jsonb("sentences").$type<string[]>().notNull().default([]),
    note: text("note").notNull().default(""),
    instrumentId: uuid("instrument_id").references(() => instruments.id, { onDelete: "set null" }),
    /** Name and accuracy as they were at the time. */
    instrumentSnapshot: jsonb("instrument_snapshot").$type<{
      name: string;
      ranges: InstrumentRange[];
      calibrationNote: string;
    } | null>(),
  },
  (table) => [
    index("attempts_check").on(table.checkId, table.arrival),
    /** Finds the newest failure of a check however many attempts it has. */
    index("attempts_failing")
      .on(table.checkId, table.arrival)
      .where(sql`verdict = 'does-not-conform'`),
    index("attempts_project_time").on(table.projectId, table.recordedAt),
  ],
);

export const readings = pgTable(
  "readings",
  {
    id: id(),
    attemptId: uuid("attempt_id")
      .notNull()
      .references(() => attempts.id, { onDelete: "cascade" }),
    position: integer("position").notNull(),
    /** Empty for a single reading; "+5 V at TP1, no load" for a cell of a table. */
    label: text("label").notNull().default(""),
    typed: text("typed").notNull(),
    value: doublePrecision("value").notNull(),
    unit: text("unit").notNull(),
    lower: doublePrecision("lower"),
    upper: doublePrecision("upper"),
    expandedUncertainty: doublePrecision("expanded_uncertainty"),
    verdict: text("verdict").$type<Verdict>().notNull(),
  },
  (table) => [unique("readings_position").on(table.attemptId, table.position)],
);

export const attemptVoids = pgTable("attempt_voids", {
  id: uuid("id").primaryKey(),
  attemptId: uuid("attempt_id")
    .notNull()
    .unique()
    .references(() => attempts.id, { onDelete: "cascade" }),
  userId: uuid("user_id").references(() => users.id, { onDelete: "set null" }),
  reason: text("reason").notNull(),
  createdAt: createdAt(),
});

export const reopenings = pgTable(
  "reopenings",
  {
    id: uuid("id").primaryKey(),
    checkId: uuid("check_id")
      .notNull()
      .references(() => checks.id, { onDelete: "cascade" }),
    userId: uuid("user_id").references(() => users.id, { onDelete: "set null" }),
    reason: text("reason").notNull(),
    /** Arrival number of the last attempt before it: later attempts answer the reopening. */
    afterArrival: integer("after_arrival").notNull(),
    createdAt: createdAt(),
  },
  (table) => [index("reopenings_check").on(table.checkId)],
);

export const concessions = pgTable(
  "concessions",
  {
    id: uuid("id").primaryKey(),
    checkId: uuid("check_id")
      .notNull()
      .references(() => checks.id, { onDelete: "cascade" }),
    /** The attempt that is accepted though it does not conform. */
    attemptId: uuid("attempt_id")
      .notNull()
      .references(() => attempts.id, { onDelete: "cascade" }),
    userId: uuid("user_id").references(() => users.id, { onDelete: "set null" }),
    reason: text("reason").notNull(),
    createdAt: createdAt(),
    withdrawnAt: instant("withdrawn_at"),
    withdrawnBy: uuid("withdrawn_by").references(() => users.id, { onDelete: "set null" }),
    withdrawnReason: text("withdrawn_reason"),
  },
  (table) => [index("concessions_check").on(table.checkId)],
);

/** A maintainer lets one unit pass an open hold point. Shown on the traveler for ever. */
export const holdLifts = pgTable(
  "hold_lifts",
  {
    id: uuid("id").primaryKey(),
    checkId: uuid("check_id")
      .notNull()
      .references(() => checks.id, { onDelete: "cascade" }),
    userId: uuid("user_id").references(() => users.id, { onDelete: "set null" }),
    reason: text("reason").notNull(),
    createdAt: createdAt(),
  },
  (table) => [index("hold_lifts_check").on(table.checkId)],
);
