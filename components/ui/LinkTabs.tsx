import clsx from "clsx";
import Link from "next/link";
import { Count } from "./Count";
import { tabLook, tabRow } from "./tab-style";

export type LinkTab = { href: string; label: string; isCurrent: boolean; count?: number };

export function LinkTabs({ label, tabs, className }: { label: string; tabs: readonly LinkTab[]; className?: string }) {
  return (
    <nav aria-label={label} className={clsx(tabRow, className)}>
      {tabs.map((tab) => (
        <Link
          key={tab.href}
          href={tab.href}
          aria-current={tab.isCurrent ? "page" : undefined}
          className={tabLook(tab.isCurrent)}
        >
          {tab.label}
          {tab.count !== undefined && <Count value={tab.count} />}
        </Link>
      ))}
    </nav>
  );
}
