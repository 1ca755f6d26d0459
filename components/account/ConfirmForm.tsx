"use client";

import Link from "next/link";
import { useRouter } from "next/navigation";
import { FormPasswordField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";
import { confirmInput } from "@/lib/account/schema";
import { AccountOf } from "./AccountOf";

type Props = {
  token: string;
  email: string;
  confirm: (input: { token: string; password: string }) => Promise<Reply<null>>;
};

export function ConfirmForm({ token, email, confirm }: Props) {
  const router = useRouter();
  return (
    <Form
      label="Confirm the address"
      schema={confirmInput}
      defaults={{ token, password: "" }}
      action={confirm}
      onDone={() => {
        toast({ text: "Your address is confirmed." });
        router.replace("/projects");
      }}
      submitLabel="Confirm and sign in"
    >
      <AccountOf email={email} />
      <FormPasswordField
        name="password"
        label="Password"
        autoComplete="current-password"
        description={
          <>
            The one you chose when you signed up. Forgotten it?{" "}
            <Link className="link" href="/forgot">
              Set a new one
            </Link>
            ; that confirms the address as well.
          </>
        }
      />
    </Form>
  );
}
