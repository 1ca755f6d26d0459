"use client";

import { usePathname } from "next/navigation";
import { LinkTabs } from "@/components/ui/LinkTabs";

const TABS = [
  { path: "", label: "To order" },
  { path: "/boards", label: "Boards" },
  { path: "/blocks", label: "Blocks" },
  { path: "/logic", label: "Logic" },
  { path: "/delay", label: "Delay" },
] as const;

export function PartsTabs({ project }: { project: string }) {
  const home = `/projects/${project}/parts`;
  const at = usePathname().slice(home.length);
  const isCurrent = (path: string) => (path === "" ? at === "" : at.startsWith(path));
  return (
    <LinkTabs
      label="Parts"
      tabs={TABS.map(({ path, label }) => ({ href: home + path, label, isCurrent: isCurrent(path) }))}
    />
  );
}
