import { and, eq, isNull } from "drizzle-orm";
import { projects } from "@/db/schema/projects";
import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { ChangeProjectInput } from "./schema";

/** Puts the project away: everybody can still look, nobody can change anything until it is restored. */
export async function archiveProject(
  scope: ProjectScope,
  input: ChangeProjectInput,
): Promise<Answer<{ slug: string }>> {
  const userId = scope.viewer.userId;
  return change({ writeId: input.writeId, userId, action: "archive-project" }, async (tx) => {
    const [done] = await tx
      .update(projects)
      .set({ archivedAt: new Date() })
      .where(and(eq(projects.id, scope.projectId), isNull(projects.archivedAt)))
      .returning({ name: projects.name });
    if (done)
      await recordEvent(tx, { projectId: scope.projectId, actorId: userId }, "project.archived", { name: done.name });
    return { slug: scope.slug };
  });
}
