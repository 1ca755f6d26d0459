"use client";

import { usePathname } from "next/navigation";
import { LinkTabs } from "@/components/ui/LinkTabs";

const TABS = [
  { path: "", label: "Tonight" },
  { path: "/boards", label: "Boards" },
  { path: "/checks", label: "Checks" },
  { path: "/sessions", label: "Sessions" },
] as const;

export function OrderTabs({ project }: { project: string }) {
  const home = `/projects/${project}/order`;
  const at = usePathname().slice(home.length);
  return (
    <LinkTabs
      label="Order"
      tabs={TABS.map(({ path, label }) => ({ href: home + path, label, isCurrent: at === path }))}
    />
  );
}
