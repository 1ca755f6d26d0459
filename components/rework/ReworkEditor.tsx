"use client";

import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { DialogActions } from "@/components/ui/DialogActions";
import { Notice } from "@/components/ui/Notice";
import type { ReworkForm } from "@/lib/rework/load-rework-form";
import { DoubtList } from "./DoubtList";
import type { ReworkActs } from "./rework-acts";
import { ReworkFields } from "./ReworkFields";
import { useReworkEditor } from "./use-rework-editor";

type Props = { project: string; zone: string; form: ReworkForm; acts: ReworkActs };

/** A physical change is written down; what it puts in doubt stands beside it before it is saved. */
export function ReworkEditor({ project, zone, form, acts }: Props) {
  const editor = useReworkEditor({ project, form, acts });
  const { draft, change, preview, isFresh, isWorth, error, isPending } = editor;
  const { serial } = form.unit;
  const units = `/projects/${project}/units`;
  return (
    <Page
      title={
        <>
          A rework of <span className="whitespace-nowrap">{serial}</span>{" "}
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
        <ReworkFields {...{ project, form, draft, change }} fields={error?.fields ?? {}} />
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
