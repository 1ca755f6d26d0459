import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { endMembership } from "./end-membership";
import { keepOneMaintainer, lockMember } from "./last-maintainer";
import type { RemoveMemberInput } from "./schema";

export async function removeMember(scope: ProjectScope, input: RemoveMemberInput): Promise<Answer<{ name: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "remove-member" }, async (tx) => {
    const member = await lockMember(tx, projectId, input.member);
    await keepOneMaintainer(
      tx,
      projectId,
      member.role,
      "The last maintainer cannot be removed. Make somebody else maintainer first.",
    );
    const name = member.name ?? member.email;
    await endMembership(tx, { projectId, userId: input.member, actorId: viewer.userId, name });
    return { name };
  });
}
