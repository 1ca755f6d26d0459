"use client";

import { useRouter } from "next/navigation";
import { useState, type ReactElement } from "react";
import { Dialog } from "@/components/ui/Dialog";
import { toast } from "@/components/ui/toast-store";
import type { SaveSignal, SignalSaid } from "./signal-acts";
import { SignalForm } from "./SignalForm";

const NOTHING: SignalSaid = { name: "", class: "data", aliases: [], frequency: "", note: "", version: 0 };

type Props = { signal?: SignalSaid; project: string; save: SaveSignal; trigger: ReactElement };

export function SignalDialog({ signal, project, save, trigger }: Props) {
  const router = useRouter();
  const [isOpen, setOpen] = useState(false);
  return (
    <Dialog
      title={signal ? `Signal ${signal.name}` : "Say more of a signal"}
      width="md"
      isDismissable={false}
      isOpen={isOpen}
      onOpenChange={setOpen}
      trigger={trigger}
    >
      {(close) => (
        <SignalForm
          signal={signal ?? NOTHING}
          isNew={!signal}
          project={project}
          save={save}
          onCancel={close}
          onDone={(name) => {
            close();
            toast({ text: `${name} is kept. The wiring was checked again with it.` });
            router.refresh();
          }}
        />
      )}
    </Dialog>
  );
}
