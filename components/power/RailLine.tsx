"use client";

import { useState } from "react";
import { useAct } from "@/components/board/use-act";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { Dialog } from "@/components/ui/Dialog";
import { IconButton } from "@/components/ui/IconButton";
import { Menu } from "@/components/ui/Menu";
import type { SupplyMargin } from "@/lib/calc/power";
import type { PowerView, RailView } from "@/lib/power/power-view";
import { DrawBar, type BarTone } from "./DrawBar";
import { amps, quantity } from "./figures";
import type { PowerActs } from "./power-acts";
import { RailForm } from "./RailForm";
import { VerdictWord, type Standing } from "./VerdictWord";

type Props = {
  project: string;
  rail: RailView;
  margin: SupplyMargin | undefined;
  sources: PowerView["sources"];
  canEdit: boolean;
  acts: Pick<PowerActs, "saveRail" | "removeRail">;
};

type Look = { standing: Standing; tone: BarTone; word: string };
const LOOKS: Record<SupplyMargin["verdict"], Look> = {
  enough: { standing: "good", tone: "passed", word: "enough" },
  scant: { standing: "scant", tone: "doubtful", word: "scant" },
  "too little": { standing: "bad", tone: "failed", word: "too little" },
  unknown: { standing: "unknown", tone: "waiting", word: "supply not known" },
};

export function RailLine({ project, rail, margin, sources, canEdit, acts }: Props) {
  const { act } = useAct();
  const [open, setOpen] = useState<"edit" | "remove">();
  const { kept } = rail;
  const look = LOOKS[margin?.verdict ?? "unknown"];
  const isTaken = margin !== undefined && margin.sum.worst > 0;
  return (
    <li className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-x-4 gap-y-2 border-t border-rule px-4 py-3 sm:px-5 md:grid-cols-[8.5rem_minmax(0,1fr)_auto_auto]">
      <div className="flex flex-wrap items-baseline gap-x-2.5 md:flex-col">
        <span className="mono font-semibold">{rail.name}</span>
        <span className="mono text-xs text-ink-soft">
          {quantity(rail.volts, "V")} ± {quantity(rail.tolerancePercent, "%")}
        </span>
      </div>
      <div className="col-span-2 flex min-w-0 flex-col gap-1 md:col-span-1 md:row-auto">
        {isTaken && (
          <DrawBar
            typical={margin.sum.typical}
            worst={margin.sum.worst}
            limit={margin.capacityA}
            tone={look.tone}
            label={`${amps(margin.sum.typical)} as a rule, ${margin.sentence}`}
          />
        )}
        <p className="text-sm">
          {isTaken ? (
            <>
              {margin.sentence} <span className="text-ink-soft">{amps(margin.sum.typical)} as a rule.</span>
            </>
          ) : (
            <span className="text-ink-soft">Nothing that is known of takes from it.</span>
          )}{" "}
          <span className="text-ink-soft">{rail.source ? `Fed by ${rail.source}.` : ""}</span>
        </p>
      </div>
      <span className="text-sm max-md:col-start-1 max-md:row-start-3">
        {isTaken && <VerdictWord standing={look.standing}>{look.word}</VerdictWord>}
      </span>
      {canEdit && (
        <span className="max-md:col-start-2 max-md:row-start-1 print:hidden">
          <Menu
            label={rail.name}
            trigger={<IconButton icon="more" label={`More for ${rail.name}`} size="sm" tooltip={false} />}
            entries={[
              { id: "edit", label: kept ? "Change the rail" : "Describe the rail", onAction: () => setOpen("edit") },
              ...(kept
                ? [{ id: "remove", label: "Remove the rail", isDanger: true, onAction: () => setOpen("remove") }]
                : []),
            ]}
          />
        </span>
      )}
      <Dialog title={rail.name} isOpen={open === "edit"} onOpenChange={() => setOpen(undefined)}>
        {(close) => (
          <RailForm
            {...{ project, sources }}
            rail={kept}
            {...(kept ? {} : { begin: { name: rail.name, volts: quantity(rail.volts, "V") } })}
            save={acts.saveRail}
            onCancel={close}
            onDone={(value, { name }) => {
              close();
              void act(
                async () => ({ ok: true, value }),
                () => `${name} is saved. The wiring was checked again.`,
              );
            }}
          />
        )}
      </Dialog>
      {kept && (
        <ConfirmDialog
          title={`Remove ${rail.name}?`}
          isOpen={open === "remove"}
          onOpenChange={() => setOpen(undefined)}
          consequences={[
            "Its voltage, its supply's limit and its copper are forgotten. The pin map keeps the signal.",
            "The wiring is checked again without it.",
          ]}
          confirmLabel={`Remove ${rail.name}`}
          onConfirm={() =>
            act(
              () => acts.removeRail({ project, writeId: crypto.randomUUID(), rail: kept.id, version: kept.version }),
              ({ name }) => `${name} is gone.`,
            )
          }
        />
      )}
    </li>
  );
}
