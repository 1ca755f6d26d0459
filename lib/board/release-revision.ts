import { and, eq, isNull } from "drizzle-orm";
import { revisions } from "@/db/schema/boards";
import { findRevision } from "@/db/queries/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { ReleaseRevisionInput } from "./schema";

/** Released: sent to be made. From then on the design of this letter does not change any more. */
export async function releaseRevision(
  scope: ProjectScope,
  input: ReleaseRevisionInput,
): Promise<Answer<{ letter: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "release-revision" }, async (tx) => {
    const found = await findRevision(tx, scope, input.revisionId);
    if (!found) return reject("not-found", "There is no such revision in this project.");
    const { revision, board } = found;
    const done = await tx
      .update(revisions)
      .set({ releasedAt: new Date() })
      .where(and(eq(revisions.id, revision.id), isNull(revisions.releasedAt)))
      .returning({ id: revisions.id });
    const subject = { projectId, actorId: viewer.userId, subjectId: revision.id };
    if (done.length > 0)
      await recordEvent(tx, subject, "revision.released", { code: board.code, letter: revision.letter });
    return { letter: revision.letter };
  });
}
