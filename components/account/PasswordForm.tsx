"use client";

import { useRouter } from "next/navigation";
import { FormPasswordField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";
import { changePasswordInput, type ChangePasswordTyped } from "@/lib/account/schema";
import { PASSWORD_ADVICE } from "./password-advice";
import { useWriteId } from "./use-write-id";

type Props = {
  email: string;
  hasPassword: boolean;
  change: (input: ChangePasswordTyped) => Promise<Reply<{ ended: number }>>;
};

export function PasswordForm({ email, hasPassword, change }: Props) {
  const router = useRouter();
  const { writeId, renew } = useWriteId();
  return (
    <Form
      label="Change the password"
      schema={changePasswordInput}
      defaults={{ writeId, current: "", password: "" }}
      action={(values) => change({ ...values, writeId })}
      onDone={({ ended }) => {
        renew();
        toast({ text: `The new password holds. ${endedSentence(ended)}` });
        router.refresh();
      }}
      resetsWhenDone
      submitLabel="Change the password"
    >
      <input type="text" hidden readOnly autoComplete="username" value={email} />
      {hasPassword && <FormPasswordField name="current" label="Present password" autoComplete="current-password" />}
      <FormPasswordField
        name="password"
        label="New password"
        autoComplete="new-password"
        description={PASSWORD_ADVICE}
      />
    </Form>
  );
}

function endedSentence(ended: number): string {
  if (ended === 0) return "You were signed in nowhere else.";
  return ended === 1 ? "One other session has ended." : `${ended} other sessions have ended.`;
}
