import type { Metadata } from "next";
import { RackPlace } from "@/components/rack/RackPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadRack } from "@/lib/rack/load-rack";

export const metadata: Metadata = { title: "Rack" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/rack`,
  render: async (scope) => (
    <RackPlace
      rack={await loadRack(scope)}
      project={scope.slug}
      zone={scope.viewer.timeZone}
      canEditBoards={!scope.archived && can(scope.role, "board.edit")}
      canPlace={!scope.archived && can(scope.role, "slot.edit")}
      canRecord={!scope.archived && can(scope.role, "attempt.record")}
    />
  ),
});
