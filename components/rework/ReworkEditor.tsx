"use client";

import Link from "next/link";
import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { DialogActions } from "@/components/ui/DialogActions";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { TextArea } from "@/components/ui/TextArea";
import { TextField } from "@/components/ui/TextField";
import type { ReworkKind } from "@/db/schema/faults";
import type { ReworkForm } from "@/lib/rework/load-rework-form";
import { KIND_LABELS } from "@/lib/rework/rework-words";
import { REWORK_KINDS, REWORK_LIMITS } from "@/lib/rework/schema";
import { DoubtList } from "./DoubtList";
import type { ReworkActs } from "./rework-acts";
import { TouchFields } from "./TouchFields";
import { useReworkEditor } from "./use-rework-editor";
import { WireFields } from "./WireFields";

type Props = { project: string; zone: string; form: ReworkForm; acts: ReworkActs };

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

/** A physical change is written down; what it puts in doubt stands beside it before it is saved. */
export function ReworkEditor({ project, zone, form, acts }: Props) {
  const editor = useReworkEditor({ project, form, acts });
  const { draft, change, preview, isFresh, isWorth, error, isPending } = editor;
  const { serial } = form.unit;
  const { carried } = form.start;
  const fields = error?.fields ?? {};
  const units = `/projects/${project}/units`;
  return (
    <Page
      title={
        <>
          A rework of <span className="mono text-[0.9em]">{serial}</span>{" "}
          <span className="text-ink-soft font-normal">
            {form.board.name}, rev {form.revision}
          </span>
        </>
      }
      lede="It stays on record for ever. Taking a wire out again is another rework."
    >
      <form
        noValidate
        aria-label={`A rework of ${serial}`}
        className="grid items-start gap-6 lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)]"
        onSubmit={(event) => {
          event.preventDefault();
          void editor.record();
        }}
      >
        <Panel>
          <div className="flex flex-col gap-5">
            {carried && (
              <Notice kind="info">
                Carried over from{" "}
                <Link
                  href={`${units}/${encodeURIComponent(carried.serial)}/reworks#R${carried.number}`}
                  className="link"
                >
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
        <div className="flex min-w-0 flex-col gap-4 lg:sticky lg:top-4">
          <DoubtList
            {...{ serial, zone, preview, isFresh, isWorth }}
            failure={editor.lookFailure}
            performedAt={draft.performedAt}
            added={draft.added}
            spared={draft.spared}
            onAdded={(added) => change({ added })}
            onSpared={(spared) => change({ spared })}
          />
          {error && <Notice kind="error">{error.message}</Notice>}
          <DialogActions className="mt-0">
            <ButtonLink href={`${units}/${encodeURIComponent(serial)}/reworks`}>Leave it</ButtonLink>
            <Button type="submit" kind="primary" isPending={isPending} isDisabled={!isFresh}>
              {saveLabel(isWorth, isFresh, preview?.doubtful.length ?? 0)}
            </Button>
          </DialogActions>
        </div>
      </form>
    </Page>
  );
}

function saveLabel(isWorth: boolean, isFresh: boolean, doubtful: number): string {
  if (!isWorth) return "Say first what it touches";
  if (!isFresh) return "Looking what it touches";
  if (doubtful === 0) return "Record it: nothing in doubt";
  return `Record it and doubt ${doubtful} ${doubtful === 1 ? "check" : "checks"}`;
}
