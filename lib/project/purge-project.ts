import { eq } from "drizzle-orm";
import { projects } from "@/db/schema/projects";
import type { ProjectScope } from "@/lib/access/scope";
import { refuse, reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { liftHistoryGuard } from "@/lib/event/lift-history-guard";
import type { Call } from "@/lib/http/call";
import { log } from "@/lib/http/log";
import type { PurgeProjectInput } from "./schema";

/**
 * Removes the project with its whole history, for good. Only an archived one, and only with its name typed.
 * The files go when the sweep finds objects without a row.
 */
export async function purgeProject(scope: ProjectScope, input: PurgeProjectInput, call?: Call): Promise<Answer<null>> {
  if (!scope.archived) return refuse("conflict", "Archive the project first. Only an archived project can be purged.");
  if (input.confirmation !== scope.projectName) {
    const sentence = `Type the name of the project exactly: ${scope.projectName}`;
    return refuse("invalid", "The name does not match. Nothing was purged.", { fields: { confirmation: sentence } });
  }
  const userId = scope.viewer.userId;
  const answer = await change({ writeId: input.writeId, userId, action: "purge-project" }, async (tx) => {
    await liftHistoryGuard(tx);
    const gone = await tx.delete(projects).where(eq(projects.id, scope.projectId)).returning({ id: projects.id });
    if (gone.length === 0) reject("not-found", "The project is gone already.");
    return null;
  });
  // The project's events go with it; what remains is this line.
  if (answer.ok) log().warn({ requestId: call?.requestId, projectId: scope.projectId, userId }, "project purged");
  return answer;
}
