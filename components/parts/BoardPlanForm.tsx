"use client";

import { useEffect } from "react";
import { useWatch } from "react-hook-form";
import { z } from "zod";
import { FormQuantityField, FormRadioGroup, FormSelect } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { Notice } from "@/components/ui/Notice";
import { counted } from "@/components/workshop/counted";
import { useStaleEdit } from "@/components/workshop/use-stale-edit";
import type { BoardPlanView } from "@/lib/board-plan/load-board-plan";
import { saveBoardPlanInput, type SaveBoardPlanTyped } from "@/lib/board-plan/schema";
import { CountedRows } from "./CountedRows";
import { packDraft, type PlanDraft } from "./pack-draft";
import type { BoardPlanActs } from "./parts-acts";

const fields = saveBoardPlanInput.omit({ project: true, writeId: true, board: true, version: true });
type Fields = Omit<SaveBoardPlanTyped, "project" | "writeId" | "board" | "version">;
const current = z.object({ version: z.int() });

type Saved = { version: number; tiesReopened: boolean };
type Props = {
  project: string;
  view: BoardPlanView;
  save: BoardPlanActs["save"];
  onDraft: (draft: PlanDraft) => void;
  onSaved: (saved: Saved) => void;
};

/** Which blocks the board uses and how its packages are counted; beside it they are counted as one types. */
export function BoardPlanForm({ project, view, save, onDraft, onSaved }: Props) {
  const stale = useStaleEdit(view.version, (details) => current.safeParse(details).data);
  const { board, choices, families, units } = view;
  return (
    <Form<Fields, Saved>
      label="Plan of the board"
      schema={fields}
      defaults={view.plan}
      action={(values) => stale.send((asked) => save({ project, board: board.code, ...asked, ...values }))}
      onDone={onSaved}
      submitLabel="Save the plan"
    >
      <CountedRows
        name="blocks"
        of="block"
        legend="Blocks on the board"
        what="Block"
        options={choices}
        addLabel="Add a block"
        whenEmpty={choices.length === 0 ? "There are no blocks yet. Write one down first, under Blocks." : "None yet."}
        most={100}
      />
      <Sharing view={view} />
      <div className="grid gap-4 sm:grid-cols-2">
        <FormSelect
          name="family"
          label="Family"
          options={families.map(({ name, description }) => ({ id: name, label: name, description }))}
        />
        <FormQuantityField
          name="unitsPlanned"
          label="Units to build"
          inputMode="numeric"
          placeholder={String(units.length)}
          description={`Empty: as many as there are, ${units.length}.`}
        />
      </div>
      <fieldset className="min-w-0">
        <legend className="text-sm font-semibold">For the power plan</legend>
        <div className="mt-1.5 grid gap-4 sm:grid-cols-2">
          <FormQuantityField name="clockHz" label="Clock" placeholder="1.8432 MHz" />
          <FormQuantityField name="activity" label="Outputs that move" placeholder="25 %" />
          <FormQuantityField name="loadPf" label="Load of an output" placeholder="50 pF" />
        </div>
      </fieldset>
      {stale.theirs && (
        <Notice kind="reopened">
          What you typed is still here. Save again to put it in place of theirs, or reload the page to look at it first.
        </Notice>
      )}
      <Watch onDraft={onDraft} />
    </Form>
  );
}

function Sharing({ view }: { view: BoardPlanView }) {
  const [packing, family, blocks] = useWatch<Fields, ["packing", "family", "blocks"]>({
    name: ["packing", "family", "blocks"],
  });
  const packed = packDraft(view, { packing, family, blocks });
  const counts = packed.ok ? packed.packing : undefined;
  const text = (count: number | undefined) =>
    count === undefined || count === 0 ? "" : `: ${counted(count, "package")}`;
  return (
    <FormRadioGroup
      name="packing"
      label="Packages are"
      description={
        counts && counts.poolingSaves > 0
          ? `Sharing saves ${counts.poolingSaves === 1 ? "one package" : `${counts.poolingSaves} packages`}; apart, a block can be tried and repaired alone.`
          : undefined
      }
      options={[
        { id: "pooled", label: `shared by all blocks${text(counts?.pooledCount)}` },
        { id: "per-block", label: `each block’s own${text(counts?.perBlockCount)}` },
      ]}
    />
  );
}

function Watch({ onDraft }: { onDraft: (draft: PlanDraft) => void }) {
  const [packing, family, blocks] = useWatch<Fields, ["packing", "family", "blocks"]>({
    name: ["packing", "family", "blocks"],
  });
  useEffect(() => onDraft({ packing, family, blocks }), [packing, family, blocks, onDraft]);
  return null;
}
