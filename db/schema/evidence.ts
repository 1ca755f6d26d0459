import { bigint, index, integer, pgTable, smallint, text, uuid } from "drizzle-orm/pg-core";
import { units } from "./boards";
import { createdAt, id, instant } from "./columns";
import { faults, reworks } from "./faults";
import { users } from "./people";
import { projects } from "./projects";
import { attempts, checks } from "./travelers";

export const logEntries = pgTable(
  "log_entries",
  {
    id: uuid("id").primaryKey(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    unitId: uuid("unit_id").references(() => units.id, { onDelete: "set null" }),
    authorId: uuid("author_id").references(() => users.id, { onDelete: "set null" }),
    title: text("title").notNull(),
    body: text("body").notNull().default(""),
    version: integer("version").notNull().default(1),
    editedAt: instant("edited_at"),
    archivedAt: instant("archived_at"),
    createdAt: createdAt(),
  },
  (table) => [index("log_entries_project").on(table.projectId, table.createdAt)],
);

/** photo and scope-picture are images; scope-data is delimited text. */
export type AttachmentKind = "photo" | "scope-picture" | "scope-data";

/** How the unit looked before the rework, or how it looks since. */
export type ReworkSide = "before" | "after";

/** A file in the object store. A row exists only for a file that arrived whole and was recognised by its content. */
export const attachments = pgTable(
  "attachments",
  {
    id: id(),
    projectId: uuid("project_id")
      .notNull()
      .references(() => projects.id, { onDelete: "cascade" }),
    uploadedBy: uuid("uploaded_by").references(() => users.id, { onDelete: "set null" }),
    kind: text("kind").$type<AttachmentKind>().notNull(),
    objectKey: text("object_key").notNull().unique(),
    mediaType: text("media_type").notNull(),
    bytes: bigint("bytes", { mode: "number" }).notNull(),
    sha256: text("sha256").notNull(),
    /** Cleaned of path parts and control characters; for showing and downloading only. */
    fileName: text("file_name").notNull(),
    caption: text("caption").notNull().default(""),
    width: integer("width"),
    height: integer("height"),
    /** Thumbnails are made by the worker; null until then. */
    smallKey: text("small_key"),
    largeKey: text("large_key"),
    position: smallint("position").notNull().default(0),
    /** The client's own UUID of the upload: a retry does not make a second row. */
    uploadId: uuid("upload_id").notNull().unique(),
    unitId: uuid("unit_id").references(() => units.id, { onDelete: "set null" }),
    checkId: uuid("check_id").references(() => checks.id, { onDelete: "set null" }),
    attemptId: uuid("attempt_id").references(() => attempts.id, { onDelete: "set null" }),
    logEntryId: uuid("log_entry_id").references(() => logEntries.id, { onDelete: "set null" }),
    faultId: uuid("fault_id").references(() => faults.id, { onDelete: "set null" }),
    reworkId: uuid("rework_id").references(() => reworks.id, { onDelete: "set null" }),
    reworkSide: text("rework_side").$type<ReworkSide>(),
    archivedAt: instant("archived_at"),
    createdAt: createdAt(),
  },
  (table) => [
    index("attachments_project").on(table.projectId, table.createdAt),
    index("attachments_check").on(table.checkId),
    index("attachments_attempt").on(table.attemptId),
    index("attachments_log_entry").on(table.logEntryId),
    index("attachments_fault").on(table.faultId),
    index("attachments_rework").on(table.reworkId),
  ],
);
