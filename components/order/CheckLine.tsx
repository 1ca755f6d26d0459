import Link from "next/link";
import type { ReactNode } from "react";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { stageName } from "@/lib/procedure/stages";
import type { CheckName } from "@/lib/order/tonight-view";
import { benchHref } from "./order-addresses";

type Props = {
  check: CheckName;
  project: string;
  reason: string;
  /** In front, e.g. its number or when it begins. */
  before: ReactNode;
  after?: ReactNode;
};

/** One check to be done, as a whole line that leads to the bench. */
export function CheckLine({ check, project, reason, before, after }: Props) {
  const { checkId, serial, title, stage, state } = check;
  return (
    <Link
      href={benchHref(project, serial, checkId)}
      prefetch={false}
      className="group grid min-h-14 grid-cols-[2.25rem_1.75rem_minmax(0,1fr)] sm:grid-cols-[2.75rem_1.75rem_minmax(0,1fr)_auto] items-baseline gap-x-2.5 px-4 py-2.5 no-underline hover:bg-raised sm:px-5"
    >
      <span className="mono text-sm text-ink-soft">{before}</span>
      <StateGlyph state={state} size={16} label={state} className="translate-y-0.5" />
      <span className="flex min-w-0 flex-col gap-0.5">
        <span className="leading-snug font-semibold group-hover:text-copper">{title}</span>
        <span className="text-sm leading-snug text-ink-soft">
          <span className="mono text-xs text-ink">{serial}</span> · {stageName(stage)}. {reason}
        </span>
      </span>
      <span className="mono text-sm whitespace-nowrap text-ink-soft max-sm:col-start-3">{after}</span>
    </Link>
  );
}
