import { eq } from "drizzle-orm";
import { lockSignal } from "@/db/queries/signals";
import { signals } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { rejectStale } from "./save-signal";
import type { RemoveSignalInput } from "./schema";

/** Takes away what was said of a signal; its pins keep carrying it, as a data signal without other names. */
export async function removeSignal(scope: ProjectScope, input: RemoveSignalInput): Promise<Answer<{ name: string }>> {
  const { projectId, viewer } = scope;
  const { name } = input;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "remove-signal" }, async (tx) => {
    const current = await lockSignal(tx, scope, name);
    if (!current) return reject("not-found", `Nothing is said of ${name} in this project.`);
    if (current.version !== input.version) rejectStale(name, current);
    await tx.delete(signals).where(eq(signals.id, current.id));
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: current.id }, "signal.removed", { name });
    await refreshFindings(tx, scope);
    return { name };
  });
}
