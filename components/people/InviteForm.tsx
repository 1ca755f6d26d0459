"use client";

import { useRouter } from "next/navigation";
import { useWriteId } from "@/components/account/use-write-id";
import { FormSelect, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";
import { inviteInput, type InviteTyped } from "@/lib/invitation/schema";
import { ROLE_OPTIONS } from "./role-words";

type Props = { project: string; invite: (input: InviteTyped) => Promise<Reply<{ id: string }>> };

export function InviteForm({ project, invite }: Props) {
  const router = useRouter();
  const { writeId, renew } = useWriteId();
  const defaults: InviteTyped = { project, writeId, email: "", role: "collaborator" };
  return (
    <Form
      label="Invite a person"
      schema={inviteInput}
      defaults={defaults}
      action={(values) => invite({ ...values, project, writeId })}
      onDone={(_done, { email }) => {
        renew();
        toast({ text: `The invitation to ${email.trim()} is on its way. It works for two weeks.` });
        router.refresh();
      }}
      resetsWhenDone
      submitLabel="Send the invitation"
    >
      <FormTextField name="email" label="E-mail address" type="email" inputMode="email" autoComplete="off" />
      <FormSelect name="role" label="Role" options={ROLE_OPTIONS} />
    </Form>
  );
}
