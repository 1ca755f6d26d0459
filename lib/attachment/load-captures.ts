import { and, asc, count, desc, eq, inArray, isNull, type SQL } from "drizzle-orm";
import { database } from "@/db/client";
import { evidenceColumns } from "@/db/queries/attachments";
import { units } from "@/db/schema/boards";
import { attachments, logEntries, type AttachmentKind } from "@/db/schema/evidence";
import { users } from "@/db/schema/people";
import { procedureChecks, type Stage } from "@/db/schema/procedures";
import { checks } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import { evidenceView } from "./evidence-view";
import { ATTACHMENT_KINDS } from "./schema";

export type CaptureView = EvidenceView & {
  unit: { serial: string } | null;
  check: { id: string; title: string; stage: Stage } | null;
  entry: { id: string; title: string } | null;
};

export type CapturesView = {
  captures: CaptureView[];
  page: number;
  pages: number;
  total: number;
  /** Of each kind, with the unit filter but without the kind filter. */
  counts: Record<AttachmentKind, number>;
  /** Units that have evidence of any kind. */
  units: string[];
};

export type CapturesQuery = { kind: AttachmentKind; unit: string | undefined; page: number };

const PAGE_SIZE = 24;

/** One kind of evidence of the project, newest first, with what it belongs to. */
export async function loadCaptures(scope: ProjectScope, query: CapturesQuery): Promise<CapturesView> {
  const db = database();
  const ours = and(eq(attachments.projectId, scope.projectId), isNull(attachments.archivedAt));
  const ofUnit = query.unit === undefined ? ours : and(ours, eq(units.serial, query.unit));
  const [counts, withEvidence] = await Promise.all([
    countKinds(ofUnit),
    db
      .selectDistinct({ serial: units.serial })
      .from(attachments)
      .innerJoin(units, eq(units.id, attachments.unitId))
      .where(ours)
      .orderBy(asc(units.serial)),
  ]);
  const total = counts[query.kind];
  const pages = Math.max(1, Math.ceil(total / PAGE_SIZE));
  const page = Math.min(Math.max(1, query.page), pages);
  const rows = await db
    .select({
      ...evidenceColumns,
      serial: units.serial,
      checkId: checks.id,
      checkTitle: procedureChecks.title,
      stage: checks.stage,
      entryId: logEntries.id,
      entryTitle: logEntries.title,
    })
    .from(attachments)
    .leftJoin(users, eq(users.id, attachments.uploadedBy))
    .leftJoin(units, eq(units.id, attachments.unitId))
    .leftJoin(checks, eq(checks.id, attachments.checkId))
    .leftJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .leftJoin(logEntries, eq(logEntries.id, attachments.logEntryId))
    .where(and(ofUnit, eq(attachments.kind, query.kind)))
    .orderBy(desc(attachments.createdAt), desc(attachments.id))
    .limit(PAGE_SIZE)
    .offset((page - 1) * PAGE_SIZE);
  const captures = rows.map(({ serial, checkId, checkTitle, stage, entryId, entryTitle, ...row }) => ({
    ...evidenceView(row),
    unit: serial === null ? null : { serial },
    check: checkId === null || checkTitle === null || stage === null ? null : { id: checkId, title: checkTitle, stage },
    entry: entryId === null || entryTitle === null ? null : { id: entryId, title: entryTitle },
  }));
  return { captures, page, pages, total, counts, units: withEvidence.map((row) => row.serial) };
}

async function countKinds(where: SQL | undefined): Promise<Record<AttachmentKind, number>> {
  const rows = await database()
    .select({ kind: attachments.kind, total: count() })
    .from(attachments)
    .leftJoin(units, eq(units.id, attachments.unitId))
    .where(and(where, inArray(attachments.kind, [...ATTACHMENT_KINDS])))
    .groupBy(attachments.kind);
  const counts: Record<AttachmentKind, number> = { photo: 0, "scope-picture": 0, "scope-data": 0 };
  for (const row of rows) counts[row.kind] = row.total;
  return counts;
}
