"use client";

import Link from "next/link";
import { useRouter } from "next/navigation";
import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import { Table } from "@/components/ui/Table";
import { ArchivedList } from "@/components/workshop/ArchivedList";
import type { BoardLine, BoardsView } from "@/lib/board/load-boards";
import type { BoardActs, SlotActs } from "./board-acts";
import { columnsFor, PhoneBoard } from "./board-columns";
import { BoardForm } from "./BoardForm";
import { connectorId } from "./connector-id";
import { SlotsPanel } from "./SlotsPanel";
import { useAct } from "./use-act";

type Props = {
  project: string;
  zone: string;
  view: BoardsView;
  canEdit: boolean;
  canPlace: boolean;
  boardActs: Pick<BoardActs, "create" | "restore">;
  slotActs: SlotActs;
};

export function BoardsPlace({ project, zone, view, canEdit, canPlace, boardActs, slotActs }: Props) {
  const router = useRouter();
  const { act } = useAct();
  const inWork = view.boards.filter((board) => !board.archived);
  const archived = view.boards.filter((board) => board.archived);
  const add = (
    <Dialog title="Add a board" trigger={<Button kind="primary">Add a board</Button>}>
      {(close) => (
        <BoardForm
          save={(values, { writeId }) =>
            boardActs.create({ project, writeId, ...values, connectorType: connectorId(values.connectorType) })
          }
          onDone={({ code }) => router.push(`/projects/${project}/boards/${code}`)}
          onCancel={close}
        />
      )}
    </Dialog>
  );
  return (
    <Page
      title="Boards and slots"
      lede="The designs the machine is made of, and the places on the backplane that take them."
      actions={canEdit && inWork.length > 0 && add}
    >
      <div className="flex flex-col gap-6">
        <Panel title="Boards">
          <Table<BoardLine>
            label="Boards"
            columns={columnsFor(project)}
            rows={inWork}
            rowKey={(board) => board.id}
            {...(inWork.length > 8 ? { search: "Find a board" } : {})}
            phone={(board) => <PhoneBoard board={board} project={project} />}
            empty={
              <EmptyState title="No boards yet" action={canEdit && add}>
                <p>
                  Add one for each design: cards and the backplane. A board holds its revisions, its units with their
                  serial numbers, and its procedure.
                </p>
              </EmptyState>
            }
          />
        </Panel>
        <SlotsPanel project={project} zone={zone} view={view} canEdit={canPlace} acts={slotActs} />
        <ArchivedList
          what="archived board"
          items={archived}
          keyOf={({ id }) => id}
          nameOf={({ name }) => name}
          show={({ code, name }) => (
            <Link href={`/projects/${project}/boards/${code}`} className="link">
              <span className="mono text-sm">{code}</span> {name}
            </Link>
          )}
          restore={
            canEdit
              ? ({ id, name }) =>
                  void act(
                    () => boardActs.restore({ project, writeId: crypto.randomUUID(), boardId: id }),
                    () => `${name} is back with its units.`,
                  )
              : undefined
          }
        />
      </div>
    </Page>
  );
}
