import type { Metadata } from "next";
import { FindingsPlace } from "@/components/wiring/findings/FindingsPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadFindings } from "@/lib/finding/load-findings";
import { acceptFinding, withdrawAcceptance } from "./actions";

export const metadata: Metadata = { title: "Findings" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/wiring/findings`,
  render: async (scope) => (
    <FindingsPlace
      {...await loadFindings(scope)}
      project={scope.slug}
      zone={scope.viewer.timeZone}
      canAccept={!scope.archived && can(scope.role, "finding.accept")}
      accept={acceptFinding}
      withdraw={withdrawAcceptance}
    />
  ),
});
