"use client";

import { usePathname } from "next/navigation";
import { LinkTabs } from "@/components/ui/LinkTabs";

const TABS = [
  { href: "/settings", label: "Profile" },
  { href: "/settings/password", label: "Password" },
  { href: "/settings/instruments", label: "Instruments" },
  { href: "/settings/digest", label: "Weekly e-mail" },
] as const;

export function SettingsTabs() {
  const path = usePathname();
  return <LinkTabs label="Your settings" tabs={TABS.map((tab) => ({ ...tab, isCurrent: tab.href === path }))} />;
}
