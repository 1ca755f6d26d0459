"use client";

import { useRouter } from "next/navigation";
import { useState, type ReactElement } from "react";
import { Dialog } from "@/components/ui/Dialog";
import { toast } from "@/components/ui/toast-store";
import type { Family } from "@/lib/calc/levels";
import type { FamilyLine } from "@/lib/family/load-families";
import type { SaveFamily } from "./family-acts";
import { FamilyForm } from "./FamilyForm";

type Props = {
  /** The own family that is changed. */
  line?: FamilyLine & { id: string };
  /** A built-in one to begin with. */
  from?: Family;
  project: string;
  save: SaveFamily;
  trigger: ReactElement;
};

export function FamilyDialog({ line, from, project, save, trigger }: Props) {
  const router = useRouter();
  const [isOpen, setOpen] = useState(false);
  return (
    <Dialog
      title={line ? `Figures of ${line.family.name}` : "Enter a data sheet"}
      width="lg"
      isDismissable={false}
      isOpen={isOpen}
      onOpenChange={setOpen}
      trigger={trigger}
    >
      {(close) => (
        <FamilyForm
          {...(line ? { line } : {})}
          {...(from ? { from } : {})}
          project={project}
          save={save}
          onCancel={close}
          onDone={({ name }) => {
            close();
            toast({ text: `${name} is kept. The wiring was checked again with its figures.` });
            router.refresh();
          }}
        />
      )}
    </Dialog>
  );
}
