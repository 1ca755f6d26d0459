import { eq } from "drizzle-orm";
import { lockOpenInvitation } from "@/db/queries/invitations";
import { invitations } from "@/db/schema/projects";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { limit } from "@/lib/http/rate-limit";
import { enqueue } from "@/lib/jobs/enqueue";
import { invitationExpiry } from "./invite-person";
import type { ChangeInvitationInput } from "./schema";

/** Mails the same link again and lets it work for another two weeks. */
export async function resendInvitation(
  scope: ProjectScope,
  input: ChangeInvitationInput,
): Promise<Answer<{ email: string }>> {
  const { projectId, viewer } = scope;
  const counted = await limit("invitations", viewer.userId);
  if (!counted.ok) return counted;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "resend-invitation" }, async (tx) => {
    const open = await lockOpenInvitation(tx, projectId, input.invitation);
    if (!open) return reject("not-found", "This invitation is not open any more. Reload the page.");
    await tx.update(invitations).set({ expiresAt: invitationExpiry() }).where(eq(invitations.id, open.id));
    await enqueue(tx, "send-mail", { kind: "invitation", id: open.id });
    return { email: open.email };
  });
}
