import type { Metadata } from "next";
import { BoardOrderPlace } from "@/components/order/BoardOrderPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadBoardOrder } from "@/lib/order/load-board-order";
import { sayBoardOrder, withdrawBoardOrder } from "../actions";

export const metadata: Metadata = { title: "Order of the boards" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/order/boards`,
  render: async (scope) => {
    const mayEdit = !scope.archived && can(scope.role, "prerequisite.edit");
    return (
      <BoardOrderPlace
        order={await loadBoardOrder(scope)}
        project={scope.slug}
        zone={scope.viewer.timeZone}
        acts={mayEdit ? { say: sayBoardOrder, withdraw: withdrawBoardOrder } : null}
      />
    );
  },
});
