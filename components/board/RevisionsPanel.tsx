"use client";

import Link from "next/link";
import { useRef } from "react";
import { Badge } from "@/components/ui/Badge";
import { Button } from "@/components/ui/Button";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { DateTime } from "@/components/ui/DateTime";
import { Dialog } from "@/components/ui/Dialog";
import { Panel } from "@/components/ui/Panel";
import { FormTextArea } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import type { BoardView } from "@/lib/board/load-board";
import { createRevisionInput } from "@/lib/board/schema";
import type { RevisionActs } from "./board-acts";
import { useAct } from "./use-act";

type Props = { project: string; zone: string; board: BoardView; canEdit: boolean; acts: RevisionActs };

export function RevisionsPanel({ project, zone, board, canEdit, acts }: Props) {
  const { act } = useAct();
  return (
    <Panel
      title="Revisions"
      actions={
        canEdit && (
          <Dialog title="Begin a new revision" width="sm" trigger={<Button size="sm">New revision</Button>}>
            {(close) => <NewRevision {...{ project, board, acts, close }} />}
          </Dialog>
        )
      }
    >
      <ul className="flex flex-col gap-3">
        {board.revisions.map((revision) => (
          <li key={revision.id} className="flex flex-col gap-1 border-b border-rule pb-3 last:border-b-0 last:pb-0">
            <span className="flex flex-wrap items-center gap-2">
              <span className="mono font-semibold">{revision.letter}</span>
              {revision.releasedAt ? <Badge tone="passed">released</Badge> : <Badge>in design</Badge>}
              <span className="text-sm text-ink-soft">
                {revision.units === 1 ? "1 unit" : `${revision.units} units`}
              </span>
            </span>
            {revision.releasedAt && (
              <span className="text-sm text-ink-soft">
                Released <DateTime at={revision.releasedAt} zone={zone} form="day" />
              </span>
            )}
            {revision.notes && <p className="whitespace-pre-line text-sm text-ink-soft">{revision.notes}</p>}
            {canEdit && !revision.releasedAt && (
              <ConfirmDialog
                title={`Release revision ${revision.letter} of ${board.name}?`}
                trigger={
                  <Button size="sm" className="self-start">
                    Release {revision.letter}
                  </Button>
                }
                kind="primary"
                consequences={[
                  "It says: this design is final and can be ordered. It cannot be taken back.",
                  "The next change of the design is a new revision.",
                ]}
                confirmLabel={`Release ${revision.letter}`}
                onConfirm={() =>
                  act(
                    () => acts.release({ project, writeId: crypto.randomUUID(), revisionId: revision.id }),
                    ({ letter }) => `Revision ${letter} is released.`,
                  )
                }
              />
            )}
          </li>
        ))}
      </ul>
      <Link
        href={`/projects/${project}/boards/${encodeURIComponent(board.code)}/netlists`}
        className="link mt-3 inline-block text-sm font-semibold"
      >
        Netlists of the revisions
      </Link>
    </Panel>
  );
}

const fields = createRevisionInput.pick({ notes: true });

function NewRevision({
  project,
  board,
  acts,
  close,
}: Pick<Props, "project" | "board" | "acts"> & { close: () => void }) {
  const { act } = useAct();
  const writeId = useRef(crypto.randomUUID());
  return (
    <Form
      label="New revision"
      schema={fields}
      defaults={{ notes: "" }}
      action={({ notes }) => acts.create({ project, writeId: writeId.current, boardId: board.id, notes })}
      onDone={(value) => {
        close();
        void act(
          async () => ({ ok: true, value }),
          ({ letter }) => `Revision ${letter} is begun.`,
        );
      }}
      submitLabel="Begin the revision"
      actions={<Button onPress={close}>Cancel</Button>}
    >
      <p className="text-[0.9375rem] text-ink-soft">
        It gets the next letter. Units made from it begin a traveler of their own.
      </p>
      <FormTextArea name="notes" label="What changes" rows={4} />
    </Form>
  );
}
