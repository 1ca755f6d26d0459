"use client";

import { useRouter } from "next/navigation";
import { useState, type ReactNode } from "react";
import { Page } from "@/components/shell/Page";
import { Badge } from "@/components/ui/Badge";
import { Button } from "@/components/ui/Button";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { Dialog } from "@/components/ui/Dialog";
import type { BoardSpares } from "@/lib/board-plan/load-board-spares";
import type { BoardView } from "@/lib/board/load-board";
import { faceOf } from "@/lib/calc/connector";
import type { BoardActs, RevisionActs, UnitActs } from "./board-acts";
import { ArchivedBoard } from "./ArchivedBoard";
import { BoardForm } from "./BoardForm";
import { connectorId } from "./connector-id";
import { ConnectorPanel } from "./ConnectorPanel";
import { PackagesPanel } from "./PackagesPanel";
import { ProcedurePanel } from "./ProcedurePanel";
import { RevisionsPanel } from "./RevisionsPanel";
import { UnitsPanel } from "./UnitsPanel";
import { useAct } from "./use-act";

type Props = {
  project: string;
  zone: string;
  board: BoardView;
  /** Its packages by the plan of its parts; undefined while it uses no blocks. */
  spares: BoardSpares | undefined;
  /** What each revision takes over from the ones before. */
  punchLists: ReactNode;
  /** What its first power should show; nothing while its budget is not known. */
  firstPower: ReactNode;
  can: { editBoard: boolean; editUnits: boolean; editProcedure: boolean; purge: boolean };
  boardActs: Omit<BoardActs, "create">;
  revisionActs: RevisionActs;
  unitActs: UnitActs;
};

export function BoardPlace({
  project,
  zone,
  board,
  spares,
  punchLists,
  firstPower,
  can,
  boardActs,
  revisionActs,
  unitActs,
}: Props) {
  const router = useRouter();
  const { act } = useAct();
  const [isEditing, setEditing] = useState(false);
  const write = () => ({ project, writeId: crypto.randomUUID(), boardId: board.id });
  const restore = () =>
    act(
      () => boardActs.restore(write()),
      () => `${board.name} is back with its units.`,
    );
  const inWork = board.units.filter((unit) => !unit.archived).length;
  return (
    <Page
      title={
        <>
          <span className="mono text-[0.8em]">{board.code}</span> {board.name}
        </>
      }
      lede={board.summary || undefined}
      actions={
        can.editBoard &&
        !board.archived && (
          <>
            <Button onPress={() => setEditing(true)}>Change the board</Button>
            <ConfirmDialog
              title={`Archive ${board.name}?`}
              trigger={<Button>Archive</Button>}
              kind="primary"
              consequences={[
                inWork === 0
                  ? "It has no units in work."
                  : `${inWork === 1 ? "Its unit is" : `Its ${inWork} units are`} archived with it and taken out of the slots.`,
                "Everything recorded stays. Restoring it brings the same units back.",
              ]}
              confirmLabel="Archive the board"
              onConfirm={() =>
                act(
                  () => boardActs.archive(write()),
                  () => `${board.name} is archived.`,
                  restore,
                )
              }
            />
          </>
        )
      }
      aside={
        <>
          <ProcedurePanel project={project} zone={zone} board={board} canEdit={can.editProcedure && !board.archived} />
          <RevisionsPanel
            project={project}
            zone={zone}
            board={board}
            canEdit={can.editBoard && !board.archived}
            acts={revisionActs}
          />
        </>
      }
    >
      {board.archived && (
        <ArchivedBoard {...{ project, board }} can={{ restore: can.editBoard, purge: can.purge }} acts={boardActs} />
      )}
      <p className="-mt-2 flex flex-wrap gap-2">
        <Badge>{board.kind}</Badge>
        <Badge>
          <span className="mono">{board.connectorReference}</span>{" "}
          {faceOf({ type: board.connectorType ?? "", grid: board.connectorGrid })?.label ?? "no connector drawn"}
        </Badge>
      </p>
      <UnitsPanel
        project={project}
        board={board}
        canEdit={can.editUnits && !board.archived}
        canPurge={can.purge}
        acts={unitActs}
      />
      <ConnectorPanel board={board} project={project} />
      {spares && <PackagesPanel project={project} zone={zone} code={board.code} spares={spares} />}
      {firstPower}
      {punchLists}
      <Dialog title="Change the board" isOpen={isEditing} onOpenChange={setEditing}>
        {(close) => (
          <BoardForm
            board={board}
            save={(values, asked) =>
              boardActs.edit({
                project,
                boardId: board.id,
                ...asked,
                ...values,
                connectorType: connectorId(values.connectorType),
              })
            }
            onCancel={close}
            onDone={(value) => {
              close();
              if (value.code !== board.code) router.replace(`/projects/${project}/boards/${value.code}`);
              void act(
                async () => ({ ok: true, value }),
                () => "The board is saved.",
              );
            }}
          />
        )}
      </Dialog>
    </Page>
  );
}
