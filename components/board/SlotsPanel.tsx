"use client";

import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import type { BoardsView } from "@/lib/board/load-boards";
import type { SlotActs } from "./board-acts";
import { ArchivedSlots } from "./ArchivedSlots";
import { SlotForm } from "./SlotForm";
import { SlotRow } from "./SlotRow";
import { useAct } from "./use-act";

type Props = { project: string; zone: string; view: BoardsView; canEdit: boolean; acts: SlotActs };

/** The backplane's places in order: which board each is wired for, and which unit sits there. */
export function SlotsPanel({ project, zone, view, canEdit, acts }: Props) {
  const { act } = useAct();
  const { slots } = view;
  const last = slots.at(-1);
  const next = { position: (last?.position ?? 0) + 1, label: "", pitchHp: last?.pitchHp ?? 4, boardId: null };
  const cards = view.boards.filter((board) => board.kind === "card" && !board.archived);
  const add = (
    <Dialog title="Add a slot" trigger={<Button kind={slots.length === 0 ? "primary" : "plain"}>Add a slot</Button>}>
      {(close) => (
        <SlotForm
          slot={next}
          cards={cards}
          submitLabel="Add the slot"
          save={(values, { writeId }) => acts.create({ project, writeId, ...values })}
          onCancel={close}
          onDone={({ position }) => {
            close();
            void act(
              async () => ({ ok: true, value: position }),
              () => `Slot ${position} is there.`,
            );
          }}
        />
      )}
    </Dialog>
  );
  return (
    <section id="slots" className="scroll-mt-4">
      <Panel
        title="Slots"
        {...(slots.length > 0 ? { note: `${slots.length}, in the order they stand` } : {})}
        actions={canEdit && slots.length > 0 && add}
      >
        {slots.length === 0 ? (
          <EmptyState title="No slots yet" action={canEdit && add}>
            <p>A slot is a place on the backplane that takes one card. Its pitch is drawn true: 4 HP is 20.32 mm.</p>
          </EmptyState>
        ) : (
          <ul className="flex flex-col">
            {slots.map((slot) => (
              <SlotRow
                key={slot.id}
                {...{ slot, project, zone, cards, acts, canEdit }}
                board={view.boards.find((board) => board.id === slot.boardId)}
                placeable={view.placeable.filter((unit) => slot.boardId === null || unit.boardId === slot.boardId)}
              />
            ))}
          </ul>
        )}
        {view.archivedSlots.length > 0 && (
          <div className="mt-3">
            <ArchivedSlots slots={view.archivedSlots} restore={acts.restore} {...{ project, canEdit }} />
          </div>
        )}
      </Panel>
    </section>
  );
}
