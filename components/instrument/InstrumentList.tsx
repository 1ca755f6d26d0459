"use client";

import { useRouter } from "next/navigation";
import { useWriteId } from "@/components/account/use-write-id";
import { Badge } from "@/components/ui/Badge";
import { Button } from "@/components/ui/Button";
import { EmptyState } from "@/components/ui/EmptyState";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { Panel } from "@/components/ui/Panel";
import { toast } from "@/components/ui/toast-store";
import { KIND_WORDS, type Change, type InstrumentLine, type Save } from "./instrument-line";
import { InstrumentDialog } from "./InstrumentDialog";
import { RangeTable } from "./RangeTable";
import { WhatItMeans } from "./WhatItMeans";

type Acts = { save: Save; archive: Change; restore: Change };

export function InstrumentList({ instruments, ...acts }: Acts & { instruments: readonly InstrumentLine[] }) {
  if (instruments.length === 0) {
    return (
      <EmptyState title="No instrument yet">
        Add the meter on your bench with the accuracy from its data sheet. Readings taken with it are then judged with
        their uncertainty: a reading too near a limit says so.
      </EmptyState>
    );
  }
  return instruments.map((instrument) => <Instrument key={instrument.id} instrument={instrument} {...acts} />);
}

function Instrument({ instrument, save, archive, restore }: Acts & { instrument: InstrumentLine }) {
  const { name, kind, isArchived, ranges, calibrationNote } = instrument;
  return (
    <Panel
      title={name}
      note={
        <>
          {KIND_WORDS[kind]} {isArchived && <Badge>archived</Badge>}
        </>
      }
      actions={
        <>
          {!isArchived && <InstrumentDialog instrument={instrument} save={save} />}
          <ArchiveButton instrument={instrument} archive={archive} restore={restore} />
        </>
      }
    >
      {ranges.length > 0 ? (
        <RangeTable name={name} ranges={ranges} />
      ) : (
        <p className="text-[0.9375rem] text-ink-soft">
          No range is stated: its readings are judged as they stand, without an uncertainty.
        </p>
      )}
      {calibrationNote && <p className="mt-3 whitespace-pre-line text-[0.9375rem]">{calibrationNote}</p>}
      {!isArchived && <WhatItMeans ranges={ranges} />}
    </Panel>
  );
}

function ArchiveButton({ instrument, archive, restore }: Omit<Acts, "save"> & { instrument: InstrumentLine }) {
  const router = useRouter();
  const { writeId, renew } = useWriteId();
  const { id, name, isArchived } = instrument;
  const { submit, isPending } = useSubmit(isArchived ? restore : archive, {
    onDone: () => {
      renew();
      toast({
        text: isArchived ? `${name} is back on the bench.` : `${name} is archived. Its readings keep naming it.`,
      });
      router.refresh();
    },
  });

  async function press() {
    const reply = await submit({ writeId, instrument: id });
    if (!reply.ok) toast({ kind: "error", text: reply.error.message });
  }

  return (
    <Button
      size="sm"
      kind="quiet"
      isPending={isPending}
      onPress={() => void press()}
      aria-label={`${isArchived ? "Restore" : "Archive"} ${name}`}
    >
      {isArchived ? "Restore" : "Archive"}
    </Button>
  );
}
