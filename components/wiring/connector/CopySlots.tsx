"use client";

import { useRef, useState } from "react";
import { Button } from "@/components/ui/Button";
import { Checkbox } from "@/components/ui/Checkbox";
import { Dialog } from "@/components/ui/Dialog";
import { DialogActions } from "@/components/ui/DialogActions";
import { reach } from "@/components/ui/form/reply";
import { Notice } from "@/components/ui/Notice";
import { toast } from "@/components/ui/toast-store";
import { counted } from "@/components/workshop/counted";
import type { ConnectorView, WiringSlot } from "@/lib/pin-map/load-wiring";
import type { ConnectorActs } from "./connector-acts";

type Props = {
  project: string;
  source: ConnectorView;
  slots: readonly WiringSlot[];
  connectors: readonly ConnectorView[];
  pinsOf: (connectorId: string) => number;
  copy: ConnectorActs["copy"];
  isOpen: boolean;
  onOpenChange: (isOpen: boolean) => void;
  onDone: () => void;
};

/** Puts one slot's pin map into others, and says for each what it gains and loses. */
export function CopySlots(props: Props) {
  const { source, isOpen, onOpenChange } = props;
  return (
    <Dialog title={`Copy the pins of ${source.code} ${source.reference}`} isOpen={isOpen} onOpenChange={onOpenChange}>
      {(close) => <Choose {...props} close={close} />}
    </Dialog>
  );
}

function Choose({ project, source, slots, connectors, pinsOf, copy, onDone, close }: Props & { close: () => void }) {
  const writeId = useRef(crypto.randomUUID());
  const [chosen, setChosen] = useState<ReadonlySet<string>>(new Set());
  const [failure, setFailure] = useState<string>();
  const [isPending, setPending] = useState(false);
  const pins = pinsOf(source.id);
  const takes = source.takes.toLowerCase();
  const targets = slots
    .filter(({ id }) => id !== source.slotId)
    .map((slot) => ({
      slot,
      there: connectors.find((one) => one.slotId === slot.id && one.takes.toLowerCase() === takes),
    }));
  const picked = targets.filter(({ slot }) => chosen.has(slot.id));
  const lost = picked.reduce((sum, { there }) => sum + (there ? pinsOf(there.id) : 0), 0);
  const made = picked.filter(({ there }) => there === undefined).length;

  async function send() {
    setPending(true);
    const wanted = picked.map(({ slot, there }) => ({ slotId: slot.id, version: there?.version ?? null }));
    const { id: connectorId, version } = source;
    const reply = await reach(() => copy({ project, writeId: writeId.current, connectorId, version, slots: wanted }));
    setPending(false);
    if (!reply.ok) {
      writeId.current = crypto.randomUUID();
      return setFailure(reply.error.message);
    }
    toast({ text: `${counted(reply.value.pins, "pin")} copied to ${counted(reply.value.slots, "slot")}.` });
    onDone();
    close();
  }

  const toggle = (id: string, isIn: boolean) =>
    setChosen((before) => new Set(isIn ? [...before, id] : [...before].filter((one) => one !== id)));
  return (
    <div className="flex flex-col gap-4">
      <p className="text-[0.9375rem] text-ink-soft">
        The chosen slots get exactly its {counted(pins, "pin")}. What their pins carry now is replaced.
      </p>
      <fieldset className="flex flex-col gap-1">
        <legend className="mb-1 text-sm font-semibold">Slots</legend>
        {targets.map(({ slot, there }) => (
          <Checkbox
            key={slot.id}
            label={`Slot ${slot.position}`}
            description={
              there
                ? `${there.code} ${there.reference}, ${counted(pinsOf(there.id), "pin")} now`
                : "No connector yet: it gets one of the same face."
            }
            value={chosen.has(slot.id)}
            onChange={(isIn) => toggle(slot.id, isIn)}
          />
        ))}
      </fieldset>
      {picked.length > 0 && (
        <Notice kind={lost > 0 ? "caution" : "info"}>
          {[
            lost > 0 ? `What ${counted(lost, "pin")} of these slots ${lost === 1 ? "carries" : "carry"} now goes.` : "",
            made > 0 ? `${counted(made, "connector")} ${made === 1 ? "is" : "are"} added to ${source.code}.` : "",
            lost === 0 && made === 0 ? "Nothing is lost: their pins carry nothing yet." : "",
          ]
            .filter((sentence) => sentence !== "")
            .join(" ")}
        </Notice>
      )}
      {failure && <Notice kind="failed">{failure}</Notice>}
      <DialogActions>
        <Button onPress={close}>Keep them as they are</Button>
        <Button kind="primary" isDisabled={picked.length === 0} isPending={isPending} onPress={() => void send()}>
          {picked.length === 0 ? "Copy" : `Copy to ${counted(picked.length, "slot")}`}
        </Button>
      </DialogActions>
    </div>
  );
}
