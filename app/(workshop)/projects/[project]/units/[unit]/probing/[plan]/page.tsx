import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { RoundPlace } from "@/components/probing/RoundPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadRoundPage } from "@/lib/probing/load-round-page";
import { askAgain, closeRound } from "../actions";

export async function generateMetadata({ params }: { params: Promise<{ unit: string }> }): Promise<Metadata> {
  return { title: `A round of ${decodeURIComponent((await params).unit)}` };
}

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/units/${params.unit}/probing/${params.plan}`,
  render: async (scope, { params }) => {
    const page = await loadRoundPage(scope, params.plan ?? "");
    if (!page || page.round.unit.serial !== decodeURIComponent(params.unit ?? "")) notFound();
    const isOpen = !scope.archived && !page.round.unit.archived;
    return (
      <RoundPlace
        {...page}
        project={scope.slug}
        zone={scope.viewer.timeZone}
        may={{ probe: isOpen && can(scope.role, "attempt.record"), fault: isOpen && can(scope.role, "fault.write") }}
        acts={{ ask: askAgain, close: closeRound }}
      />
    );
  },
});
