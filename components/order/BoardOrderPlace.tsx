import Link from "next/link";
import { Page } from "@/components/shell/Page";
import { EmptyState } from "@/components/ui/EmptyState";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import type { BoardOrderView } from "@/lib/order/board-order-view";
import { BoardDrawing } from "./BoardDrawing";
import type { BoardOrderActs } from "./order-acts";
import { RiskPanel } from "./RiskPanel";
import { SaidPanel } from "./SaidPanel";
import { SayOrderDialog } from "./SayOrderDialog";
import { StepTable } from "./StepTable";

type Props = { order: BoardOrderView; project: string; zone: string; acts: BoardOrderActs | null };

/** Which board is proven next and why: nothing unproven may drive or supply something proven. */
export function BoardOrderPlace({ order, project, zone, acts }: Props) {
  const { boards, steps, proven, risks, remarks, said, drawing, circle } = order;
  const names = new Map(boards.map(({ code, name }) => [code, name]));
  if (boards.length === 0) {
    return (
      <Page title="Order of the boards">
        <EmptyState
          title="No boards yet"
          action={
            <Link className="link" href={`/projects/${project}/boards`}>
              To the boards
            </Link>
          }
        >
          The order comes from what the pins of the boards do to each other.
        </EmptyState>
      </Page>
    );
  }
  return (
    <Page
      title="Order of the boards"
      lede={ledeOf(order)}
      actions={acts && <SayOrderDialog boards={boards} project={project} say={acts.say} />}
    >
      <div className="flex min-w-0 flex-col gap-5">
        {circle && (
          <Notice kind="error" title="What is said goes round in a circle">
            {circle} Withdraw one of it.
          </Notice>
        )}
        {remarks.map((remark) => (
          <Notice key={remark} kind="info">
            {remark}
          </Notice>
        ))}
        {steps.length > 0 && (
          <Panel title="To be proven" note={`${steps.length}`} padding="none">
            <StepTable steps={steps} names={names} project={project} />
          </Panel>
        )}
        <div className="grid grid-cols-1 items-start gap-5 xl:grid-cols-[minmax(0,1fr)_24rem]">
          <Panel title="What supplies and drives what">
            <BoardDrawing drawing={drawing} project={project} />
          </Panel>
          <div className="flex min-w-0 flex-col gap-5">
            <SaidPanel said={said} project={project} zone={zone} withdraw={acts?.withdraw ?? null} />
            <RiskPanel risks={risks} />
          </div>
        </div>
        {proven.length > 0 && (
          <p className="text-sm text-ink-soft">
            Proven, which is to say that all their units in the machine hold up to power-on: {proven.join(", ")}.
          </p>
        )}
      </div>
    </Page>
  );
}

function ledeOf({ steps, proven }: BoardOrderView): string {
  const [next] = steps;
  if (!next) return "Every board is proven up to power-on.";
  const all = proven.length + steps.length;
  const done = proven.length === 0 ? "No board is proven yet." : `${proven.length} of ${all} boards are proven.`;
  return `Next is ${next.board}. ${done} Nothing unproven should drive or supply something proven.`;
}
