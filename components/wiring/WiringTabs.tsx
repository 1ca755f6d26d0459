"use client";

import { usePathname } from "next/navigation";
import { LinkTabs } from "@/components/ui/LinkTabs";

const PLACES = [
  { path: "", label: "Pins" },
  { path: "/nets", label: "Nets" },
  { path: "/findings", label: "Findings" },
  { path: "/signals", label: "Signals" },
  { path: "/families", label: "Families" },
  { path: "/power", label: "Power" },
] as const;

/** The sub-places of the wiring, above their titles. Taking a file belongs to the pins. */
export function WiringTabs({ project }: { project: string }) {
  const pathname = usePathname();
  const base = `/projects/${project}/wiring`;
  const isAt = (path: string) => {
    if (path === "") return pathname === base || pathname.startsWith(`${base}/take`);
    return pathname.startsWith(base + path);
  };
  return (
    <LinkTabs
      label="Wiring"
      tabs={PLACES.map(({ path, label }) => ({
        href: base + path,
        label,
        isCurrent: isAt(path),
      }))}
    />
  );
}
