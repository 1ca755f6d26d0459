"use client";

import { useState } from "react";
import { z } from "zod";
import { Button } from "@/components/ui/Button";
import { FormQuantityField, FormSelect, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { TheirVersion } from "@/components/workshop/TheirVersion";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import { saveSignalInput } from "@/lib/signal/schema";
import { CLASS_OPTIONS, type SaveSignal, type SignalSaid } from "./signal-acts";

type Values = z.input<typeof saveSignalInput>;

const current = z.object({
  class: z.string(),
  aliases: z.string(),
  frequency: z.string(),
  note: z.string(),
  version: z.int(),
});

type Props = {
  signal: SignalSaid;
  /** True when the name is still to be chosen. */
  isNew: boolean;
  project: string;
  save: SaveSignal;
  onDone: (name: string) => void;
  onCancel?: () => void;
};

/** What is known of a signal beyond its pins. */
export function SignalForm({ signal, isNew, project, save, onDone, onCancel }: Props) {
  const stale = useStaleEdit(signal.version, (details) => current.safeParse(details).data);
  const [writeId] = useState(() => crypto.randomUUID());
  const labelOf = (id: string) => CLASS_OPTIONS.find((option) => option.id === id)?.label ?? id;
  return (
    <Form<Values, { version: number }>
      label={isNew ? "Signal" : `Signal ${signal.name}`}
      schema={saveSignalInput}
      defaults={{
        project,
        writeId,
        name: signal.name,
        version: signal.version,
        class: signal.class,
        aliases: signal.aliases.join(", "),
        frequency: signal.frequency,
        note: signal.note,
      }}
      action={(values) => stale.send((asked) => save({ ...values, ...asked }))}
      onDone={(_saved, { name }) => onDone(name.trim())}
      submitLabel="Save the signal"
      actions={onCancel && <Button onPress={onCancel}>Cancel</Button>}
    >
      {(form) => (
        <>
          {isNew && (
            <FormTextField
              name="name"
              label="Signal"
              mono
              autoComplete="off"
              autoFocus
              description="As the pins carry it: CLK, PH6, CARRY_N."
            />
          )}
          <FormSelect name="class" label="Class" options={CLASS_OPTIONS} />
          <FormTextField
            name="aliases"
            label="Other names"
            mono
            autoComplete="off"
            description="What other boards call it on purpose, with commas between. Names that are agreed on here are no finding."
          />
          <FormQuantityField
            name="frequency"
            label="Changes level and back"
            placeholder="1 MHz"
            description="How often, at most. Pull-ups and edges are judged with it. Empty when you do not know."
          />
          <FormTextField name="note" label="Note" autoComplete="off" />
          {stale.theirs && (
            <TheirVersion
              rows={[
                { name: "Class", theirs: labelOf(stale.theirs.class), yours: labelOf(form.getValues("class")) },
                { name: "Other names", theirs: stale.theirs.aliases, yours: form.getValues("aliases") },
                { name: "Frequency", theirs: stale.theirs.frequency, yours: form.getValues("frequency") },
                { name: "Note", theirs: stale.theirs.note, yours: form.getValues("note") },
              ]}
            />
          )}
        </>
      )}
    </Form>
  );
}
