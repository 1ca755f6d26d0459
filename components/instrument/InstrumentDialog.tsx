"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { useWriteId } from "@/components/account/use-write-id";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { FormSelect, FormTextArea, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { toast } from "@/components/ui/toast-store";
import { EMPTY_RANGE } from "@/lib/instrument/range-schema";
import { INSTRUMENT_KINDS, saveInstrumentInput, type SaveInstrumentTyped } from "@/lib/instrument/schema";
import { KIND_WORDS, type InstrumentLine, type Save } from "./instrument-line";
import { RangeFields } from "./RangeFields";

const KIND_OPTIONS = INSTRUMENT_KINDS.map((id) => ({ id, label: KIND_WORDS[id] }));

/** Adds an instrument, or changes the one that is given. */
export function InstrumentDialog({ instrument, save }: { instrument?: InstrumentLine; save: Save }) {
  const [isOpen, setOpen] = useState(false);
  return (
    <Dialog
      title={instrument ? `Change ${instrument.name}` : "Add an instrument"}
      width="lg"
      isDismissable={false}
      isOpen={isOpen}
      onOpenChange={setOpen}
      trigger={
        instrument ? (
          <Button size="sm" aria-label={`Change ${instrument.name}`}>
            Change
          </Button>
        ) : (
          <Button kind="primary">Add an instrument</Button>
        )
      }
    >
      {(close) => <InstrumentForm save={save} close={close} {...(instrument ? { instrument } : {})} />}
    </Dialog>
  );
}

function InstrumentForm({ instrument, save, close }: { instrument?: InstrumentLine; save: Save; close: () => void }) {
  const router = useRouter();
  const { writeId } = useWriteId();
  const defaults: SaveInstrumentTyped = {
    writeId,
    instrument: instrument?.id ?? "",
    name: instrument?.name ?? "",
    kind: instrument?.kind ?? "meter",
    calibrationNote: instrument?.calibrationNote ?? "",
    ranges: instrument ? [...instrument.typedRanges] : [EMPTY_RANGE],
  };
  return (
    <Form
      label="Instrument"
      schema={saveInstrumentInput}
      defaults={defaults}
      action={save}
      onDone={(_done, { name }) => {
        close();
        toast({ text: `${name.trim()} is kept. Readings from now on are judged with it.` });
        router.refresh();
      }}
      submitLabel="Save the instrument"
      actions={<Button onPress={close}>Close without saving</Button>}
    >
      <div className="grid gap-4 sm:grid-cols-[1fr_12rem]">
        <FormTextField
          name="name"
          label="Name"
          autoComplete="off"
          description="As it stands on the bench, for instance “Bench meter, blue”."
        />
        <FormSelect name="kind" label="Kind" options={KIND_OPTIONS} />
      </div>
      <RangeFields />
      <FormTextArea
        name="calibrationNote"
        label="Calibration note"
        description="When, by whom, against what. It stands on the traveler beside the readings."
      />
    </Form>
  );
}
