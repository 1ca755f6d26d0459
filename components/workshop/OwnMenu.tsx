"use client";

import { forgetDevice } from "@/components/bench/forget-device";
import { AccountMenu } from "@/components/shell/AccountMenu";

type Props = { name: string; email: string; signOut: (input: Record<string, never>) => Promise<unknown> };

/** What belongs to the person, not to a project. */
export function OwnMenu({ name, email, signOut }: Props) {
  return (
    <AccountMenu
      name={name}
      email={email}
      entries={[
        { id: "projects", label: "Projects", href: "/projects" },
        { id: "settings", label: "Your settings", href: "/settings" },
        { id: "instruments", label: "Your instruments", href: "/settings/instruments" },
        { id: "digest", label: "Your weekly e-mail", href: "/settings/digest" },
        "line",
        { id: "safety", label: "Safety notes", href: "/safety" },
        { id: "sign-out", label: "Sign out", onAction: () => void forgetDevice().then(() => signOut({})) },
      ]}
    />
  );
}
