import { sql } from "drizzle-orm";
import {
  boolean,
  index,
  integer,
  pgTable,
  primaryKey,
  smallint,
  text,
  unique,
  uniqueIndex,
  uuid,
} from "drizzle-orm/pg-core";
import { archivedAt, createdAt, id, instant } from "./columns";
import { users } from "./people";

export type Role = "maintainer" | "builder" | "collaborator";
export type DecisionRule = "simple" | "guarded";
export type MachineLayout = "rack" | "tower";

export const projects = pgTable("projects", {
  id: id(),
  slug: text("slug").notNull().unique(),
  name: text("name").notNull(),
  summary: text("summary").notNull().default(""),
  timeZone: text("time_zone").notNull().default("UTC"),
  decisionRule: text("decision_rule").$type<DecisionRule>().notNull().default("guarded"),
  /** rack: cards upright side by side; tower: cards lie one above the other. */
  layout: text("layout").$type<MachineLayout>().notNull().default("tower"),
  /** Raised with every edit: a stale edit is refused with 409. */
  version: integer("version").notNull().default(1),
  archivedAt: archivedAt(),
  createdAt: createdAt(),
});

export const memberships = pgTable(
  "memberships",
  {
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    userId: uuid("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    role: text("role").$type<Role>().notNull(),
    createdAt: createdAt(),
  },
  (table) => [primaryKey({ columns: [table.projectId, table.userId] }), index("memberships_user").on(table.userId)],
);

export const invitations = pgTable(
  "invitations",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    email: text("email").notNull(),
    role: text("role").$type<Role>().notNull(),
    tokenHash: text("token_hash").notNull().unique(),
    expiresAt: instant("expires_at").notNull(),
    invitedBy: uuid("invited_by").references(() => users.id, { onDelete: "set null" }),
    acceptedAt: instant("accepted_at"),
    acceptedBy: uuid("accepted_by").references(() => users.id, { onDelete: "set null" }),
    withdrawnAt: instant("withdrawn_at"),
    createdAt: createdAt(),
  },
  (table) => [
    uniqueIndex("invitations_one_open")
      .on(table.projectId, table.email)
      .where(sql`accepted_at is null and withdrawn_at is null`),
  ],
);

export type QuietWeek = "line" | "nothing";

export const digestSubscriptions = pgTable(
  "digest_subscriptions",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    userId: uuid("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    enabled: boolean("enabled").notNull().default(true),
    /** ISO weekday, 1 Monday … 7 Sunday. */
    weekday: smallint("weekday").notNull().default(7),
    hour: smallint("hour").notNull().default(18),
    zone: text("zone").notNull(),
    quietWeek: text("quiet_week").$type<QuietWeek>().notNull().default("line"),
    /** When the next digest is due, recomputed from weekday, hour and zone after each delivery. */
    nextDueAt: instant("next_due_at").notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    unique("digest_subscriptions_one").on(table.projectId, table.userId),
    index("digest_subscriptions_due").on(table.nextDueAt),
  ],
);

export type DeliveryState = "claimed" | "sent" | "quiet" | "failed";

/** One row for each subscriber and due instant: the unique key is what makes a digest go out once. */
export const digestDeliveries = pgTable(
  "digest_deliveries",
  {
    id: id(),
    subscriptionId: uuid("subscription_id")
      .notNull()
      .references(() => digestSubscriptions.id, { onDelete: "cascade" }),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    dueAt: instant("due_at").notNull(),
    /** What it tells of: from the end of the person's last digest to when this one was claimed. */
    since: instant("since").notNull(),
    until: instant("until").notNull(),
    state: text("state").$type<DeliveryState>().notNull().default("claimed"),
    /** While claimed: not to be tried before. A worker that sends it moves this ahead, so that no other does meanwhile. */
    nextTryAt: instant("next_try_at").notNull().defaultNow(),
    tries: smallint("tries").notNull().default(0),
    lastError: text("last_error"),
    sentAt: instant("sent_at"),
    createdAt: createdAt(),
  },
  (table) => [
    unique("digest_deliveries_once").on(table.subscriptionId, table.dueAt),
    index("digest_deliveries_open").on(table.projectId, table.state),
    index("digest_deliveries_waiting")
      .on(table.nextTryAt)
      .where(sql`state = 'claimed'`),
  ],
);
