"use client";

import Link from "next/link";
import { useState } from "react";
import { CardStages } from "@/components/rack/CardStages";
import { IconButton } from "@/components/ui/IconButton";
import { Menu } from "@/components/ui/Menu";
import type { BoardUnit, BoardView } from "@/lib/board/load-board";
import type { UnitActs } from "./board-acts";
import { EditUnit } from "./EditUnit";
import { useAct } from "./use-act";

type RowProps = {
  project: string;
  board: BoardView;
  unit: BoardUnit;
  room: readonly number[];
  canEdit: boolean;
  acts: UnitActs;
};

/** One unit of the board: where it sits, how far it is, and what can be done with it. */
export function UnitRow({ unit, project, board, canEdit, acts, room }: RowProps) {
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
    <li className="relative flex items-center gap-3 border-b border-rule py-3 last:border-b-0 last:pb-0">
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
        <span className="absolute right-0 top-2 @2xl:static">
          <Menu
            label={unit.serial}
            trigger={<IconButton icon="more" label={`More for ${unit.serial}`} size="sm" tooltip={false} />}
            entries={[
              { id: "edit", label: "Change the unit", onAction: () => setEditing(true) },
              { id: "archive", label: "Archive the unit", isDanger: true, onAction: () => void archive() },
            ]}
          />
        </span>
      )}
      <EditUnit
        {...{ project, unit }}
        revisions={board.revisions}
        edit={acts.edit}
        isOpen={isEditing}
        onOpenChange={setEditing}
      />
    </li>
  );
}
