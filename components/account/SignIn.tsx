"use client";

import Link from "next/link";
import { useRouter } from "next/navigation";
import { FormPasswordField, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { Tabs } from "@/components/ui/Tabs";
import { linkInput, signInInput } from "@/lib/account/schema";

type Props = {
  /** Where to go on to; checked by the server. */
  next: string;
  signIn: (input: { email: string; password: string; next: string }) => Promise<Reply<{ next: string }>>;
  sendLink: (input: { email: string; next: string }) => Promise<Reply<null>>;
};

export function SignIn(props: Props) {
  return (
    <Tabs
      label="How to sign in"
      tabs={[
        { id: "password", label: "With a password", content: <PasswordForm {...props} /> },
        { id: "link", label: "With a link by e-mail", content: <LinkForm {...props} /> },
      ]}
    />
  );
}

function PasswordForm({ next, signIn }: Props) {
  const router = useRouter();
  return (
    <Form
      label="Sign in with a password"
      schema={signInInput}
      defaults={{ email: "", password: "", next }}
      action={(values) => signIn({ ...values, next })}
      onDone={(done) => router.replace(done.next)}
      submitLabel="Sign in"
    >
      <FormTextField name="email" label="E-mail address" type="email" autoComplete="username" inputMode="email" />
      <FormPasswordField
        name="password"
        label="Password"
        autoComplete="current-password"
        description={
          <Link className="link" href="/forgot">
            Set a new password
          </Link>
        }
      />
    </Form>
  );
}

function LinkForm({ next, sendLink }: Props) {
  const router = useRouter();
  return (
    <Form
      label="Sign in with a link by e-mail"
      schema={linkInput}
      defaults={{ email: "", next }}
      action={(values) => sendLink({ ...values, next })}
      onDone={() => router.push("/check-email?for=link")}
      submitLabel="Send the link"
    >
      <FormTextField
        name="email"
        label="E-mail address"
        type="email"
        autoComplete="username"
        inputMode="email"
        description="We send you a link that signs you in once, within 20 minutes."
      />
    </Form>
  );
}
