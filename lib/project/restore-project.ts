import { and, eq, isNotNull } from "drizzle-orm";
import { projects } from "@/db/schema/projects";
import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { ChangeProjectInput } from "./schema";

export async function restoreProject(
  scope: ProjectScope,
  input: ChangeProjectInput,
): Promise<Answer<{ slug: string }>> {
  const userId = scope.viewer.userId;
  return change({ writeId: input.writeId, userId, action: "restore-project" }, async (tx) => {
    const [done] = await tx
      .update(projects)
      .set({ archivedAt: null })
      .where(and(eq(projects.id, scope.projectId), isNotNull(projects.archivedAt)))
      .returning({ name: projects.name });
    if (done)
      await recordEvent(tx, { projectId: scope.projectId, actorId: userId }, "project.restored", { name: done.name });
    return { slug: scope.slug };
  });
}
