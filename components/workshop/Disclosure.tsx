import type { ReactNode } from "react";
import { Icon } from "@/components/ui/Icon";

type Props = { summary: ReactNode; isOpen?: boolean; children: ReactNode };

/** Something most visits do not need, behind its name. */
export function Disclosure({ summary, isOpen, children }: Props) {
  return (
    <details className="group" open={isOpen}>
      <summary className="inline-flex min-h-10 list-none items-center gap-2 rounded text-[0.9375rem] text-ink-soft hover:text-ink [&::-webkit-details-marker]:hidden">
        <Icon name="chevron-right" size={14} className="transition-transform group-open:rotate-90" />
        {summary}
      </summary>
      <div className="pt-3">{children}</div>
    </details>
  );
}
