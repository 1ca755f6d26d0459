import Link from "next/link";
import type { ReactNode } from "react";
import { WhenItRuns } from "@/components/rack/WhenItRuns";
import { Page } from "@/components/shell/Page";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import type { PaceLine } from "@/lib/bench-session/sessions-view";
import { formatDuration } from "@/lib/calc/units";
import type { TonightView } from "@/lib/order/tonight-view";
import { CheckLine } from "./CheckLine";
import { EveningForm } from "./EveningForm";
import { PaceTable } from "./PaceTable";
import { PlanLists } from "./PlanLists";

type Props = { tonight: TonightView; paces: readonly PaceLine[]; project: string; control: ReactNode };

/** What to do next on the bench, ranked by what it lets go, and a plan for the time there is. */
export function TonightPlace({ tonight, paces, project, control }: Props) {
  const { time, timeError, builders, plan, now, moreNow, critical, circle, outlook } = tonight;
  return (
    <Page
      title="Order"
      lede={ledeOf(tonight)}
      aside={
        <>
          {control}
          <WhenItRuns outlook={outlook} />
          {critical && critical.steps.length > 1 && (
            <Panel title="The longest chain">
              <p className="text-[0.9375rem] text-ink-soft">{critical.sentence}</p>
            </Panel>
          )}
          <PaceTable lines={paces} project={project} />
        </>
      }
    >
      {circle && (
        <Notice kind="error" title="Checks wait for each other in a circle">
          {circle} Take one of these prerequisites away under{" "}
          <Link className="link" href={`/projects/${project}/order/checks`}>
            Checks
          </Link>
          .
        </Notice>
      )}
      <EveningForm {...{ project, time, builders }} error={timeError} />
      {plan && tonight.open > 0 && <PlanLists plan={plan} project={project} />}
      {now.length > 0 && (
        <Panel title="Next on the bench" note="first what lets most go" padding="none">
          <ol>
            {now.map((line, index) => (
              <li key={line.checkId} className="border-t border-rule">
                <CheckLine
                  check={line}
                  project={project}
                  reason={line.reason}
                  before={index + 1}
                  after={line.expectedS === null ? "" : `≈ ${formatDuration(line.expectedS)}`}
                />
              </li>
            ))}
          </ol>
          {moreNow > 0 && (
            <p className="border-t border-rule px-4 py-3 text-sm text-ink-soft sm:px-5">
              {moreNow} more can be done now.
            </p>
          )}
        </Panel>
      )}
    </Page>
  );
}

function ledeOf({ open, total, now, moreNow }: TonightView): string {
  if (total === 0) return "Steps appear here when a unit has its traveler.";
  if (open === 0) return "Every check holds. Nothing is left to put in order.";
  const free = now.length + moreNow;
  return `${open} of ${total} checks do not hold yet; ${free} of them can be done now, the others wait.`;
}
