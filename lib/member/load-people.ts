import { database } from "@/db/client";
import { listOpenInvitations } from "@/db/queries/invitations";
import { listMembers } from "@/db/queries/members";
import type { Role } from "@/db/schema/projects";
import { can } from "@/lib/access/permissions";
import type { ProjectScope } from "@/lib/access/scope";

export type MemberLine = {
  userId: string;
  name: string;
  email: string | null;
  role: Role;
  since: Date;
  digest: boolean;
  isSelf: boolean;
  isLast: boolean;
};
export type InvitationLine = {
  id: string;
  email: string;
  role: Role;
  expiresAt: Date;
  isExpired: boolean;
  inviter: string | null;
};
export type People = { members: MemberLine[]; invitations: InvitationLine[] };

/** Who is in the project. Addresses and open invitations are for maintainers, who need them, and nobody else. */
export async function loadPeople(scope: ProjectScope): Promise<People> {
  const manages = can(scope.role, "member.manage");
  const [rows, open] = await Promise.all([
    listMembers(database(), scope.projectId),
    manages ? listOpenInvitations(database(), scope.projectId) : [],
  ]);
  const maintainers = rows.filter((row) => row.role === "maintainer").length;
  const now = new Date();
  return {
    members: rows.map((row) => {
      const isSelf = row.userId === scope.viewer.userId;
      return {
        userId: row.userId,
        name: row.name ?? row.email,
        email: manages || isSelf ? row.email : null,
        role: row.role,
        since: row.since,
        digest: row.digest ?? false,
        isSelf,
        isLast: row.role === "maintainer" && maintainers === 1,
      };
    }),
    invitations: open.map(({ id, email, role, expiresAt, inviter }) => ({
      id,
      email,
      role,
      expiresAt,
      isExpired: expiresAt <= now,
      inviter,
    })),
  };
}
