import type { Metadata } from "next";
import { InviteForm } from "@/components/people/InviteForm";
import { LeaveProject } from "@/components/people/LeaveProject";
import { MembersTable } from "@/components/people/MembersTable";
import { OpenInvitations } from "@/components/people/OpenInvitations";
import { RolesExplained } from "@/components/people/RolesExplained";
import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { Panel } from "@/components/ui/Panel";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadPeople } from "@/lib/member/load-people";
import { changeRole, invite, leaveProject, removeMember, resendInvitation, withdrawInvitation } from "./actions";

export const metadata: Metadata = { title: "People" };

export default definePage({
  permission: "project.see",
  path: ({ project }) => `/projects/${project}/people`,
  render: async (scope) => {
    const { members, invitations } = await loadPeople(scope);
    const manages = can(scope.role, "member.manage") && !scope.archived;
    const zone = scope.viewer.timeZone;
    const self = members.find((member) => member.isSelf);
    return (
      <Page
        title="People"
        lede={ledeFor(members.length, invitations.length)}
        actions={
          can(scope.role, "digest.preview") &&
          !scope.archived && <ButtonLink href={`/projects/${scope.slug}/digest`}>Weekly e-mail</ButtonLink>
        }
        aside={
          <>
            {manages && (
              <Panel title="Invite by e-mail">
                <InviteForm project={scope.slug} invite={invite} />
              </Panel>
            )}
            <Panel title="What each role may do">
              <RolesExplained />
            </Panel>
          </>
        }
      >
        <Panel title="Members" padding="none">
          <MembersTable
            project={scope.slug}
            projectName={scope.projectName}
            members={members}
            zone={zone}
            canManage={manages}
            changeRole={changeRole}
            removeMember={removeMember}
          />
        </Panel>
        {manages && (
          <Panel title="Open invitations" padding={invitations.length > 0 ? "none" : "md"}>
            <OpenInvitations
              project={scope.slug}
              invitations={invitations}
              zone={zone}
              resend={resendInvitation}
              withdraw={withdrawInvitation}
            />
          </Panel>
        )}
        {self && (
          <LeaveProject
            project={scope.slug}
            projectName={scope.projectName}
            isLast={self.isLast}
            leave={leaveProject}
          />
        )}
      </Page>
    );
  },
});

function ledeFor(members: number, invitations: number): string {
  const people = members === 1 ? "One person is" : `${members} people are`;
  if (invitations === 0) return `${people} on this project.`;
  return `${people} on this project, ${invitations === 1 ? "one invitation is" : `${invitations} invitations are`} open.`;
}
