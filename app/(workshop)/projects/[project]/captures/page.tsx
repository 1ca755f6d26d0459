import type { Metadata } from "next";
import { CapturesPlace } from "@/components/captures/CapturesPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { capturesQuery } from "@/lib/attachment/captures-query";
import { loadCaptures } from "@/lib/attachment/load-captures";
import { captionEvidence, removeEvidence, restoreEvidence } from "../evidence/actions";

export const metadata: Metadata = { title: "Captures" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/captures`,
  render: async (scope, { search }) => {
    const query = capturesQuery(search);
    const canAttach = !scope.archived && can(scope.role, "evidence.attach");
    const actions = { caption: captionEvidence, remove: removeEvidence, restore: restoreEvidence };
    return (
      <CapturesPlace
        project={scope.slug}
        zone={scope.viewer.timeZone}
        query={query}
        view={await loadCaptures(scope, query)}
        canAttach={canAttach}
        actions={canAttach ? actions : undefined}
      />
    );
  },
});
