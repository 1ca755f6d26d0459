import { Badge } from "@/components/ui/Badge";
import { Icon } from "@/components/ui/Icon";
import { checkKind } from "@/lib/check-kinds/list";
import type { CheckRow } from "@/lib/procedure/check-row";

/** What one check asks for, in a line: title, expectation, hold point, caution. */
export function CheckFacts({ check, number }: { check: CheckRow; number: number }) {
  return (
    <span className="grid min-w-0 grid-cols-[1.5rem_minmax(0,1fr)] items-baseline gap-x-2">
      <span className="mono text-right text-xs text-ink-soft">{number}</span>
      <span className="flex min-w-0 flex-wrap items-baseline gap-x-3 gap-y-0.5">
        <span className="font-semibold leading-snug">{check.title}</span>
        <span className="mono text-xs text-ink-soft">{checkKind(check.kind).expectation(check.spec)}</span>
        {check.holdPoint && <Badge tone="copper">hold point</Badge>}
        {check.caution && (
          <span className="inline-flex items-center gap-1 text-xs text-doubtful">
            <Icon name="caution" size={12} className="self-center" /> caution
          </span>
        )}
      </span>
    </span>
  );
}
