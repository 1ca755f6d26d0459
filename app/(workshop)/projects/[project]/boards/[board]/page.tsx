import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { BoardPlace } from "@/components/board/BoardPlace";
import { PunchPanel } from "@/components/punch/PunchPanel";
import { FirstPower } from "@/components/power/FirstPower";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadBoard } from "@/lib/board/load-board";
import { loadBoardSpares } from "@/lib/board-plan/load-board-spares";
import { loadFirstPower } from "@/lib/power/load-first-power";
import { loadPunch } from "@/lib/punch/load-punch";
import { archiveBoard, createRevision, editBoard, purgeBoard, releaseRevision, restoreBoard } from "../actions";
import { dealPunch, reopenPunch, takePunch } from "./punch-actions";
import { offerToCheck } from "./procedure/actions";
import { archiveUnit, createUnit, editUnit, purgeUnit, restoreUnit } from "../unit-actions";

export async function generateMetadata({ params }: { params: Promise<{ board: string }> }): Promise<Metadata> {
  return { title: (await params).board };
}

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/boards/${params.board}`,
  render: async (scope, { params }) => {
    const code = params.board ?? "";
    const [board, spares, first] = await Promise.all([
      loadBoard(scope, code),
      loadBoardSpares(scope, code),
      loadFirstPower(scope, code),
    ]);
    if (!board) notFound();
    const punch = await loadPunch(scope, board.id);
    const open = !scope.archived;
    const editProcedure = open && can(scope.role, "procedure.edit");
    return (
      <BoardPlace
        project={scope.slug}
        zone={scope.viewer.timeZone}
        board={board}
        spares={spares}
        firstPower={
          first && (
            <FirstPower
              project={scope.slug}
              {...first}
              budgetHref={`/projects/${scope.slug}/wiring/power?board=${encodeURIComponent(board.code)}#board`}
              canEdit={editProcedure}
              offer={offerToCheck}
            />
          )
        }
        punchLists={laterRevisions(board.revisions).map((revision) => (
          <PunchPanel
            key={revision.id}
            project={scope.slug}
            zone={scope.viewer.timeZone}
            revision={revision}
            items={punch[revision.id] ?? []}
            canEdit={open && !board.archived && can(scope.role, "board.edit")}
            acts={{ take: takePunch, deal: dealPunch, reopen: reopenPunch }}
          />
        ))}
        can={{
          editBoard: open && can(scope.role, "board.edit"),
          editUnits: open && can(scope.role, "unit.edit"),
          editProcedure,
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

/** All but the first, which has nothing to take over. */
function laterRevisions<Revision extends { letter: string }>(revisions: readonly Revision[]): Revision[] {
  const [first] = revisions.map(({ letter }) => letter).sort((a, b) => a.length - b.length || (a < b ? -1 : 1));
  return revisions.filter(({ letter }) => letter !== first);
}
