"use client";

import { AccountMenu } from "@/components/shell/AccountMenu";

/** What belongs to the person, not to a project. */
export function OwnMenu({ name, email, signOut }: { name: string; email: string; signOut: () => Promise<unknown> }) {
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
        { id: "sign-out", label: "Sign out", onAction: () => void signOut() },
      ]}
    />
  );
}
