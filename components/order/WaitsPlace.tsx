import { Page } from "@/components/shell/Page";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import type { WaitsView } from "@/lib/order/waits-view";
import { AddWaitDialog } from "./AddWaitDialog";
import type { WaitActs } from "./order-acts";
import { WaitsDrawing } from "./WaitsDrawing";
import { WaitsTable } from "./WaitsTable";

type Props = { waits: WaitsView; project: string; acts: WaitActs | null };

/** What waits for what between the checks of all units, as a drawing and as a table. */
export function WaitsPlace({ waits: { waits, checks, holdPoints, drawing }, project, acts }: Props) {
  return (
    <Page
      title="Order of the checks"
      lede={`${count(waits.length, "prerequisite")} between checks. ${count(holdPoints, "hold point")} besides: what comes after one on its unit waits without being listed here.`}
      actions={acts && checks.length > 1 && <AddWaitDialog checks={checks} project={project} add={acts.add} />}
    >
      {waits.length === 0 ? (
        <EmptyState title="No check waits for another by name">
          Checks of one unit wait for its hold points. A prerequisite lets a check wait for one on another unit, such as
          a rail that must be right first. Procedures bring their own when a traveler is started.
        </EmptyState>
      ) : (
        <div className="flex flex-col gap-5">
          <Panel title="What lets what go">
            <WaitsDrawing drawing={drawing} project={project} />
          </Panel>
          <Panel title="Prerequisites" note={`${waits.length}`}>
            <WaitsTable waits={waits} project={project} acts={acts} />
          </Panel>
        </div>
      )}
    </Page>
  );
}

const count = (n: number, word: string) => `${n} ${word}${n === 1 ? "" : "s"}`;
