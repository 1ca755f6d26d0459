"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { z } from "zod";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { FormQuantityField, FormTextArea, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { toast } from "@/components/ui/toast-store";
import { TheirVersion } from "@/components/workshop/TheirVersion";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import type { PartLine } from "@/lib/part/load-parts";
import { priceText } from "@/lib/part/price";
import { savePartInput, type SavePartTyped } from "@/lib/part/schema";
import { LogicFields } from "./LogicFields";
import type { PartActs } from "./parts-acts";

type Props = { project: string; currency: string; part?: PartLine; save: PartActs["save"] };

/** Adds a part, or changes the one that is given. */
export function PartDialog({ part, ...rest }: Props) {
  const [isOpen, setOpen] = useState(false);
  return (
    <Dialog
      title={part ? `Change ${part.number}` : "Add a part"}
      width="lg"
      isDismissable={false}
      isOpen={isOpen}
      onOpenChange={setOpen}
      trigger={
        part ? (
          <Button size="sm" aria-label={`Change ${part.number}`}>
            Change
          </Button>
        ) : (
          <Button>Add a part</Button>
        )
      }
    >
      {(close) => <PartForm {...rest} {...(part ? { part } : {})} close={close} />}
    </Dialog>
  );
}

const fields = savePartInput.omit({ project: true, writeId: true, part: true, version: true });
type Fields = Omit<SavePartTyped, "project" | "writeId" | "part" | "version">;
const current = z.object({
  number: z.string(),
  description: z.string(),
  stock: z.int(),
  priceCents: z.int().nullable(),
  note: z.string(),
  version: z.int(),
});

function PartForm({ project, currency, part, save, close }: Props & { close: () => void }) {
  const router = useRouter();
  const stale = useStaleEdit(part?.version ?? 0, (details) => current.safeParse(details).data);
  const { theirs } = stale;
  return (
    <Form<Fields, { number: string; version: number }>
      label="Part"
      schema={fields}
      defaults={{
        number: part?.number ?? "",
        description: part?.description ?? "",
        stock: String(part?.stock ?? 0),
        price: part?.price ?? "",
        note: part?.note ?? "",
        logic: part?.typedLogic ?? null,
      }}
      action={(values) => stale.send((asked) => save({ project, part: part?.id ?? "", ...asked, ...values }))}
      onDone={({ number }) => {
        close();
        toast({ text: `${number} is kept.` });
        router.refresh();
      }}
      submitLabel="Save the part"
      actions={<Button onPress={close}>Close without saving</Button>}
    >
      {(form) => (
        <>
          <div className="grid gap-4 sm:grid-cols-[minmax(0,1fr)_minmax(0,1.6fr)]">
            <FormTextField name="number" label="Number" mono maxLength={80} placeholder="27C256-70" isRequired />
            <FormTextField name="description" label="What it is" maxLength={200} placeholder="Memory 32K × 8, 70 ns" />
          </div>
          <div className="grid grid-cols-2 gap-4 sm:grid-cols-[10rem_10rem]">
            <FormQuantityField name="stock" label="In stock" inputMode="numeric" maxLength={9} />
            <FormQuantityField name="price" label="Price of one" suffix={currency} maxLength={12} placeholder="0.45" />
          </div>
          <FormTextArea name="note" label="Note" rows={2} description="Where it lies, where it comes from." />
          <LogicFields />
          {theirs && (
            <TheirVersion
              rows={[
                { name: "Number", theirs: theirs.number, yours: form.getValues("number") },
                { name: "What it is", theirs: theirs.description, yours: form.getValues("description") },
                { name: "In stock", theirs: String(theirs.stock), yours: form.getValues("stock") },
                { name: "Price of one", theirs: priceText(theirs.priceCents), yours: form.getValues("price") },
                { name: "Note", theirs: theirs.note, yours: form.getValues("note") },
              ]}
            />
          )}
        </>
      )}
    </Form>
  );
}
