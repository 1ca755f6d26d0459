"use client";

import { useRouter } from "next/navigation";
import { FormPasswordField, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { signUpByInvitationInput, type SignUpByInvitationTyped } from "@/lib/invitation/schema";
import { AccountOf } from "./AccountOf";
import { browserZone } from "./browser-zone";
import { PASSWORD_ADVICE } from "./password-advice";
import { useWriteId } from "./use-write-id";

type Props = {
  token: string;
  email: string;
  signUp: (input: SignUpByInvitationTyped) => Promise<Reply<{ slug: string }>>;
};

export function InvitedSignUp({ token, email, signUp }: Props) {
  const router = useRouter();
  const { writeId } = useWriteId();
  return (
    <Form
      label="Sign up and join"
      schema={signUpByInvitationInput}
      defaults={{ writeId, token, name: "", password: "", timeZone: "UTC" }}
      action={(values) => signUp({ ...values, timeZone: browserZone() })}
      onDone={({ slug }) => router.replace(`/projects/${slug}/rack`)}
      submitLabel="Sign up and join"
    >
      <AccountOf email={email} />
      <FormTextField name="name" label="Name" autoComplete="name" description="As others on the project will see it." />
      <FormPasswordField name="password" label="Password" autoComplete="new-password" description={PASSWORD_ADVICE} />
    </Form>
  );
}
