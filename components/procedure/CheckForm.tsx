"use client";

import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/Button";
import { Checkbox } from "@/components/ui/Checkbox";
import { DialogActions } from "@/components/ui/DialogActions";
import { Notice } from "@/components/ui/Notice";
import { RadioGroup } from "@/components/ui/RadioGroup";
import { Select } from "@/components/ui/Select";
import { TextArea } from "@/components/ui/TextArea";
import { TextField } from "@/components/ui/TextField";
import type { Reply } from "@/components/ui/form/reply";
import { CHECK_KINDS } from "@/lib/check-kinds/list";
import { SpecForm } from "@/lib/check-kinds/spec-forms";
import type { CheckRow } from "@/lib/procedure/check-row";
import type { CheckFields } from "@/lib/procedure/schema";
import { STAGES } from "@/lib/procedure/stages";
import { CheckPreview } from "./CheckPreview";
import { fieldsOf, problemsOf, type CheckDraft } from "./check-draft";
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
  const covered = (name: "signals" | "pins" | "rails" | "blocks") => ({
    value: draft[name],
    onChange: (value: string) => set({ [name]: value }),
    error: problem(`covers.${name}`) ?? firstUnder(problems, `check.covers.${name}.`),
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
        <RadioGroup
          label="Kind of check"
          value={draft.kind}
          onChange={(id) => {
            const next = CHECK_KINDS.find((one) => one.name === id);
            if (next && next.name !== draft.kind) set({ kind: next.name, typed: next.emptyTyped });
          }}
          options={CHECK_KINDS.map(({ name, label, description }) => ({ id: name, label, description }))}
        />
        <div className="rounded-md border border-rule bg-raised/60 p-4">
          <SpecForm
            kind={draft.kind}
            value={draft.typed}
            onChange={(typed) => set({ typed })}
            errors={under(problems, "check.typed.")}
          />
        </div>
        <Checkbox
          label="Hold point"
          description="Nothing after it can be recorded until it holds, or a maintainer lifts it for one unit."
          value={draft.holdPoint}
          onChange={(holdPoint) => set({ holdPoint })}
        />
        <fieldset className="flex flex-col gap-3">
          <legend className="mb-1 text-sm font-semibold">What it proves</legend>
          <p className="text-sm text-ink-soft">
            Separated by commas. A rework that touches one of these puts the check in doubt; pins light up on the bench.
          </p>
          <div className="grid gap-3 sm:grid-cols-2">
            <TextField label="Signals" mono placeholder="CLK, PH7" {...covered("signals")} />
            <TextField label="Pins" mono placeholder="J1 a4, J1 c4" {...covered("pins")} />
            <TextField label="Rails" mono placeholder="+5 V, GND" {...covered("rails")} />
            <TextField label="Blocks" mono placeholder="divider" {...covered("blocks")} />
          </div>
        </fieldset>
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

/** Problems under a path, with the path cut off: what the kind's own form expects. */
function under(problems: Record<string, string>, path: string): Record<string, string> {
  return Object.fromEntries(
    Object.entries(problems)
      .filter(([name]) => name.startsWith(path))
      .map(([name, sentence]) => [name.slice(path.length), sentence]),
  );
}

const firstUnder = (problems: Record<string, string>, path: string) => Object.values(under(problems, path))[0];
