import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { RoundsPlace } from "@/components/probing/RoundsPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadRounds } from "@/lib/probing/load-rounds";
import { previewRound, startRound } from "./actions";

export async function generateMetadata({ params }: { params: Promise<{ unit: string }> }): Promise<Metadata> {
  return { title: `Probing ${decodeURIComponent((await params).unit)}` };
}

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/units/${params.unit}/probing`,
  render: async (scope, { params, search }) => {
    const netlist = typeof search.netlist === "string" ? search.netlist : undefined;
    const view = await loadRounds(scope, decodeURIComponent(params.unit ?? ""), netlist);
    if (!view) notFound();
    const isOpen = !scope.archived && !view.unit.archived;
    return (
      <RoundsPlace
        view={view}
        project={scope.slug}
        zone={scope.viewer.timeZone}
        may={{ probe: isOpen && can(scope.role, "attempt.record"), take: isOpen && can(scope.role, "wiring.edit") }}
        acts={{ preview: previewRound, start: startRound }}
      />
    );
  },
});
