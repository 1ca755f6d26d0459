"use client";

import Link from "next/link";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { TextArea } from "@/components/ui/TextArea";
import { TextField } from "@/components/ui/TextField";
import type { ReworkKind } from "@/db/schema/faults";
import type { ReworkForm } from "@/lib/rework/load-rework-form";
import { KIND_LABELS } from "@/lib/rework/rework-words";
import { REWORK_KINDS, REWORK_LIMITS } from "@/lib/rework/schema";
import type { ReworkDraft } from "./rework-draft";
import { TouchFields } from "./TouchFields";
import { WireFields } from "./WireFields";

type Props = {
  project: string;
  form: ReworkForm;
  draft: ReworkDraft;
  change: (part: Partial<ReworkDraft>) => void;
  /** Sentences by field. */
  fields: Record<string, string>;
};

const NO_FAULT = "none";
const KINDS = REWORK_KINDS.map((id) => ({ id, label: KIND_LABELS[id] }));
const isKind = (id: string): id is ReworkKind => KINDS.some((kind) => kind.id === id);

const EXAMPLES: Record<ReworkKind, string> = {
  "bodge-wire": "PH7 cut at U6 and led to U9 by wire",
  "cut-track": "Track from U6-12 to the via cut",
  "part-swap": "U6 replaced, the old one ran hot",
  reflow: "Pins 9 to 14 of U6 reflowed",
  firmware: "Sine table 8 in U4 and U5",
  connector: "J1 a14 crimped again",
};

/** What was done, why, for which fault, and what it touches. */
export function ReworkFields({ project, form, draft, change, fields }: Props) {
  const { serial } = form.unit;
  const { carried } = form.start;
  const units = `/projects/${project}/units`;
  return (
    <Panel>
      <div className="flex flex-col gap-5">
        {carried && (
          <Notice kind="info">
            Carried over from{" "}
            <Link href={`${units}/${encodeURIComponent(carried.serial)}/reworks#R${carried.number}`} className="link">
              R{carried.number} of {carried.serial}
            </Link>
            . What it puts in doubt on {serial} is worked out anew.
          </Notice>
        )}
        <div className="grid items-start gap-x-5 gap-y-4 sm:grid-cols-2">
          <Select
            label="Kind"
            options={KINDS}
            value={draft.kind}
            onChange={(id) => isKind(id) && change({ kind: id })}
          />
          <Select
            label="For the fault"
            options={[
              { id: NO_FAULT, label: "None" },
              ...form.faults.map(({ id, number, title }) => ({ id, label: `F${number} ${title}` })),
            ]}
            value={draft.faultId === "" ? NO_FAULT : draft.faultId}
            onChange={(id) => change({ faultId: id === NO_FAULT ? "" : id })}
          />
        </div>
        {draft.kind === "bodge-wire" && (
          <WireFields wire={draft.wire} onChange={(wire) => change({ wire })} fields={fields} />
        )}
        <TextField
          label="What was done"
          placeholder={EXAMPLES[draft.kind]}
          isRequired
          maxLength={REWORK_LIMITS.what}
          value={draft.what}
          onChange={(what) => change({ what })}
          error={fields.what}
        />
        <TextArea
          label="Why"
          rows={2}
          maxLength={REWORK_LIMITS.why}
          value={draft.why}
          onChange={(why) => change({ why })}
          error={fields.why}
        />
        <TouchFields
          names={form.names}
          touches={draft.touches}
          onChange={(touches) => change({ touches })}
          error={fields.touches}
        />
        <TextField
          type="datetime-local"
          label="When it was done"
          description="Empty is now. By the clock of this device."
          value={draft.performedAt}
          onChange={(performedAt) => change({ performedAt })}
          error={fields.performedAt}
          className="sm:max-w-64"
        />
      </div>
    </Panel>
  );
}
