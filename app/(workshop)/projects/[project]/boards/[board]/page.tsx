import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { BoardPlace } from "@/components/board/BoardPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadBoard } from "@/lib/board/load-board";
import { loadBoardSpares } from "@/lib/board-plan/load-board-spares";
import { archiveBoard, createRevision, editBoard, purgeBoard, releaseRevision, restoreBoard } from "../actions";
import { archiveUnit, createUnit, editUnit, purgeUnit, restoreUnit } from "../unit-actions";

export async function generateMetadata({ params }: { params: Promise<{ board: string }> }): Promise<Metadata> {
  return { title: (await params).board };
}

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/boards/${params.board}`,
  render: async (scope, { params }) => {
    const code = params.board ?? "";
    const [board, spares] = await Promise.all([loadBoard(scope, code), loadBoardSpares(scope, code)]);
    if (!board) notFound();
    const open = !scope.archived;
    return (
      <BoardPlace
        project={scope.slug}
        zone={scope.viewer.timeZone}
        board={board}
        spares={spares}
        can={{
          editBoard: open && can(scope.role, "board.edit"),
          editUnits: open && can(scope.role, "unit.edit"),
          editProcedure: open && can(scope.role, "procedure.edit"),
          purge: open && can(scope.role, "board.purge"),
        }}
        boardActs={{ edit: editBoard, archive: archiveBoard, restore: restoreBoard, purge: purgeBoard }}
        revisionActs={{ create: createRevision, release: releaseRevision }}
        unitActs={{
          create: createUnit,
          edit: editUnit,
          archive: archiveUnit,
          restore: restoreUnit,
          purge: purgeUnit,
        }}
      />
    );
  },
});
