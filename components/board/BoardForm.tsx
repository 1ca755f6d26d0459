"use client";

import { useRef } from "react";
import { z } from "zod";
import { Button } from "@/components/ui/Button";
import { FormRadioGroup, FormSelect, FormTextArea, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { TheirVersion } from "@/components/workshop/TheirVersion";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import { createBoardInput } from "@/lib/board/schema";
import { connectorChoices } from "@/lib/calc/connector";

const NONE = "none";
/** Kept as it is here; its rows are changed under Wiring. */
const GRID = { id: "grid", label: "Face of one's own" };
const fields = createBoardInput
  .omit({ project: true, writeId: true, connectorType: true })
  .extend({ connectorType: z.string() });
type Fields = z.input<typeof fields>;
export type BoardFields = Omit<Fields, "connectorType"> & { connectorType: string | null };

const current = fields.extend({ connectorType: z.string().nullable(), version: z.int() });

type Props<Value> = {
  board?: BoardFields & { version: number };
  save: (values: BoardFields, asked: { writeId: string; version: number }) => Promise<Reply<Value>>;
  onDone: (value: Value) => void;
  onCancel: () => void;
};

/** One form to add a board and to change it. */
export function BoardForm<Value extends object>({ board, save, onDone, onCancel }: Props<Value>) {
  const writeId = useRef(crypto.randomUUID());
  const stale = useStaleEdit(board?.version ?? 0, (details) => current.safeParse(details).data);
  const isNew = board === undefined;

  async function send(values: Fields): Promise<Reply<Value>> {
    const read = { ...values, connectorType: values.connectorType === NONE ? null : values.connectorType };
    if (isNew) return save(read, { writeId: writeId.current, version: 0 });
    return stale.send((asked) => save(read, asked));
  }

  return (
    <Form<Fields, Value>
      label={isNew ? "New board" : "Board"}
      schema={fields}
      defaults={{
        code: board?.code ?? "",
        name: board?.name ?? "",
        summary: board?.summary ?? "",
        kind: board?.kind ?? "card",
        connectorType: board ? (board.connectorType ?? NONE) : "din41612-c64",
        connectorReference: board?.connectorReference ?? "J1",
      }}
      action={send}
      onDone={onDone}
      submitLabel={isNew ? "Add the board" : "Save the board"}
      actions={<Button onPress={onCancel}>Cancel</Button>}
    >
      {(form) => (
        <>
          <div className="grid gap-4 sm:grid-cols-[9rem_minmax(0,1fr)]">
            <FormTextField name="code" label="Code" mono maxLength={8} placeholder="TIM" isRequired />
            <FormTextField name="name" label="Name" maxLength={120} placeholder="Timebase" isRequired />
          </div>
          <p className="-mt-2 text-sm text-ink-soft">
            The code begins the serial numbers of its units: TIM-01, TIM-02 …
          </p>
          <FormTextArea name="summary" label="What it does" rows={2} />
          <FormRadioGroup
            name="kind"
            label="Kind"
            isInRow
            options={[
              { id: "card", label: "Card that plugs in" },
              { id: "backplane", label: "Backplane" },
            ]}
          />
          <div className="grid gap-4 sm:grid-cols-[minmax(0,1fr)_9rem]">
            <FormSelect
              name="connectorType"
              label="Edge connector"
              options={[
                { id: NONE, label: "None yet" },
                ...(board?.connectorType === GRID.id ? [GRID] : []),
                ...connectorChoices,
              ]}
              description="More of them, and faces of one's own, under Wiring."
            />
            <FormTextField name="connectorReference" label="Its reference" mono maxLength={20} />
          </div>
          {stale.theirs && (
            <TheirVersion
              rows={[
                { name: "Code", theirs: stale.theirs.code, yours: form.getValues("code") },
                { name: "Name", theirs: stale.theirs.name, yours: form.getValues("name") },
                { name: "What it does", theirs: stale.theirs.summary, yours: form.getValues("summary") },
                { name: "Kind", theirs: stale.theirs.kind, yours: form.getValues("kind") },
                {
                  name: "Edge connector",
                  theirs: stale.theirs.connectorType ?? NONE,
                  yours: form.getValues("connectorType"),
                },
              ]}
            />
          )}
        </>
      )}
    </Form>
  );
}
