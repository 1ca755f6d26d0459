"use client";

import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { DialogActions } from "@/components/ui/DialogActions";
import { Select } from "@/components/ui/Select";
import type { PlaceableUnit, SlotLine } from "@/lib/board/load-boards";
import type { SlotActs } from "./board-acts";
import { useAct } from "./use-act";

type PlaceProps = {
  project: string;
  slot: SlotLine;
  placeable: readonly PlaceableUnit[];
  acts: SlotActs;
  boardCode: string | undefined;
};

/** Chooses among the units that fit; those that sit elsewhere are named with their slot. */
export function PlaceUnit({ project, slot, placeable, acts, boardCode }: PlaceProps) {
  const { act, isPending } = useAct();
  const free = placeable.filter((unit) => unit.position === null);
  const [chosen, setChosen] = useState<string | null>(free.length === 1 ? (free[0]?.id ?? null) : null);
  return (
    <Dialog
      title={`Put a unit into slot ${slot.position}`}
      width="sm"
      trigger={<Button size="sm">Put a unit in</Button>}
    >
      {(close) =>
        placeable.length === 0 ? (
          <>
            <p className="text-ink-soft">
              There is no unit that fits.{" "}
              {boardCode ? "Make one on the page of its board." : "Make units on the pages of their boards."}
            </p>
            <DialogActions>
              <Button onPress={close}>Close</Button>
            </DialogActions>
          </>
        ) : (
          <>
            <p className="mb-3 text-[0.9375rem] text-ink-soft">Machine switched off, rails discharged.</p>
            <Select
              label="Unit"
              value={chosen}
              onChange={setChosen}
              options={placeable.map(({ id, serial, position }) => ({
                id,
                label: serial,
                ...(position === null ? {} : { description: `sits in slot ${position}`, isDisabled: true }),
              }))}
            />
            <DialogActions>
              <Button onPress={close}>Cancel</Button>
              <Button
                kind="primary"
                isDisabled={chosen === null}
                isPending={isPending}
                onPress={async () => {
                  if (chosen === null) return;
                  const failed = await act(
                    () => acts.place({ project, writeId: crypto.randomUUID(), slotId: slot.id, unitId: chosen }),
                    ({ serial, position }) => `${serial} sits in slot ${position}.`,
                  );
                  if (!failed) close();
                }}
              >
                Put it in
              </Button>
            </DialogActions>
          </>
        )
      }
    </Dialog>
  );
}
