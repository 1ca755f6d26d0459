"use client";

import type { ReactNode } from "react";
import { useWatch } from "react-hook-form";
import { z } from "zod";
import { FormTextArea, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { TheirVersion } from "@/components/workshop/TheirVersion";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import { MOST_ROWS, saveBlockInput } from "@/lib/block/schema";
import type { BlockView } from "@/lib/block/load-block";
import { BlockConsequences } from "./BlockConsequences";
import { CountedRows } from "./CountedRows";
import { draftGates, isOtherContents } from "./block-draft";
import type { BlockActs } from "./parts-acts";

const fields = saveBlockInput.omit({ project: true, writeId: true, block: true, version: true });
type Fields = z.input<typeof fields>;

const counted = z.object({ count: z.number() });
const current = z.object({
  name: z.string(),
  summary: z.string(),
  gates: z.array(counted.extend({ gateFunction: z.string() })),
  children: z.array(counted.extend({ block: z.string() })),
  version: z.int(),
});

type Saved = { id: string; version: number; outdated: string[]; tiesReopened: string[] };
type Props = {
  project: string;
  view: BlockView;
  save: BlockActs["save"];
  onSaved: (saved: Saved) => void;
  actions: ReactNode;
};

/** One form to write a block down and to change it. What a change touches stands above the button before it is saved. */
export function BlockEditor({ project, view, save, onSaved, actions }: Props) {
  const { block, functions, choices } = view;
  const stale = useStaleEdit(block?.version ?? 0, (details) => current.safeParse(details).data);
  const defaults: Fields = {
    name: block?.name ?? "",
    summary: block?.summary ?? "",
    gates: (block?.gates ?? []).map(({ gateFunction, count }) => ({ gateFunction, count: String(count) })),
    children: (block?.children ?? []).map(({ block: id, count }) => ({ block: id, count: String(count) })),
  };
  const nameOf = (id: string) => [...functions, ...choices].find((choice) => choice.id === id)?.label ?? id;
  const text = (rows: readonly { count: number | string; named: string }[]) =>
    rows.map(({ count, named }) => `${count} × ${nameOf(named)}`).join(", ");
  return (
    <Form<Fields, Saved>
      label={block ? `Block ${block.name}` : "New block"}
      schema={fields}
      defaults={defaults}
      action={(values) => stale.send((asked) => save({ project, block: block?.id ?? "", ...asked, ...values }))}
      onDone={onSaved}
      submitLabel={block ? "Save the block" : "Add the block"}
      actions={actions}
    >
      {(form) => (
        <>
          <FormTextField name="name" label="Name" maxLength={80} placeholder="Full adder" isRequired />
          <FormTextArea name="summary" label="What it does" rows={2} />
          <div className="grid items-start gap-x-8 gap-y-5 md:grid-cols-2">
            <CountedRows
              name="gates"
              of="gateFunction"
              legend="Gates of its own"
              what="Gate"
              options={functions}
              addLabel="Add gates"
              whenEmpty="None: it is made of other blocks only."
              most={MOST_ROWS}
            />
            <CountedRows
              name="children"
              of="block"
              legend="Blocks inside it"
              what="Block"
              options={choices}
              addLabel="Add a block inside"
              whenEmpty="None."
              most={MOST_ROWS}
            />
          </div>
          <Live view={view} defaults={defaults} />
          {stale.theirs && (
            <TheirVersion
              rows={[
                { name: "Name", theirs: stale.theirs.name, yours: form.getValues("name") },
                { name: "What it does", theirs: stale.theirs.summary, yours: form.getValues("summary") },
                {
                  name: "Gates",
                  theirs: text(stale.theirs.gates.map((row) => ({ ...row, named: row.gateFunction }))),
                  yours: text(form.getValues("gates").map((row) => ({ ...row, named: row.gateFunction }))),
                },
                {
                  name: "Blocks",
                  theirs: text(stale.theirs.children.map((row) => ({ ...row, named: row.block }))),
                  yours: text(form.getValues("children").map((row) => ({ ...row, named: row.block }))),
                },
              ]}
            />
          )}
        </>
      )}
    </Form>
  );
}

/** What the typed counts come to, and whom the change concerns. */
function Live({ view, defaults }: { view: BlockView; defaults: Fields }) {
  const [gates, children] = useWatch<Fields, ["gates", "children"]>({ name: ["gates", "children"] });
  const totals = draftGates({ gates, children }, view);
  const sum = totals.reduce((total, { count }) => total + count, 0);
  return (
    <>
      <p className="rounded border border-rule bg-raised px-3 py-2 text-[0.9375rem]" aria-live="polite">
        {sum === 0 ? (
          <span className="text-ink-soft">Nothing is counted yet.</span>
        ) : (
          <>
            Comes to <span className="mono text-sm font-semibold">{sum}</span> {sum === 1 ? "gate" : "gates"}
            <span className="text-ink-soft">: {totals.map(({ name, count }) => `${count} × ${name}`).join(", ")}.</span>
          </>
        )}
      </p>
      {isOtherContents({ gates, children }, defaults) && <BlockConsequences view={view} />}
    </>
  );
}
