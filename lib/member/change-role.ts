import { and, eq } from "drizzle-orm";
import { memberships } from "@/db/schema/projects";
import type { ProjectScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { keepOneMaintainer, lockMember } from "./last-maintainer";
import type { ChangeRoleInput } from "./schema";

export async function changeRole(scope: ProjectScope, input: ChangeRoleInput): Promise<Answer<null>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "change-role" }, async (tx) => {
    const member = await lockMember(tx, projectId, input.member);
    if (member.role === input.role) return null;
    await keepOneMaintainer(
      tx,
      projectId,
      member.role,
      "This is the last maintainer. Make somebody else maintainer first; nothing was changed.",
    );
    await tx
      .update(memberships)
      .set({ role: input.role })
      .where(and(eq(memberships.projectId, projectId), eq(memberships.userId, input.member)));
    const payload = { name: member.name ?? member.email, from: member.role, to: input.role };
    await recordEvent(
      tx,
      { projectId, actorId: viewer.userId, subjectId: input.member },
      "member.role-changed",
      payload,
    );
    return null;
  });
}
