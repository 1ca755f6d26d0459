"use client";

import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/Button";
import { Checkbox } from "@/components/ui/Checkbox";
import { DialogActions } from "@/components/ui/DialogActions";
import { Notice } from "@/components/ui/Notice";
import { Select } from "@/components/ui/Select";
import { TextArea } from "@/components/ui/TextArea";
import { TextField } from "@/components/ui/TextField";
import type { Reply } from "@/components/ui/form/reply";
import type { CheckRow } from "@/lib/procedure/check-row";
import type { CheckFields } from "@/lib/procedure/schema";
import { STAGES } from "@/lib/procedure/stages";
import { CheckPreview } from "./CheckPreview";
import { fieldsOf, problemsOf, type CheckDraft } from "./check-draft";
import { CoversFields } from "./CoversFields";
import { KindFields } from "./KindFields";
import { NeedsField } from "./NeedsField";
import { TheirCheck } from "./TheirCheck";

type Props = {
  initial: CheckDraft;
  /** Key of the check that is changed; undefined for a new one. */
  own: string | undefined;
  checks: readonly CheckRow[];
  save: (check: CheckFields) => Promise<Reply<unknown>>;
  onDone: () => void;
  onCancel: () => void;
};

/** What is checked, how, and what it proves; beside it the check as it will stand on the bench. */
export function CheckForm({ initial, own, checks, save, onDone, onCancel }: Props) {
  const [draft, setDraft] = useState(initial);
  const [problems, setProblems] = useState<Record<string, string>>({});
  const [failure, setFailure] = useState<{ code: string; message: string }>();
  const [isPending, setPending] = useState(false);
  const set = (change: Partial<CheckDraft>) => setDraft((was) => ({ ...was, ...change }));
  const problem = (name: string) => problems[`check.${name}`];
  const text = (name: "title" | "instruction" | "caution" | "reference") => ({
    value: draft[name],
    onChange: (value: string) => set({ [name]: value }),
    error: problem(name),
  });

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    const form = event.currentTarget;
    const found = problemsOf(draft);
    setProblems(found);
    if (Object.keys(found).length > 0) {
      setFailure({ code: "invalid", message: "Something needs another look; it is marked." });
      requestAnimationFrame(() => form.querySelector<HTMLElement>("[aria-invalid=true]")?.focus());
      return;
    }
    setPending(true);
    const reply = await save(fieldsOf(draft)).finally(() => setPending(false));
    if (reply.ok) return onDone();
    setProblems(reply.error.fields ?? {});
    setFailure(reply.error);
  }

  return (
    <div className="grid gap-x-8 gap-y-5 lg:grid-cols-[minmax(0,1fr)_21rem]">
      <form
        noValidate
        aria-label="Check"
        onSubmit={(event) => void submit(event)}
        className="flex min-w-0 flex-col gap-4"
      >
        <Select
          label="Stage"
          value={draft.stage}
          onChange={(id) => set({ stage: STAGES.find((stage) => stage.id === id)?.id ?? draft.stage })}
          options={STAGES.map(({ id, name, about }) => ({ id, label: name, description: about }))}
          error={problem("stage")}
        />
        <TextField label="Title" maxLength={200} isRequired autoFocus {...text("title")} />
        <TextArea
          label="Instruction"
          rows={4}
          description="What to do, in the order in which hands do it."
          {...text("instruction")}
        />
        <TextArea
          label="Caution"
          rows={2}
          description="What can hurt people or parts in this step. Stands beside it on the bench."
          {...text("caution")}
        />
        <KindFields draft={draft} problems={problems} onChange={set} />
        <Checkbox
          label="Hold point"
          description="Nothing after it can be recorded until it holds, or a maintainer lifts it for one unit."
          value={draft.holdPoint}
          onChange={(holdPoint) => set({ holdPoint })}
        />
        <CoversFields draft={draft} problems={problems} onChange={set} />
        <NeedsField
          value={draft.needs}
          onChange={(needs) => set({ needs })}
          error={problem("needs")}
          others={checks.filter((check) => check.key !== own)}
        />
        <TextField label="Reference" maxLength={200} placeholder="IPC-A-610, in outline" {...text("reference")} />
        {failure && (
          <div ref={intoView}>
            <Notice kind="error">{failure.message}</Notice>
          </div>
        )}
        {failure?.code === "conflict" && own !== undefined && (
          <TheirCheck theirs={checks.find((check) => check.key === own)} yours={draft} />
        )}
        <DialogActions className="mt-1!">
          <Button onPress={onCancel}>Cancel</Button>
          <Button type="submit" kind="primary" isPending={isPending}>
            {own === undefined ? "Add the check" : "Save the check"}
          </Button>
        </DialogActions>
      </form>
      <CheckPreview draft={draft} />
    </div>
  );
}

/** Of one identity, so that it scrolls when the sentence appears and not at every key press after. */
const intoView = (node: HTMLElement | null) => node?.scrollIntoView({ block: "center" });
