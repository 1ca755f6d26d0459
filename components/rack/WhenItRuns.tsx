import { Panel } from "@/components/ui/Panel";
import type { Outlook } from "@/lib/forecast/say-forecast";

/** The dates by which half and 85 of 100 re-drawn histories are through. */
export function WhenItRuns({ outlook }: { outlook: Outlook | null }) {
  if (!outlook) return null;
  return (
    <Panel title="When will it run?">
      {outlook.span !== "" && <p className="font-head text-2xl leading-tight font-semibold">{outlook.span}</p>}
      <p className={outlook.span === "" ? "text-[0.9375rem] text-ink-soft" : "mt-1.5 text-[0.9375rem] text-ink-soft"}>
        {outlook.line}
      </p>
      {outlook.basis !== "" && <p className="mt-1 text-sm text-ink-faint">{outlook.basis}</p>}
    </Panel>
  );
}
