import { digestSubscriptions } from "@/db/schema/projects";
import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { nextDue } from "./next-due";
import type { UpdateSubscriptionInput } from "./subscription-schema";

/** Changes when one's own digest of the project comes. The next one is due at the new day and hour, never in the past. */
export async function updateSubscription(
  scope: ProjectScope,
  input: UpdateSubscriptionInput,
): Promise<Answer<{ nextDueAt: string }>> {
  const { userId } = scope.viewer;
  const { enabled, weekday, hour, zone, quietWeek } = input;
  return change({ writeId: input.writeId, userId, action: "update-subscription" }, async (tx) => {
    const nextDueAt = nextDue({ weekday, hour, zone }, new Date());
    const values = { enabled, weekday, hour, zone, quietWeek, nextDueAt };
    await tx
      .insert(digestSubscriptions)
      .values({ projectId: scope.projectId, userId, ...values })
      .onConflictDoUpdate({ target: [digestSubscriptions.projectId, digestSubscriptions.userId], set: values });
    return { nextDueAt: nextDueAt.toISOString() };
  });
}
