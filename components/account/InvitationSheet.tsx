import type { ReactNode } from "react";
import { ROLE_WORDS, type RoleName } from "@/components/people/role-words";
import { DateTime } from "@/components/ui/DateTime";
import { AccountSheet } from "./AccountSheet";

type Details = {
  email: string;
  role: RoleName;
  projectName: string;
  inviter: string | null;
  expiresAt: Date;
  zone: string;
};

/** What the invitation is to, above what can be done with it. */
export function InvitationSheet({ details, children }: { details: Details; children: ReactNode }) {
  const { inviter, projectName, role, email, expiresAt, zone } = details;
  return (
    <AccountSheet
      title={`Come in to ${projectName}`}
      lede={`${inviter ?? "A maintainer"} invites ${email} as ${role}.`}
      foot={
        <p>
          The invitation works once, until <DateTime at={expiresAt} zone={zone} />.
        </p>
      }
    >
      <p className="mb-4 text-[0.9375rem]">
        <strong>{ROLE_WORDS[role].name}.</strong> {ROLE_WORDS[role].may}
      </p>
      {children}
    </AccountSheet>
  );
}
