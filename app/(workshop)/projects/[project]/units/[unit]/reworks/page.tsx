import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { ReworksPlace } from "@/components/rework/ReworksPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadComparison, loadReworks } from "@/lib/rework/load-reworks";
import { captionEvidence, removeEvidence, restoreEvidence } from "../../../evidence/actions";

export async function generateMetadata({ params }: { params: Promise<{ unit: string }> }): Promise<Metadata> {
  return { title: `Reworks of ${decodeURIComponent((await params).unit)}` };
}

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/units/${params.unit}/reworks`,
  render: async (scope, { params, search }) => {
    const serial = decodeURIComponent(params.unit ?? "");
    const [view, comparison] = await Promise.all([
      loadReworks(scope, serial),
      typeof search.with === "string" ? loadComparison(scope, serial, search.with) : undefined,
    ]);
    if (!view) notFound();
    const mayAttach = !scope.archived && can(scope.role, "evidence.attach");
    return (
      <ReworksPlace
        project={scope.slug}
        zone={scope.viewer.timeZone}
        view={view}
        comparison={comparison}
        canRecord={!scope.archived && can(scope.role, "rework.record")}
        evidence={
          mayAttach ? { caption: captionEvidence, remove: removeEvidence, restore: restoreEvidence } : undefined
        }
      />
    );
  },
});
