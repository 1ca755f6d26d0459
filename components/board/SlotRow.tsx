"use client";

import Link from "next/link";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { DateTime } from "@/components/ui/DateTime";
import { Dialog } from "@/components/ui/Dialog";
import { IconButton } from "@/components/ui/IconButton";
import { Menu } from "@/components/ui/Menu";
import { Disclosure } from "@/components/workshop/Disclosure";
import type { BoardLine, PlaceableUnit, SlotLine } from "@/lib/board/load-boards";
import type { SlotActs } from "./board-acts";
import { PlaceUnit } from "./PlaceUnit";
import { SlotForm } from "./SlotForm";
import { useAct } from "./use-act";

type Props = {
  project: string;
  zone: string;
  slot: SlotLine;
  board: BoardLine | undefined;
  cards: readonly BoardLine[];
  placeable: readonly PlaceableUnit[];
  canEdit: boolean;
  acts: SlotActs;
};

const HP_MM = 5.08;

export function SlotRow({ project, zone, slot, board, cards, placeable, canEdit, acts }: Props) {
  const { act, isPending } = useAct();
  const [isEditing, setEditing] = useState(false);
  const write = () => ({ project, writeId: crypto.randomUUID() });
  const { unit } = slot;
  const past = slot.history.filter((line) => line.removedAt !== null);

  const takeOut = (id: string, serial: string) =>
    act(
      () => acts.remove({ ...write(), unitId: id }),
      () => `${serial} is out of slot ${slot.position}.`,
      () =>
        act(
          () => acts.place({ ...write(), slotId: slot.id, unitId: id }),
          () => `${serial} is back in.`,
        ),
    );
  const archive = () =>
    act(
      () => acts.archive({ ...write(), slotId: slot.id }),
      () => `Slot ${slot.position} is gone from the drawing.`,
      () =>
        act(
          () => acts.restore({ ...write(), slotId: slot.id }),
          () => `Slot ${slot.position} is back.`,
        ),
    );

  return (
    <li
      id={`slot-${slot.position}`}
      className="flex scroll-mt-24 flex-col border-b border-rule py-2 last:border-b-0 target:bg-copper-ground/60"
    >
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <span className="mono w-7 text-right text-sm text-ink-soft">{slot.position}</span>
        <span className="flex min-w-44 flex-1 flex-col">
          <span className="font-semibold">
            {board?.name ?? "Any card"}
            {slot.label && <span className="font-normal text-ink-soft"> · {slot.label}</span>}
          </span>
          <span className="text-sm text-ink-soft">
            <span className="mono text-xs">{slot.pitchHp} HP</span>, {(slot.pitchHp * HP_MM).toFixed(2)} mm
          </span>
        </span>
        <span className="flex min-w-40 flex-1 items-center gap-3 max-sm:pl-11">
          {unit ? (
            <>
              <Link href={`/projects/${project}/units/${unit.serial}`} className="link mono text-sm font-semibold">
                {unit.serial}
              </Link>
              {canEdit && (
                <Button size="sm" isPending={isPending} onPress={() => void takeOut(unit.id, unit.serial)}>
                  Take it out
                </Button>
              )}
            </>
          ) : (
            <>
              <span className="text-sm text-ink-soft">empty</span>
              {canEdit && <PlaceUnit {...{ project, slot, placeable, acts }} boardCode={board?.code} />}
            </>
          )}
        </span>
        {canEdit && (
          <Menu
            label={`Slot ${slot.position}`}
            trigger={<IconButton icon="more" label={`More for slot ${slot.position}`} size="sm" tooltip={false} />}
            entries={[
              { id: "edit", label: "Change the slot", onAction: () => setEditing(true) },
              {
                id: "archive",
                label: "Take it off the drawing",
                ...(unit ? { description: `${unit.serial} has to come out first.` } : {}),
                isDisabled: unit !== null,
                isDanger: true,
                onAction: () => void archive(),
              },
            ]}
          />
        )}
      </div>
      {past.length > 0 && (
        <div className="pl-11">
          <Disclosure summary={<span className="text-sm">Sat here before: {past.length}</span>}>
            <ul className="flex flex-col gap-1 pb-2 text-sm text-ink-soft">
              {past.map((line) => (
                <li key={line.placedAt}>
                  <span className="mono text-xs text-ink">{line.serial}</span> from{" "}
                  <DateTime at={line.placedAt} zone={zone} /> to{" "}
                  <DateTime at={line.removedAt ?? line.placedAt} zone={zone} />
                </li>
              ))}
            </ul>
          </Disclosure>
        </div>
      )}
      <Dialog title={`Slot ${slot.position}`} isOpen={isEditing} onOpenChange={setEditing}>
        {(close) => (
          <SlotForm
            slot={slot}
            cards={cards}
            submitLabel="Save the slot"
            save={(values, asked) => acts.edit({ project, slotId: slot.id, ...asked, ...values })}
            onCancel={close}
            onDone={(value) => {
              close();
              void act(
                async () => ({ ok: true, value }),
                () => "The slot is saved.",
              );
            }}
          />
        )}
      </Dialog>
    </li>
  );
}
