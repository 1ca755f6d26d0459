"use client";

import { useRouter } from "next/navigation";
import { FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { forgotInput } from "@/lib/account/schema";

export function ForgotForm({ requestReset }: { requestReset: (input: { email: string }) => Promise<Reply<null>> }) {
  const router = useRouter();
  return (
    <Form
      label="Ask for a new password"
      schema={forgotInput}
      defaults={{ email: "" }}
      action={requestReset}
      onDone={() => router.push("/check-email?for=reset")}
      submitLabel="Send the link"
    >
      <FormTextField name="email" label="E-mail address" type="email" inputMode="email" autoComplete="username" />
    </Form>
  );
}
