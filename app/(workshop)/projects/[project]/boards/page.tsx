import type { Metadata } from "next";
import { BoardsPlace } from "@/components/board/BoardsPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadBoards } from "@/lib/board/load-boards";
import { createBoard, restoreBoard } from "./actions";
import { archiveSlot, createSlot, editSlot, placeUnit, removeUnit, restoreSlot } from "./slot-actions";

export const metadata: Metadata = { title: "Boards" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/boards`,
  render: async (scope) => (
    <BoardsPlace
      project={scope.slug}
      zone={scope.viewer.timeZone}
      view={await loadBoards(scope)}
      canEdit={!scope.archived && can(scope.role, "board.edit")}
      canPlace={!scope.archived && can(scope.role, "slot.edit")}
      boardActs={{ create: createBoard, restore: restoreBoard }}
      slotActs={{
        create: createSlot,
        edit: editSlot,
        archive: archiveSlot,
        restore: restoreSlot,
        place: placeUnit,
        remove: removeUnit,
      }}
    />
  ),
});
