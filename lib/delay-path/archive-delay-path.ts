import { eq } from "drizzle-orm";
import { lockDelayPath } from "@/db/queries/delay-paths";
import { delayPaths } from "@/db/schema/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { ChangeDelayPathInput } from "./schema";

export const archiveDelayPath = (scope: ProjectScope, input: ChangeDelayPathInput) =>
  setArchived(scope, input, "archive-delay-path", new Date());

export const restoreDelayPath = (scope: ProjectScope, input: ChangeDelayPathInput) =>
  setArchived(scope, input, "restore-delay-path", null);

async function setArchived(
  scope: ProjectScope,
  input: ChangeDelayPathInput,
  action: "archive-delay-path" | "restore-delay-path",
  archivedAt: Date | null,
): Promise<Answer<{ name: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action }, async (tx) => {
    const path = await lockDelayPath(tx, scope, input.id);
    if (!path) return reject("not-found", "There is no such delay path in this project.");
    const { id, name } = path;
    if ((path.archivedAt === null) === (archivedAt === null)) return { name };
    await tx.update(delayPaths).set({ archivedAt }).where(eq(delayPaths.id, id));
    const subject = { projectId, actorId: viewer.userId, subjectId: id };
    await recordEvent(tx, subject, archivedAt ? "delay.archived" : "delay.restored", { name });
    return { name };
  });
}
