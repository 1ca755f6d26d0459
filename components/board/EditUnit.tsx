"use client";

import { useRouter } from "next/navigation";
import type { ReactElement } from "react";
import { Dialog } from "@/components/ui/Dialog";
import type { RevisionChoice } from "@/lib/board/load-revisions";
import type { UnitActs } from "./board-acts";
import { UnitForm, type UnitFields } from "./UnitForm";
import { useAct } from "./use-act";

type Props = {
  project: string;
  unit: UnitFields & { id: string; version: number };
  revisions: readonly RevisionChoice[];
  edit: UnitActs["edit"];
  /** A page of the unit itself follows a new serial number. */
  addressOf?: string;
} & ({ trigger: ReactElement } | { isOpen: boolean; onOpenChange: (isOpen: boolean) => void });

/** The dialog in which a unit is changed, on the page of its board and on its own. */
export function EditUnit({ project, unit, revisions, edit, addressOf, ...opened }: Props) {
  const router = useRouter();
  const { act } = useAct();
  return (
    <Dialog title={`Change ${unit.serial}`} {...opened}>
      {(close) => (
        <UnitForm
          unit={unit}
          revisions={revisions}
          submitLabel="Save the unit"
          save={(values, asked) => edit({ project, unitId: unit.id, ...asked, ...values })}
          onCancel={close}
          onDone={(value) => {
            close();
            if (addressOf !== undefined && value.serial !== unit.serial)
              router.replace(`${addressOf}/${encodeURIComponent(value.serial)}`);
            void act(
              async () => ({ ok: true, value }),
              ({ serial }) => `${serial} is saved.`,
            );
          }}
        />
      )}
    </Dialog>
  );
}
