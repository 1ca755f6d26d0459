"use client";

import Link from "next/link";
import { useState } from "react";
import { CardStages, stageRoom } from "@/components/rack/CardStages";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { EmptyState } from "@/components/ui/EmptyState";
import { IconButton } from "@/components/ui/IconButton";
import { Menu } from "@/components/ui/Menu";
import { Panel } from "@/components/ui/Panel";
import { Disclosure } from "@/components/workshop/Disclosure";
import type { BoardUnit, BoardView } from "@/lib/board/load-board";
import type { UnitActs } from "./board-acts";
import { UnitForm } from "./UnitForm";
import { useAct } from "./use-act";

type Props = { project: string; board: BoardView; canEdit: boolean; acts: UnitActs };

export function UnitsPanel({ project, board, canEdit, acts }: Props) {
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
        <EmptyState title="No units yet" action={canEdit && add}>
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
                <li key={unit.id} className="flex flex-wrap items-center gap-3">
                  <Link href={`/projects/${project}/units/${unit.serial}`} className="link mono text-sm">
                    {unit.serial}
                  </Link>
                  {canEdit && (
                    <Button
                      size="sm"
                      onPress={() =>
                        void act(
                          () => acts.restore({ project, writeId: crypto.randomUUID(), unitId: unit.id }),
                          ({ serial }) => `${serial} is back.`,
                        )
                      }
                    >
                      Restore
                    </Button>
                  )}
                </li>
              ))}
            </ul>
          </Disclosure>
        </div>
      )}
    </Panel>
  );
}

type RowProps = Props & { unit: BoardUnit; room: readonly number[] };

function UnitRow({ unit, project, board, canEdit, acts, room }: RowProps) {
  const { act } = useAct();
  const [isEditing, setEditing] = useState(false);
  const write = () => ({ project, writeId: crypto.randomUUID(), unitId: unit.id });
  const archive = () =>
    act(
      () => acts.archive(write()),
      ({ serial }) => `${serial} is archived${unit.position === null ? "" : ` and out of slot ${unit.position}`}.`,
      () =>
        act(
          () => acts.restore(write()),
          ({ serial }) => `${serial} is back, in no slot.`,
        ),
    );
  return (
    <li className="flex items-center gap-3 border-b border-rule py-3 last:border-b-0 last:pb-0">
      <div className="grid min-w-0 flex-1 items-center gap-x-4 gap-y-2 @2xl:grid-cols-[9rem_minmax(0,1fr)]">
        <div className="flex min-w-0 flex-col">
          <Link
            href={`/projects/${project}/units/${unit.serial}`}
            className="link mono w-fit text-[0.9375rem] font-semibold"
          >
            {unit.serial}
          </Link>
          <span className="text-sm text-ink-soft">
            rev {unit.revision}, {unit.position === null ? "in no slot" : `slot ${unit.position}`}
          </span>
          {unit.procedure !== null && unit.procedure !== board.issued?.number && (
            <span className="text-sm text-ink-soft">procedure version {unit.procedure}</span>
          )}
        </div>
        <div className="hidden @2xl:block">
          <CardStages unit={unit} room={room} />
        </div>
        <div className="@2xl:hidden">
          <CardStages unit={unit} layout="flow" />
        </div>
        {unit.note && <p className="col-span-full line-clamp-2 text-sm text-ink-soft">{unit.note}</p>}
      </div>
      {canEdit && (
        <Menu
          label={unit.serial}
          trigger={<IconButton icon="more" label={`More for ${unit.serial}`} size="sm" tooltip={false} />}
          entries={[
            { id: "edit", label: "Change the unit", onAction: () => setEditing(true) },
            { id: "archive", label: "Archive the unit", isDanger: true, onAction: () => void archive() },
          ]}
        />
      )}
      <Dialog title={`Change ${unit.serial}`} isOpen={isEditing} onOpenChange={setEditing}>
        {(close) => (
          <UnitForm
            unit={unit}
            revisions={board.revisions}
            submitLabel="Save the unit"
            save={(values, asked) => acts.edit({ project, unitId: unit.id, ...asked, ...values })}
            onCancel={close}
            onDone={(value) => {
              close();
              void act(
                async () => ({ ok: true, value }),
                ({ serial }) => `${serial} is saved.`,
              );
            }}
          />
        )}
      </Dialog>
    </li>
  );
}
