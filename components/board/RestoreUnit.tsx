"use client";

import { Button } from "@/components/ui/Button";
import type { UnitActs } from "./board-acts";
import { useAct } from "./use-act";

type Props = { project: string; unit: { id: string; serial: string }; restore: UnitActs["restore"] };

export function RestoreUnit({ project, unit, restore }: Props) {
  const { act, isPending } = useAct();
  return (
    <Button
      size="sm"
      isPending={isPending}
      onPress={() =>
        void act(
          () => restore({ project, writeId: crypto.randomUUID(), unitId: unit.id }),
          () => `${unit.serial} is back, in no slot.`,
        )
      }
    >
      Restore
    </Button>
  );
}
