"use client";

import { useState, useSyncExternalStore } from "react";
import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { ComboBox } from "@/components/ui/ComboBox";
import { DialogActions } from "@/components/ui/DialogActions";
import { Notice } from "@/components/ui/Notice";
import { Skeleton } from "@/components/ui/Skeleton";
import { TextField } from "@/components/ui/TextField";
import { DateTime } from "@/components/ui/DateTime";
import { ENTRY_LIMITS } from "@/lib/log-entry/schema";
import type { UnitChoice } from "@/lib/log-entry/load-entry-units";
import { BodyField } from "./BodyField";
import { ConflictNotice } from "./ConflictNotice";
import { EntryPictures } from "./EntryPictures";
import { useEntryEditor, type EditorWiring } from "./use-entry-editor";

export type EntryEditorProps = EditorWiring & { zone: string; units: readonly UnitChoice[] };

const never = () => () => undefined;

/** The draft is on the device, which the server cannot read: the editor begins in the browser. */
export function EntryEditor(props: EntryEditorProps) {
  const isBrowser = useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
  return isBrowser ? <Editor {...props} /> : <Skeleton className="h-96" />;
}

function Editor(props: EntryEditorProps) {
  const { project, zone, units, entry } = props;
  const { draft, change, discard, save, settle, restoredAt, isKept, isPending, error, conflict } =
    useEntryEditor(props);
  const [isSending, setSending] = useState(false);
  const fields = error?.fields ?? {};
  return (
    <form
      noValidate
      aria-label={entry ? "Edit the entry" : "New entry"}
      className="flex flex-col gap-5"
      onSubmit={(event) => {
        event.preventDefault();
        void save();
      }}
    >
      {restoredAt && (
        <Notice
          kind="info"
          actions={
            <Button size="sm" onPress={discard}>
              Discard it
            </Button>
          }
        >
          This is what you typed until <DateTime at={restoredAt} zone={zone} />. It is kept on this device and not saved
          yet.
        </Notice>
      )}
      <TextField
        label="Title"
        isRequired
        value={draft.title}
        onChange={(title) => change({ title })}
        maxLength={ENTRY_LIMITS.title}
        error={fields.title}
      />
      <ComboBox
        label="Unit"
        description="Empty when it is about the machine as a whole."
        options={units.map(({ serial, board }) => ({ id: serial, label: serial, description: board }))}
        value={draft.unit === "" ? null : draft.unit}
        onChange={(unit) => change({ unit: unit ?? "" })}
        error={fields.unit}
      />
      <BodyField value={draft.body} onChange={(body) => change({ body })} error={fields.body} />
      <EntryPictures {...{ project, draft, change }} onBusy={setSending} error={fields.pictures} />
      {conflict && <ConflictNotice conflict={conflict} onSettle={settle} />}
      {error && !conflict && <Notice kind="error">{error.message}</Notice>}
      {!isKept && (
        <Notice kind="caution">
          This device keeps no drafts. What you type is lost when the page is closed before it is saved.
        </Notice>
      )}
      <DialogActions className="mt-0">
        <ButtonLink href={`/projects/${project}/log${entry ? `/${entry.id}` : ""}`}>Leave it for now</ButtonLink>
        <Button type="submit" kind="primary" isPending={isPending} isDisabled={isSending || Boolean(conflict)}>
          {isSending ? "Pictures are on their way" : entry ? "Save the entry" : "Put it into the log"}
        </Button>
      </DialogActions>
    </form>
  );
}
