import { and, eq, inArray, isNull } from "drizzle-orm";
import { database } from "@/db/client";
import { evidenceColumns } from "@/db/queries/attachments";
import { attachments } from "@/db/schema/evidence";
import { users } from "@/db/schema/people";
import type { ProjectScope } from "@/lib/access/scope";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import { evidenceView } from "./evidence-view";

/** Evidence by id, without what was removed. */
export async function loadEvidence(scope: ProjectScope, ids: string[]): Promise<Map<string, EvidenceView>> {
  if (ids.length === 0) return new Map();
  const rows = await database()
    .select(evidenceColumns)
    .from(attachments)
    .leftJoin(users, eq(users.id, attachments.uploadedBy))
    .where(
      and(eq(attachments.projectId, scope.projectId), inArray(attachments.id, ids), isNull(attachments.archivedAt)),
    );
  return new Map(rows.map((row) => [row.id, evidenceView(row)]));
}
