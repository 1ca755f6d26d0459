import type { Metadata } from "next";
import { FaultsPlace } from "@/components/fault/FaultsPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { faultQuery, loadFaults } from "@/lib/fault/load-faults";

export const metadata: Metadata = { title: "Faults" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/faults`,
  render: async (scope, { search }) => {
    const query = faultQuery(search);
    return (
      <FaultsPlace
        key={query.q}
        project={scope.slug}
        zone={scope.viewer.timeZone}
        query={query}
        view={await loadFaults(scope, query)}
        canWrite={!scope.archived && can(scope.role, "fault.write")}
      />
    );
  },
});
