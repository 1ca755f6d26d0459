"use client";

import { useAct } from "@/components/board/use-act";
import { Button } from "@/components/ui/Button";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import type { SignalLine } from "@/lib/signal/load-signals";
import type { RemoveSignal } from "./signal-acts";

type Props = { signal: Pick<SignalLine, "name" | "version" | "pins">; project: string; remove: RemoveSignal };

export function RemoveSignalButton({ signal: { name, version, pins }, project, remove }: Props) {
  const { act } = useAct();
  return (
    <ConfirmDialog
      title={`Take away what is said of ${name}?`}
      trigger={
        <Button size="sm" kind="quiet" aria-label={`Remove ${name}`}>
          Remove
        </Button>
      }
      consequences={[
        "Its class, other names, frequency and note go.",
        pins === 0
          ? "It is on no pin, so it leaves this list."
          : `The ${pins === 1 ? "pin that carries it keeps" : `${pins} pins that carry it keep`} carrying it, as a data signal.`,
        "The wiring is checked again without it: other names become findings.",
      ]}
      confirmLabel={`Remove what is said of ${name}`}
      onConfirm={() =>
        act(
          () => remove({ project, writeId: crypto.randomUUID(), name, version }),
          () => `Nothing more is said of ${name}.`,
        )
      }
    />
  );
}
