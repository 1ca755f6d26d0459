import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { BoardPlanPlace } from "@/components/parts/BoardPlanPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadBoardPlan } from "@/lib/board-plan/load-board-plan";
import { offerToCheck } from "../../../boards/[board]/procedure/actions";
import { saveBoardPlan, saveBom, tieSpares } from "../actions";

export async function generateMetadata({ params }: { params: Promise<{ board: string }> }): Promise<Metadata> {
  return { title: `Parts of ${(await params).board}` };
}

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/parts/boards/${params.board}`,
  render: async (scope, { params }) => {
    const view = await loadBoardPlan(scope, params.board ?? "");
    if (!view) notFound();
    const open = !scope.archived;
    return (
      <BoardPlanPlace
        project={scope.slug}
        zone={scope.viewer.timeZone}
        view={view}
        can={{
          edit: open && can(scope.role, "parts.edit"),
          editProcedure: open && can(scope.role, "procedure.edit"),
        }}
        acts={{ save: saveBoardPlan, saveBom, tie: tieSpares, offer: offerToCheck }}
      />
    );
  },
});
