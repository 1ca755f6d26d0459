"use client";

import { useRouter } from "next/navigation";
import { FormPasswordField, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { signUpInput, type SignUpTyped } from "@/lib/account/schema";
import { browserZone } from "./browser-zone";
import { PASSWORD_ADVICE } from "./password-advice";
import { useWriteId } from "./use-write-id";

export function SignUpForm({ signUp }: { signUp: (input: SignUpTyped) => Promise<Reply<null>> }) {
  const router = useRouter();
  const { writeId } = useWriteId();
  return (
    <Form
      label="Sign up"
      schema={signUpInput}
      defaults={{ writeId, name: "", email: "", password: "", timeZone: "UTC" }}
      action={(values) => signUp({ ...values, timeZone: browserZone() })}
      onDone={() => router.push("/check-email?for=sign-up")}
      submitLabel="Sign up"
    >
      <FormTextField name="name" label="Name" autoComplete="name" description="As others on a project will see it." />
      <FormTextField name="email" label="E-mail address" type="email" inputMode="email" autoComplete="username" />
      <FormPasswordField name="password" label="Password" autoComplete="new-password" description={PASSWORD_ADVICE} />
    </Form>
  );
}
