"use client";

import { stageRoom } from "@/components/rack/CardStages";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import { Disclosure } from "@/components/workshop/Disclosure";
import type { BoardView } from "@/lib/board/load-board";
import type { UnitActs } from "./board-acts";
import { ArchivedUnit } from "./ArchivedUnit";
import { UnitForm } from "./UnitForm";
import { UnitRow } from "./UnitRow";
import { useAct } from "./use-act";

type Props = { project: string; board: BoardView; canEdit: boolean; canPurge: boolean; acts: UnitActs };

export function UnitsPanel({ project, board, canEdit, canPurge, acts }: Props) {
  const { act } = useAct();
  const inWork = board.units.filter((unit) => !unit.archived);
  const archived = board.units.filter((unit) => unit.archived);
  const room = stageRoom(inWork);
  const add = (
    <Dialog title="Make a unit" trigger={<Button kind="primary">Make a unit</Button>}>
      {(close) => (
        <UnitForm
          unit={{ serial: board.nextSerial, revisionId: board.revisions[0]?.id ?? "", note: "" }}
          revisions={board.revisions}
          submitLabel="Make the unit"
          save={(values, { writeId }) => acts.create({ project, writeId, boardId: board.id, ...values })}
          onCancel={close}
          onDone={(value) => {
            close();
            void act(
              async () => ({ ok: true, value }),
              ({ serial }) =>
                board.issued
                  ? `${serial} is there, with its traveler.`
                  : `${serial} is there. It gets its traveler when a procedure is issued.`,
            );
          }}
        />
      )}
    </Dialog>
  );
  return (
    <Panel
      title="Units"
      note={inWork.length > 0 ? String(inWork.length) : undefined}
      actions={canEdit && inWork.length > 0 && add}
    >
      {inWork.length === 0 ? (
        <EmptyState title={archived.length > 0 ? "No units in work" : "No units yet"} action={canEdit && add}>
          <p>
            A unit is one physical copy with a serial number. Checks are carried out on units; each has its own
            traveler.
          </p>
        </EmptyState>
      ) : (
        <ul className="@container flex flex-col">
          {inWork.map((unit) => (
            <UnitRow key={unit.id} {...{ unit, project, board, canEdit, acts, room }} />
          ))}
        </ul>
      )}
      {archived.length > 0 && (
        <div className="mt-3">
          <Disclosure summary={archived.length === 1 ? "1 archived unit" : `${archived.length} archived units`}>
            <ul className="flex flex-col gap-2">
              {archived.map((unit) => (
                <ArchivedUnit key={unit.id} {...{ project, unit, acts }} can={{ restore: canEdit, purge: canPurge }} />
              ))}
            </ul>
          </Disclosure>
        </div>
      )}
    </Panel>
  );
}
