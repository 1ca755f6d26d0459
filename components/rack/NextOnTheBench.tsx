import Link from "next/link";
import { Panel } from "@/components/ui/Panel";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { stageName } from "@/lib/procedure/stages";
import type { RackStep } from "@/lib/rack/rack-view";
import { benchAddress } from "./rack-addresses";

/** What to do next, the step that lets go the most first. */
export function NextOnTheBench({
  steps,
  total,
  project,
}: {
  steps: readonly RackStep[];
  total: number;
  project: string;
}) {
  return (
    <Panel
      title="Next on the bench"
      actions={
        total > 0 && (
          <Link className="link text-sm" href={`/projects/${project}/order`}>
            Plan the evening
          </Link>
        )
      }
    >
      {steps.length === 0 ? (
        <p className="text-[0.9375rem] text-ink-soft">
          {total === 0 ? "Steps appear here when a unit has its traveler." : "Nothing is open. Every check holds."}
        </p>
      ) : (
        <ol className="-mx-2 flex flex-col">
          {steps.map((step) => (
            <li key={step.checkId}>
              <Link
                href={benchAddress(project, step.serial, step.checkId)}
                className="group grid grid-cols-[1.75rem_minmax(0,1fr)] gap-x-2.5 rounded-md px-2 py-2 no-underline hover:bg-raised"
              >
                <StateGlyph state={step.state} size={16} label={step.state} className="mt-1" />
                <span className="flex min-w-0 flex-col gap-0.5">
                  <span className="font-semibold leading-snug group-hover:text-copper">{step.title}</span>
                  <span className="text-sm leading-snug text-ink-soft">
                    <span className="mono text-xs">{step.serial}</span> · {stageName(step.stage)}. {step.reason}
                  </span>
                </span>
              </Link>
            </li>
          ))}
        </ol>
      )}
    </Panel>
  );
}
