"use client";

import { Button } from "@/components/ui/Button";
import { counted } from "@/components/workshop/counted";
import { Disclosure } from "@/components/workshop/Disclosure";
import type { ArchivedSlot } from "@/lib/board/load-boards";
import type { SlotActs } from "./board-acts";
import { useAct } from "./use-act";

type Props = { project: string; slots: readonly ArchivedSlot[]; canEdit: boolean; restore: SlotActs["restore"] };

/** Slots that were taken off the drawing, with the way back. */
export function ArchivedSlots({ project, slots, canEdit, restore }: Props) {
  const { act, isPending } = useAct();
  return (
    <Disclosure summary={`${counted(slots.length, "slot")} off the drawing`}>
      <ul className="flex flex-col gap-2">
        {slots.map(({ id, position, label, boardName }) => (
          <li key={id} className="flex flex-wrap items-center gap-x-4 gap-y-1">
            <span className="text-[0.9375rem]">
              <span className="mono mr-2 text-sm text-ink-soft">{position}</span>
              {boardName ?? "Any card"}
              {label && <span className="text-ink-soft"> · {label}</span>}
            </span>
            {canEdit && (
              <Button
                size="sm"
                isPending={isPending}
                onPress={() =>
                  void act(
                    () => restore({ project, writeId: crypto.randomUUID(), slotId: id }),
                    () => `Slot ${position} is back.`,
                  )
                }
              >
                Restore
              </Button>
            )}
          </li>
        ))}
      </ul>
    </Disclosure>
  );
}
