import type { Metadata } from "next";
import { LogPlace } from "@/components/log/LogPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadLog } from "@/lib/log-entry/load-log";
import { logQuery } from "@/lib/log-entry/log-query";

export const metadata: Metadata = { title: "Log" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/log`,
  render: async (scope, { search }) => {
    const query = logQuery(search);
    return (
      <LogPlace
        project={scope.slug}
        zone={scope.viewer.timeZone}
        query={query}
        log={await loadLog(scope, query)}
        canWrite={!scope.archived && can(scope.role, "log.write")}
      />
    );
  },
});
