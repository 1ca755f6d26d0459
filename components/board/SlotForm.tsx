"use client";

import { useRef } from "react";
import { z } from "zod";
import { Button } from "@/components/ui/Button";
import { FormSelect, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { Reply } from "@/components/ui/form/reply";
import { TheirVersion } from "@/components/workshop/TheirVersion";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import type { BoardLine } from "@/lib/board/load-boards";
import { createSlotInput } from "@/lib/slot/schema";

const ANY = "any";
const toNumber = (typed: string) =>
  /^\s*\d+([.,]\d+)?\s*$/.test(typed) ? Number(typed.replace(",", ".")) : Number.NaN;
const shape = createSlotInput.shape;

/** Numbers as typed; the action's own schema says what is wrong with them. */
const fields = z.object({
  position: z.string().transform(toNumber).pipe(shape.position),
  label: shape.label,
  pitchHp: z.string().transform(toNumber).pipe(shape.pitchHp),
  boardId: z.string(),
});
type Fields = z.input<typeof fields>;
export type SlotFields = { position: number; label: string; pitchHp: number; boardId: string | null };

const current = z.object({
  position: z.number(),
  label: z.string(),
  pitchHp: z.number(),
  boardId: z.string().nullable(),
  version: z.int(),
});

type Props<Value> = {
  slot: SlotFields & { version?: number };
  cards: readonly BoardLine[];
  submitLabel: string;
  save: (values: SlotFields, asked: { writeId: string; version: number }) => Promise<Reply<Value>>;
  onDone: (value: Value) => void;
  onCancel: () => void;
};

export function SlotForm<Value extends object>({ slot, cards, submitLabel, save, onDone, onCancel }: Props<Value>) {
  const writeId = useRef(crypto.randomUUID());
  const stale = useStaleEdit(slot.version ?? 0, (details) => current.safeParse(details).data);
  const nameOf = (id: string | null) => cards.find((card) => card.id === id)?.name ?? "any card";

  async function send(typed: Fields): Promise<Reply<Value>> {
    const values = {
      position: toNumber(typed.position),
      label: typed.label,
      pitchHp: toNumber(typed.pitchHp),
      boardId: typed.boardId === ANY ? null : typed.boardId,
    };
    if (slot.version === undefined) return save(values, { writeId: writeId.current, version: 0 });
    return stale.send((asked) => save(values, asked));
  }

  return (
    <Form<Fields, Value>
      label="Slot"
      schema={fields}
      defaults={{
        position: String(slot.position),
        label: slot.label,
        pitchHp: String(slot.pitchHp),
        boardId: slot.boardId ?? ANY,
      }}
      action={send}
      onDone={onDone}
      submitLabel={submitLabel}
      actions={<Button onPress={onCancel}>Cancel</Button>}
    >
      {(form) => (
        <>
          <div className="grid gap-4 sm:grid-cols-3">
            <FormTextField name="position" label="Position" inputMode="numeric" mono />
            <FormTextField
              name="pitchHp"
              label="Pitch"
              inputMode="decimal"
              mono
              suffix="HP"
              description="1 HP is 5.08 mm."
            />
            <FormTextField name="label" label="Label" maxLength={40} description="On the drawing, if any." />
          </div>
          <FormSelect
            name="boardId"
            label="Wired for"
            options={[
              { id: ANY, label: "Any card" },
              ...cards.map(({ id, code, name }) => ({ id, label: `${code} ${name}` })),
            ]}
          />
          {stale.theirs && (
            <TheirVersion
              rows={[
                { name: "Position", theirs: String(stale.theirs.position), yours: form.getValues("position") },
                { name: "Pitch", theirs: String(stale.theirs.pitchHp), yours: form.getValues("pitchHp") },
                { name: "Label", theirs: stale.theirs.label, yours: form.getValues("label") },
                { name: "Wired for", theirs: nameOf(stale.theirs.boardId), yours: nameOf(form.getValues("boardId")) },
              ]}
            />
          )}
        </>
      )}
    </Form>
  );
}
