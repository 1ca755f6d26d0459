"use client";

import { useRouter } from "next/navigation";
import { useWriteId } from "@/components/account/use-write-id";
import { Button } from "@/components/ui/Button";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { DateTime } from "@/components/ui/DateTime";
import { reach, type Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { toast } from "@/components/ui/toast-store";
import { ROLE_WORDS, type RoleName } from "./role-words";

export type InvitationLine = {
  id: string;
  email: string;
  role: RoleName;
  expiresAt: Date;
  isExpired: boolean;
  inviter: string | null;
};
type Change = (input: { project: string; writeId: string; invitation: string }) => Promise<Reply<{ email: string }>>;
type Acts = { project: string; zone: string; resend: Change; withdraw: Change };

export function OpenInvitations({ invitations, ...acts }: Acts & { invitations: readonly InvitationLine[] }) {
  if (invitations.length === 0) {
    return (
      <p className="text-[0.9375rem] text-ink-soft">
        Nobody is invited at present. An invitation stands here until it is accepted or withdrawn.
      </p>
    );
  }
  return (
    <ul aria-label="Open invitations" className="px-4 pb-3 sm:px-5">
      {invitations.map((invitation) => (
        <li
          key={invitation.id}
          className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 border-t border-rule py-2.5"
        >
          <Line invitation={invitation} {...acts} />
        </li>
      ))}
    </ul>
  );
}

function Line({ invitation, project, zone, resend, withdraw }: Acts & { invitation: InvitationLine }) {
  const router = useRouter();
  const again = useWriteId();
  const { writeId } = useWriteId();
  const { email, role, isExpired, expiresAt, inviter } = invitation;
  const { submit, isPending } = useSubmit(resend, {
    onDone: () => {
      again.renew();
      toast({ text: `The invitation to ${email} was sent again. It works for another two weeks.` });
      router.refresh();
    },
  });

  async function sendAgain() {
    const reply = await submit({ project, writeId: again.writeId, invitation: invitation.id });
    if (!reply.ok) toast({ kind: "error", text: reply.error.message });
  }

  async function takeBack(): Promise<string | void> {
    const reply = await reach(() => withdraw({ project, writeId, invitation: invitation.id }));
    if (!reply.ok) return reply.error.message;
    toast({ text: `The invitation to ${email} is withdrawn.` });
    router.refresh();
  }

  return (
    <>
      <div className="min-w-0">
        <p className="break-all font-semibold">{email}</p>
        <p className="text-sm text-ink-soft">
          {ROLE_WORDS[role].name}
          {inviter && `, invited by ${inviter}`}.{" "}
          <span className={isExpired ? "font-semibold text-failed" : ""}>
            {isExpired ? "Expired" : "Works until"} <DateTime at={expiresAt} zone={zone} form="day" />
          </span>
        </p>
      </div>
      <div className="flex gap-2">
        <Button size="sm" isPending={isPending} onPress={() => void sendAgain()} aria-label={`Send again to ${email}`}>
          Send again
        </Button>
        <ConfirmDialog
          title={`Withdraw the invitation to ${email}?`}
          trigger={
            <Button size="sm" kind="quiet" aria-label={`Withdraw the invitation to ${email}`}>
              Withdraw
            </Button>
          }
          consequences={[
            "The link in the mail stops working and says that the invitation was withdrawn.",
            "You can invite the address again at any time.",
          ]}
          confirmLabel="Withdraw the invitation"
          onConfirm={takeBack}
        />
      </div>
    </>
  );
}
