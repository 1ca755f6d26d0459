import { boolean, index, integer, jsonb, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { createdAt, id, instant } from "./columns";

export type Theme = "system" | "light" | "dark";

export const users = pgTable("users", {
  id: id(),
  name: text("name"),
  email: text("email").notNull().unique(),
  emailVerified: instant("email_verified"),
  image: text("image"),
  passwordHash: text("password_hash"),
  timeZone: text("time_zone").notNull().default("UTC"),
  theme: text("theme").$type<Theme>().notNull().default("system"),
  speakAloud: boolean("speak_aloud").notNull().default(false),
  /** Mail to the builder whose check was reopened. */
  mailOnReopen: boolean("mail_on_reopen").notNull().default(true),
  /** Set when the mail service reports that mail to this address bounces; nothing but account mail is sent then. */
  mailBouncedAt: instant("mail_bounced_at"),
  createdAt: createdAt(),
});

/** Tables of the session library, in its own column names. */
export const accounts = pgTable(
  "accounts",
  {
    userId: uuid("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    type: text("type").notNull(),
    provider: text("provider").notNull(),
    providerAccountId: text("provider_account_id").notNull(),
    refresh_token: text("refresh_token"),
    access_token: text("access_token"),
    expires_at: integer("expires_at"),
    token_type: text("token_type"),
    scope: text("scope"),
    id_token: text("id_token"),
    session_state: text("session_state"),
  },
  (table) => [primaryKey({ columns: [table.provider, table.providerAccountId] })],
);

export const sessions = pgTable(
  "sessions",
  {
    /** SHA-256 of the token in the cookie: who reads the table cannot use a session. */
    sessionToken: text("session_token").primaryKey(),
    userId: uuid("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    expires: instant("expires").notNull(),
    /** The browser's own name, so that people recognise their sessions. */
    userAgent: text("user_agent").notNull().default(""),
    createdAt: createdAt(),
  },
  (table) => [index("sessions_user").on(table.userId)],
);

export const verificationTokens = pgTable(
  "verification_tokens",
  {
    identifier: text("identifier").notNull(),
    token: text("token").notNull(),
    expires: instant("expires").notNull(),
  },
  (table) => [primaryKey({ columns: [table.identifier, table.token] })],
);

export type AccountTokenPurpose = "confirm-address" | "reset-password";

/** Single-use links of the account: only the SHA-256 of the token is kept. */
export const accountTokens = pgTable(
  "account_tokens",
  {
    id: id(),
    userId: uuid("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    purpose: text("purpose").$type<AccountTokenPurpose>().notNull(),
    tokenHash: text("token_hash").notNull().unique(),
    expiresAt: instant("expires_at").notNull(),
    usedAt: instant("used_at"),
    createdAt: createdAt(),
  },
  (table) => [index("account_tokens_user").on(table.userId, table.purpose)],
);

/** Counters of rate-limiter-flexible (its Drizzle store): one row a limit and key, keys hashed. */
export const rateLimits = pgTable("rate_limits", {
  key: text("key").primaryKey(),
  points: integer("points").notNull(),
  expire: instant("expire"),
});

export type InstrumentKind = "meter" | "scope" | "supply" | "other";

/** One range of one quantity, as the data sheet states it; see lib/calc/conformity. */
export type InstrumentRange = {
  unit: string;
  fullScale: number;
  resolution: number;
  percentOfReading: number;
  counts: number;
  percentOfRange: number;
};

export const instruments = pgTable(
  "instruments",
  {
    id: id(),
    userId: uuid("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    name: text("name").notNull(),
    kind: text("kind").$type<InstrumentKind>().notNull(),
    ranges: jsonb("ranges").$type<InstrumentRange[]>().notNull().default([]),
    calibrationNote: text("calibration_note").notNull().default(""),
    archivedAt: instant("archived_at"),
    createdAt: createdAt(),
  },
  (table) => [index("instruments_user").on(table.userId)],
);
