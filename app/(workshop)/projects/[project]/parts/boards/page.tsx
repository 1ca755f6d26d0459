import type { Metadata } from "next";
import { PlanOverviewPlace } from "@/components/parts/PlanOverviewPlace";
import { definePage } from "@/lib/actions/define-page";
import { loadPlanOverview } from "@/lib/board-plan/load-plan-overview";

export const metadata: Metadata = { title: "Parts of the boards" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/parts/boards`,
  render: async (scope) => (
    <PlanOverviewPlace project={scope.slug} zone={scope.viewer.timeZone} view={await loadPlanOverview(scope)} />
  ),
});
