import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { closeOpenSessions, endSession } from "./close-open-sessions";
import type { BenchSessionInput } from "./schema";

type Stopped = {
  seconds: number;
  /** It had ended before, at the last thing that was recorded. */
  endedBefore: boolean;
};

/** One gets up from the bench. */
export async function stopBenchSession(scope: ProjectScope, input: BenchSessionInput): Promise<Answer<Stopped>> {
  const { userId } = scope.viewer;
  return change({ writeId: input.writeId, userId, action: "stop-bench-session" }, async (tx) => {
    const now = new Date();
    const { running, closed } = await closeOpenSessions(tx, scope, now);
    if (running) {
      await endSession(tx, running.id, now);
      return { seconds: (now.getTime() - running.startedAt.getTime()) / 1000, endedBefore: false };
    }
    if (!closed) return reject("conflict", "No session of yours runs. Nothing was stopped.");
    return { seconds: (closed.endMs - closed.startedAt.getTime()) / 1000, endedBefore: true };
  });
}
