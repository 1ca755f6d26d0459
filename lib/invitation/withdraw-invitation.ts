import { eq } from "drizzle-orm";
import { lockOpenInvitation } from "@/db/queries/invitations";
import { invitations } from "@/db/schema/projects";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { ChangeInvitationInput } from "./schema";

/** The link that was mailed stops working; the row stays, so that the link can say why. */
export async function withdrawInvitation(
  scope: ProjectScope,
  input: ChangeInvitationInput,
): Promise<Answer<{ email: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "withdraw-invitation" }, async (tx) => {
    const open = await lockOpenInvitation(tx, projectId, input.invitation);
    if (!open) return reject("not-found", "This invitation is not open any more. Reload the page.");
    await tx.update(invitations).set({ withdrawnAt: new Date() }).where(eq(invitations.id, open.id));
    await recordEvent(tx, { projectId, actorId: viewer.userId, subjectId: open.id }, "invitation.withdrawn", {
      role: open.role,
    });
    return { email: open.email };
  });
}
