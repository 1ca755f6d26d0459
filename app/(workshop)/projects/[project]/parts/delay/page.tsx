import type { Metadata } from "next";
import { DelayPlace } from "@/components/parts/DelayPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadDelayPaths } from "@/lib/delay-path/load-delay-paths";
import { offerToCheck } from "../../boards/[board]/procedure/actions";
import { archiveDelayPath, restoreDelayPath, saveDelayPath } from "./actions";

export const metadata: Metadata = { title: "Delay" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/parts/delay`,
  render: async (scope) => (
    <DelayPlace
      project={scope.slug}
      view={await loadDelayPaths(scope)}
      can={{
        edit: !scope.archived && can(scope.role, "parts.edit"),
        editProcedure: !scope.archived && can(scope.role, "procedure.edit"),
      }}
      acts={{ save: saveDelayPath, archive: archiveDelayPath, restore: restoreDelayPath, offer: offerToCheck }}
    />
  ),
});
