"use client";

import { useRef } from "react";
import { z } from "zod";
import { Button } from "@/components/ui/Button";
import { FormSelect, FormTextArea, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { TheirVersion } from "@/components/workshop/TheirVersion";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import type { RevisionChoice } from "@/lib/board/load-revisions";
import { createUnitInput } from "@/lib/unit/schema";

const fields = createUnitInput.pick({ serial: true, revisionId: true, note: true });
export type UnitFields = z.input<typeof fields>;
const current = fields.extend({ version: z.int() });

type Props<Value> = {
  unit: UnitFields & { version?: number };
  revisions: readonly RevisionChoice[];
  submitLabel: string;
  save: (values: UnitFields, asked: { writeId: string; version: number }) => Promise<Reply<Value>>;
  onDone: (value: Value) => void;
  onCancel: () => void;
};

export function UnitForm<Value extends object>({ unit, revisions, submitLabel, save, onDone, onCancel }: Props<Value>) {
  const writeId = useRef(crypto.randomUUID());
  const stale = useStaleEdit(unit.version ?? 0, (details) => current.safeParse(details).data);
  const letterOf = (id: string) => revisions.find((revision) => revision.id === id)?.letter ?? "?";
  return (
    <Form<UnitFields, Value>
      label="Unit"
      schema={fields}
      defaults={{ serial: unit.serial, revisionId: unit.revisionId, note: unit.note }}
      action={(values) =>
        unit.version === undefined
          ? save(values, { writeId: writeId.current, version: 0 })
          : stale.send((asked) => save(values, asked))
      }
      onDone={onDone}
      submitLabel={submitLabel}
      actions={<Button onPress={onCancel}>Cancel</Button>}
    >
      {(form) => (
        <>
          <div className="grid gap-4 sm:grid-cols-2">
            <FormTextField name="serial" label="Serial number" mono maxLength={24} isRequired />
            <FormSelect
              name="revisionId"
              label="Made from revision"
              options={revisions.map(({ id, letter, releasedAt }) => ({
                id,
                label: letter,
                ...(releasedAt ? {} : { description: "not released yet" }),
              }))}
            />
          </div>
          <FormTextArea
            name="note"
            label="Note"
            rows={3}
            description="Where it came from, who soldered it, what is odd about it."
          />
          {stale.theirs && (
            <TheirVersion
              rows={[
                { name: "Serial number", theirs: stale.theirs.serial, yours: form.getValues("serial") },
                {
                  name: "Revision",
                  theirs: letterOf(stale.theirs.revisionId),
                  yours: letterOf(form.getValues("revisionId")),
                },
                { name: "Note", theirs: stale.theirs.note, yours: form.getValues("note") },
              ]}
            />
          )}
        </>
      )}
    </Form>
  );
}
