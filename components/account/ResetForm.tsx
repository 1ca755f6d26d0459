"use client";

import { useRouter } from "next/navigation";
import { FormPasswordField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";
import { resetInput, type ResetTyped } from "@/lib/account/schema";
import { AccountOf } from "./AccountOf";
import { PASSWORD_ADVICE } from "./password-advice";
import { useWriteId } from "./use-write-id";

type Props = { token: string; email: string; reset: (input: ResetTyped) => Promise<Reply<null>> };

export function ResetForm({ token, email, reset }: Props) {
  const router = useRouter();
  const { writeId } = useWriteId();
  return (
    <Form
      label="Set a new password"
      schema={resetInput}
      defaults={{ writeId, token, password: "" }}
      action={reset}
      onDone={() => {
        toast({ text: "The new password holds. You are signed in here and signed out everywhere else." });
        router.replace("/projects");
      }}
      submitLabel="Set the password and sign in"
    >
      <AccountOf email={email} />
      <FormPasswordField
        name="password"
        label="New password"
        autoComplete="new-password"
        description={PASSWORD_ADVICE}
      />
    </Form>
  );
}
