"use client";

import { useState } from "react";
import { useAct } from "@/components/board/use-act";
import type { OfferAct } from "@/components/offer/offer-acts";
import { Page } from "@/components/shell/Page";
import { Badge } from "@/components/ui/Badge";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import type { BoardPlanView } from "@/lib/board-plan/load-board-plan";
import { BoardPlanFacts } from "./BoardPlanFacts";
import { BoardPlanForm } from "./BoardPlanForm";
import { BomPanel } from "./BomPanel";
import { OutdatedNotice } from "./OutdatedNotice";
import { isOtherDraft, packDraft } from "./pack-draft";
import { PackageRack } from "./PackageRack";
import { PackageTable } from "./PackageTable";
import type { BoardPlanActs } from "./parts-acts";
import { SparesPanel } from "./SparesPanel";
import { usePlanActs } from "./use-plan-acts";

type Props = {
  project: string;
  zone: string;
  view: BoardPlanView;
  can: { edit: boolean; editProcedure: boolean };
  acts: BoardPlanActs & { offer: OfferAct };
};

export function BoardPlanPlace({ project, zone, view, can, acts }: Props) {
  const { act } = useAct();
  const planActs = usePlanActs(acts);
  const [draft, setDraft] = useState<Pick<BoardPlanView["plan"], "packing" | "family" | "blocks">>(view.plan);
  const { board } = view;
  const packed = packDraft(view, draft);
  const isDraft = isOtherDraft(draft, view.plan);
  const packing = packed.ok && packed.packing.packageCount > 0 ? packed.packing : undefined;
  return (
    <Page
      title={
        <>
          <span className="mono text-[0.8em]">{board.code}</span> {board.name}
        </>
      }
      lede={
        packing ? summary(packing.packageCount, packing.spares.length, packing.poolingSaves, packing.mode) : undefined
      }
      actions={<ButtonLink href={`/projects/${project}/boards/${board.code}`}>The board</ButtonLink>}
    >
      <div className="flex flex-col gap-5">
        <OutdatedNotice project={project} zone={zone} units={view.outdated} />
        <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,24rem)_minmax(0,1fr)]">
          <Panel title="Plan">
            {can.edit ? (
              <BoardPlanForm
                project={project}
                view={view}
                save={planActs.save}
                onDraft={setDraft}
                onSaved={({ tiesReopened }) =>
                  void act(
                    async () => ({ ok: true, value: null }),
                    () =>
                      tiesReopened
                        ? "The plan is saved. Other gates are spare now: look at their ties again."
                        : "The plan is saved.",
                  )
                }
              />
            ) : (
              <BoardPlanFacts view={view} />
            )}
          </Panel>
          <Panel title="Packages" note={isDraft ? <Badge tone="copper">as typed, not saved</Badge> : undefined}>
            {!packed.ok && (
              <Notice kind="failed" role="status">
                <ul>
                  {packed.problems.map(({ row, message }) => (
                    <li key={`${row} ${message}`}>{message}</li>
                  ))}
                </ul>
              </Notice>
            )}
            {packing ? (
              <div className="flex flex-col gap-4">
                <PackageRack packages={packing.packages} spares={packing.spares} parts={view.packages} />
                <PackageTable packing={packing} />
              </div>
            ) : (
              packed.ok && (
                <EmptyState title="No gates to pack">
                  <p>
                    Say which blocks the board uses, and how many of each. Their gates are put into packages here, with
                    spare gates and capacitors. Parts that are no gates go into the list below.
                  </p>
                </EmptyState>
              )
            )}
          </Panel>
        </div>
        {packing && (
          <SparesPanel
            project={project}
            view={view}
            packing={packing}
            isDraft={isDraft}
            can={can}
            tie={planActs.tie}
            offer={acts.offer}
          />
        )}
        <BomPanel
          project={project}
          view={view}
          packages={packing?.packages ?? []}
          canEdit={can.edit}
          save={planActs.saveBom}
        />
      </div>
    </Page>
  );
}

function summary(packages: number, spares: number, saves: number, mode: "pooled" | "per-block"): string {
  const free = spares === 0 ? "no gate to spare" : `${counted(spares, "spare gate")}`;
  const other =
    saves === 0
      ? ""
      : mode === "pooled"
        ? ` Shared by all blocks, which saves ${saves}.`
        : ` Each block has its own; sharing would save ${saves}.`;
  return `${counted(packages, "package")}, ${free}.${other}`;
}
