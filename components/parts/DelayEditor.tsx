"use client";

import { useWatch } from "react-hook-form";
import { z } from "zod";
import { Button } from "@/components/ui/Button";
import { FormQuantityField, FormSelect, FormTextField } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { Notice } from "@/components/ui/Notice";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import type { DelayPathLine, DelayView } from "@/lib/delay-path/load-delay-paths";
import { saveDelayPathInput, typedPath, type SaveDelayPathTyped } from "@/lib/delay-path/schema";
import { workOut } from "@/lib/delay-path/work-out";
import { DelayConditions } from "./DelayConditions";
import { DelayResult } from "./DelayResult";
import { EMPTY_PATH } from "./delay-draft";
import { RippleSteps } from "./RippleSteps";
import { StepRows } from "./StepRows";
import type { DelayActs } from "./parts-acts";

const fields = saveDelayPathInput.omit({ project: true, writeId: true, id: true, version: true });
export type DelayFields = Omit<SaveDelayPathTyped, "project" | "writeId" | "id" | "version">;
const current = z.object({ name: z.string(), version: z.int() });
const NONE = "none";

type Props = {
  project: string;
  view: DelayView;
  line: DelayPathLine | undefined;
  save: DelayActs["save"];
  onSaved: () => void;
  onCancel: () => void;
};

export function DelayEditor({ project, view, line, save, onSaved, onCancel }: Props) {
  const stale = useStaleEdit(line?.version ?? 0, (details) => current.safeParse(details).data);
  return (
    <Form<DelayFields, { id: string; version: number }>
      label={line ? `Path ${line.name}` : "New path"}
      schema={fields}
      defaults={{ name: line?.name ?? "", board: line?.board || NONE, path: line?.typed ?? EMPTY_PATH }}
      action={({ board, ...values }) =>
        stale.send((asked) =>
          save({ project, id: line?.id ?? "", ...asked, ...values, board: board === NONE ? "" : board }),
        )
      }
      onDone={onSaved}
      submitLabel="Save the path"
      actions={<Button onPress={onCancel}>Leave it as it was</Button>}
    >
      <div className="grid gap-4 sm:grid-cols-[minmax(0,1.3fr)_minmax(0,1fr)_minmax(0,1.6fr)]">
        <FormTextField name="name" label="Name" maxLength={80} placeholder="Carry through the sum" isRequired />
        <FormSelect
          name="board"
          label="Measured on"
          options={[
            { id: NONE, label: "No board" },
            ...view.boards.map(({ code, name }) => ({ id: code, label: `${code} ${name}` })),
          ]}
        />
        <FormTextField
          name="path.measure"
          label="From where to where"
          maxLength={120}
          placeholder="A0 rising to S15, at 50 %"
        />
      </div>
      <StepRows view={view} />
      <RippleSteps view={view} />
      <fieldset className="min-w-0">
        <legend className="text-sm font-semibold">Where a part has no figure</legend>
        <p className="mt-0.5 text-sm text-ink-soft">
          Take this share of its typical delay: common practice, no source. Empty leaves that side open.
        </p>
        <div className="mt-2 grid gap-4 sm:grid-cols-[10rem_10rem]">
          <FormQuantityField name="path.unknownMinShare" label="for the lowest" placeholder="25 %" />
          <FormQuantityField name="path.unknownMaxShare" label="for the highest" placeholder="200 %" />
        </div>
      </fieldset>
      <DelayConditions view={view} />
      <Live view={view} />
      {stale.theirs && (
        <Notice kind="reopened">
          What you typed is still here. Save again to put it in place of theirs, or reload the page to look at it first.
        </Notice>
      )}
    </Form>
  );
}

/** What the typed path comes to, with the same code as on the server. */
function Live({ view }: { view: DelayView }) {
  const path = useWatch<DelayFields, "path">({ name: "path" });
  const read = typedPath.safeParse(path);
  const worked = read.success && read.data.steps.length > 0 ? workOut(read.data, view) : undefined;
  return (
    <section
      aria-label="What it comes to"
      aria-live="polite"
      className="rounded border border-rule bg-raised px-4 py-3.5"
    >
      {worked?.ok && <DelayResult worked={worked} />}
      {worked && !worked.ok && <p className="text-[0.9375rem] text-ink-soft">{worked.message}</p>}
      {!worked && (
        <p className="text-[0.9375rem] text-ink-soft">
          {read.success ? "Add the parts that the signal passes; the sums stand here." : read.error.issues[0]?.message}
        </p>
      )}
    </section>
  );
}
