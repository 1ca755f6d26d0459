"use client";

import { useAct } from "@/components/board/use-act";
import type { OfferAct } from "@/components/offer/offer-acts";
import { Badge } from "@/components/ui/Badge";
import { Checkbox } from "@/components/ui/Checkbox";
import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import type { BoardPlanView } from "@/lib/board-plan/load-board-plan";
import type { Packing } from "@/lib/calc/packing";
import type { BoardPlanActs } from "./parts-acts";
import { SpareList } from "./SpareList";
import { TieOffer } from "./TieOffer";

type Props = {
  project: string;
  view: BoardPlanView;
  packing: Packing;
  isDraft: boolean;
  can: { edit: boolean; editProcedure: boolean };
  tie: BoardPlanActs["tie"];
  offer: OfferAct;
};

/** Where gates are left over, what their inputs want, and whether somebody saw to it. */
export function SparesPanel({ project, view, packing, isDraft, can, tie, offer }: Props) {
  const { act, isPending } = useAct();
  const { spares } = packing;
  const technology = view.families.find(({ name }) => name === view.plan.family)?.technology ?? "CMOS";
  if (spares.length === 0) {
    return (
      <Panel title="Spare gates">
        <p className="text-[0.9375rem] text-ink-soft">Every gate of every package is used: there is nothing to tie.</p>
      </Panel>
    );
  }
  const say = (tied: boolean) =>
    act(
      () => tie({ project, writeId: crypto.randomUUID(), board: view.board.code, version: view.version, tied }),
      () =>
        tied
          ? "Kept: the ties are on the drawing. The rule check no longer asks for them."
          : "Kept: the ties are still to be drawn.",
    );
  return (
    <Panel
      title="Spare gates"
      note={
        <>
          {counted(spares.length, "gate")} that a rework can use{" "}
          {isDraft && <Badge tone="copper">as typed, not saved</Badge>}
        </>
      }
    >
      <div className="grid items-start gap-x-8 gap-y-5 lg:grid-cols-[minmax(0,1fr)_minmax(0,22rem)]">
        <SpareList spares={spares} />
        <div className="flex flex-col gap-4">
          <Checkbox
            label="The ties are on the drawing"
            value={view.sparesTied}
            isDisabled={!can.edit || isDraft || isPending}
            onChange={(tied) => void say(tied)}
            description={
              isDraft ? "Save the plan first: other gates may be spare." : tieText(view.sparesTied, technology)
            }
          />
          {!isDraft && (
            <TieOffer project={project} view={view} spares={spares} canEdit={can.editProcedure} act={offer} />
          )}
        </div>
      </div>
    </Panel>
  );
}

function tieText(isTied: boolean, technology: "CMOS" | "bipolar"): string {
  if (isTied) return "Said of these gates. When a change leaves others over, the question is open again.";
  return technology === "CMOS"
    ? "Until then the rule check asks for them: an open CMOS input drifts, takes current and may oscillate."
    : "An open bipolar input reads high but catches noise.";
}
