"use client";

import { useState } from "react";
import { useAct } from "@/components/board/use-act";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { Dialog } from "@/components/ui/Dialog";
import { IconButton } from "@/components/ui/IconButton";
import { Menu } from "@/components/ui/Menu";
import { lineWords } from "@/lib/power/line-kinds";
import type { PairedLine } from "@/lib/power/pair-lines";
import type { PlannedLine } from "@/lib/power/plan-power";
import { amps } from "./figures";
import { LineForm } from "./LineForm";
import type { PowerActs } from "./power-acts";

export type RowContext = {
  project: string;
  /** Code of the board. */
  board: string;
  rails: readonly string[];
  canEdit: boolean;
  acts: Pick<PowerActs, "saveLine" | "removeLine">;
};

export function DrawRow({ line: { draw, typed }, ...context }: RowContext & { line: PairedLine }) {
  const isWhole = typed?.item.kind === "whole";
  const figures = draw?.amps ?? (typed?.item.kind === "whole" ? wholeFigures(typed.item) : null);
  return (
    <li className="grid grid-cols-[minmax(0,1fr)_auto_2.25rem] items-center gap-x-4 border-t border-rule px-4 py-2 sm:px-5">
      <span className="min-w-0">
        <span className="block">
          {draw && draw.kind !== "regulator" && <span className="mono text-sm text-ink-soft">{draw.count} × </span>}
          {isWhole ? "Whole board" : (draw?.label ?? typed?.item.label)}
          {isWhole && typed.item.label !== "" && <span className="text-ink-soft">, {typed.item.label}</span>}
        </span>
        <span className="block text-sm text-ink-soft">{isWhole ? "Stands instead of the sum." : draw?.reason}</span>
      </span>
      <span className="mono flex flex-col items-end whitespace-nowrap text-sm leading-snug">
        {figures && (
          <>
            <span>
              <span className="sr-only">at worst </span>
              {amps(figures.worst)}
            </span>
            <span className="text-xs text-ink-soft">
              <span className="sr-only">as a rule </span>
              {amps(figures.typical)}
            </span>
          </>
        )}
      </span>
      {typed && context.canEdit ? <LineMenu line={typed} {...context} /> : <span />}
    </li>
  );
}

const wholeFigures = ({ typicalA, worstA }: { typicalA: number; worstA: number }) => ({
  typical: typicalA,
  worst: worstA,
});

function LineMenu({ line, project, board, rails, acts }: RowContext & { line: PlannedLine }) {
  const { act } = useAct();
  const [open, setOpen] = useState<"edit" | "remove">();
  const words = lineWords(line.item);
  return (
    <span className="print:hidden">
      <Menu
        label={words}
        trigger={<IconButton icon="more" label={`More for ${words}`} size="sm" tooltip={false} />}
        entries={[
          { id: "edit", label: "Change the line", onAction: () => setOpen("edit") },
          { id: "remove", label: "Remove the line", isDanger: true, onAction: () => setOpen("remove") },
        ]}
      />
      <Dialog
        title={`What ${board} draws`}
        isDismissable={false}
        isOpen={open === "edit"}
        onOpenChange={() => setOpen(undefined)}
      >
        {(close) => (
          <LineForm
            {...{ project, board, line, rails }}
            save={acts.saveLine}
            onCancel={close}
            onDone={(value) => {
              close();
              void act(
                async () => ({ ok: true, value }),
                ({ item }) => `${board}: ${lineWords(item)}. The budget and the wiring were worked out again.`,
              );
            }}
          />
        )}
      </Dialog>
      <ConfirmDialog
        title={`Remove “${words}”?`}
        isOpen={open === "remove"}
        onOpenChange={() => setOpen(undefined)}
        consequences={[`The budget of ${board} and of the machine are worked out without it.`]}
        confirmLabel="Remove the line"
        onConfirm={() =>
          act(
            () => acts.removeLine({ project, writeId: crypto.randomUUID(), board, line: line.id, seen: line.item }),
            ({ what }) => `Gone from ${board}: ${what}.`,
          )
        }
      />
    </span>
  );
}
