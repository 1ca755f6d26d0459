import { benchSessions } from "@/db/schema/order";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { closeOpenSessions } from "./close-open-sessions";
import type { BenchSessionInput } from "./schema";

/** One sits down at the bench. A session that ended by itself is closed first; one that runs goes on. */
export async function startBenchSession(
  scope: ProjectScope,
  input: BenchSessionInput,
): Promise<Answer<{ startedAt: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "start-bench-session" }, async (tx) => {
    const now = new Date();
    const { running } = await closeOpenSessions(tx, scope, now);
    if (running) reject("conflict", "A session of yours runs already. Go on with it, or stop it first.");
    await tx.insert(benchSessions).values({ projectId, userId: viewer.userId, startedAt: now });
    return { startedAt: now.toISOString() };
  });
}
