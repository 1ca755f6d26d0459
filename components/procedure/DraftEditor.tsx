"use client";

import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { IconButton } from "@/components/ui/IconButton";
import { Panel } from "@/components/ui/Panel";
import { ReorderList } from "@/components/ui/ReorderList";
import { toast } from "@/components/ui/toast-store";
import type { Stage } from "@/db/schema/procedures";
import type { CheckRow } from "@/lib/procedure/check-row";
import { STAGES } from "@/lib/procedure/stages";
import { CheckFacts } from "./CheckFacts";
import { CheckForm } from "./CheckForm";
import { draftOf, emptyDraft, fieldsOf } from "./check-draft";
import type { ProcedureActs } from "./procedure-acts";
import type { useDraftState } from "./use-draft-state";

type Props = { state: ReturnType<typeof useDraftState>; acts: ProcedureActs };
type Editing = { check: CheckRow } | { stage: Stage };

/** The draft by stage: pull or key a check to its place, open it to change it, delete it and take that back. */
export function DraftEditor({ state, acts }: Props) {
  const [editing, setEditing] = useState<Editing>();
  const { checks, setChecks, send } = state;
  const own = editing && "check" in editing ? editing.check.key : undefined;

  async function reorder(stage: Stage, ids: string[]) {
    const before = checks;
    const moved = ids.flatMap((key) => checks.find((check) => check.key === key) ?? []);
    const next = STAGES.flatMap(({ id }) => (id === stage ? moved : checks.filter((check) => check.stage === id)));
    setChecks(next);
    const reply = await send((asked) => acts.reorder({ ...asked, keys: next.map((check) => check.key) }));
    if (reply.ok) return;
    setChecks(before);
    toast({ text: reply.error.message, kind: "error" });
  }

  async function remove(check: CheckRow) {
    const after = checks[checks.indexOf(check) - 1]?.key ?? null;
    const reply = await send((asked) => acts.remove({ ...asked, key: check.key }));
    if (!reply.ok) return toast({ text: reply.error.message, kind: "error" });
    toast({ text: `“${check.title}” is deleted.`, undo: { run: () => bringBack(check, after, reply.value) } });
  }

  /** Under its own key and in its own place; what waited for it waits again. */
  async function bringBack(check: CheckRow, after: string | null, removed: { version: number; neededBy: string[] }) {
    let version = removed.version;
    const again = await send((asked) =>
      acts.save({ ...asked, version, key: check.key, after, check: fieldsOf(draftOf(check)) }),
    );
    if (!again.ok) return;
    version = again.value.version;
    for (const key of removed.neededBy) {
      const other = checks.find((one) => one.key === key);
      if (!other) continue;
      const at = version;
      const reply = await send((asked) =>
        acts.save({ ...asked, version: at, key, after: null, check: fieldsOf(draftOf(other)) }),
      );
      if (!reply.ok) return;
      version = reply.value.version;
    }
  }

  return (
    <div className="flex flex-col gap-4">
      {STAGES.map((stage) => {
        const rows = checks.filter((check) => check.stage === stage.id);
        return (
          <Panel
            key={stage.id}
            title={stage.name}
            note={rows.length === 0 ? stage.about : rows.length === 1 ? "1 check" : `${rows.length} checks`}
            actions={
              <Button size="sm" onPress={() => setEditing({ stage: stage.id })}>
                Add a check
              </Button>
            }
          >
            {rows.length === 0 ? (
              <p className="text-sm text-ink-soft">No check in this stage.</p>
            ) : (
              <ReorderList
                label={`Checks of the stage ${stage.name}, in order`}
                items={rows.map((check) => ({ id: check.key, check }))}
                nameOf={({ check }) => check.title}
                onReorder={(ids) => void reorder(stage.id, ids)}
              >
                {({ check }) => (
                  <div className="flex flex-wrap items-center justify-end gap-x-2">
                    <div className="min-w-0 flex-1 basis-64">
                      <CheckFacts check={check} number={checks.findIndex((one) => one.key === check.key) + 1} />
                    </div>
                    <Button
                      size="sm"
                      kind="quiet"
                      aria-label={`Change ${check.title}`}
                      onPress={() => setEditing({ check })}
                    >
                      Change
                    </Button>
                    <IconButton
                      icon="close"
                      size="sm"
                      label={`Delete ${check.title}`}
                      onPress={() => void remove(check)}
                    />
                  </div>
                )}
              </ReorderList>
            )}
          </Panel>
        );
      })}
      <Dialog
        title={own === undefined ? "Add a check" : "Change the check"}
        width="lg"
        isOpen={editing !== undefined}
        onOpenChange={(isOpen) => !isOpen && setEditing(undefined)}
        isDismissable={false}
      >
        {editing && (
          <CheckForm
            initial={"check" in editing ? draftOf(editing.check) : emptyDraft(editing.stage)}
            own={own}
            checks={checks}
            save={(check) => send((asked) => acts.save({ ...asked, key: own ?? null, after: null, check }))}
            onDone={() => {
              setEditing(undefined);
              toast({ text: "The draft is saved." });
            }}
            onCancel={() => setEditing(undefined)}
          />
        )}
      </Dialog>
    </div>
  );
}
