import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { ProbeScreen } from "@/components/probing/bench/ProbeScreen";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadRound } from "@/lib/probing/load-round";

export const metadata: Metadata = { title: "Probing" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/probe/${params.plan}`,
  render: async (scope, { params }) => {
    const round = await loadRound(scope, params.plan ?? "");
    if (!round) notFound();
    const isOpen = !scope.archived && !round.unit.archived && round.closedAt === null;
    return (
      <ProbeScreen
        round={round}
        project={scope.slug}
        viewer={{ id: scope.viewer.userId }}
        mayProbe={isOpen && can(scope.role, "attempt.record")}
      />
    );
  },
});
