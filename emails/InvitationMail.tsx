import { Sheet } from "./parts/Sheet";
import { Act, Line, PlainAddress, Title } from "./parts/Words";

export type InvitationProps = {
  projectName: string;
  projectSummary: string;
  invitedBy: string;
  role: "maintainer" | "builder" | "collaborator";
  link: string;
  validUntil: string;
};

export const invitationSubject = (projectName: string) => `Join ${projectName} on Boardwake`;

const WHAT_ROLES_DO: Record<InvitationProps["role"], string> = {
  maintainer: "As maintainer you own the design with the others: you write procedures, review failures and decide.",
  builder: "As builder you carry out checks at the bench and record what you measure.",
  collaborator:
    "As collaborator you follow the work and get a weekly e-mail of what passed, what failed and what is next.",
};

export function InvitationMail({ projectName, projectSummary, invitedBy, role, link, validUntil }: InvitationProps) {
  return (
    <Sheet
      preheader={`${invitedBy} asks you to join as ${role}.`}
      footer={`You get this because ${invitedBy} entered this address. If you do not know them, do nothing.`}
    >
      <Title>Join {projectName}</Title>
      <Line>
        {invitedBy} asks you to join <b>{projectName}</b> as {role}. {WHAT_ROLES_DO[role]}
      </Line>
      {projectSummary ? <Line soft>{projectSummary}</Line> : null}
      <Act href={link}>Look at the invitation</Act>
      <Line soft>The invitation is for this address only and works until {validUntil}.</Line>
      <PlainAddress href={link} />
    </Sheet>
  );
}
