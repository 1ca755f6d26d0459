import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { endMembership } from "./end-membership";
import { keepOneMaintainer, lockMember } from "./last-maintainer";
import type { LeaveProjectInput } from "./schema";

export async function leaveProject(scope: ProjectScope, input: LeaveProjectInput): Promise<Answer<null>> {
  const { projectId, viewer } = scope;
  const { userId } = viewer;
  return change({ writeId: input.writeId, userId, action: "leave-project" }, async (tx) => {
    const member = await lockMember(tx, projectId, userId);
    await keepOneMaintainer(
      tx,
      projectId,
      member.role,
      "You are the last maintainer and cannot leave. Make somebody else maintainer first, or archive the project.",
    );
    await endMembership(tx, { projectId, userId, actorId: userId, name: member.name ?? member.email });
    return null;
  });
}
