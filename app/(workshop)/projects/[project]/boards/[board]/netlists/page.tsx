import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { NetlistsPlace } from "@/components/netlist/NetlistsPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadNetlists } from "@/lib/netlist/load-netlists";

export async function generateMetadata({ params }: { params: Promise<{ board: string }> }): Promise<Metadata> {
  return { title: `Netlists of ${(await params).board}` };
}

const one = (value: string | string[] | undefined) => (typeof value === "string" ? value : undefined);

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/boards/${params.board}/netlists`,
  render: async (scope, { params, search }) => {
    const view = await loadNetlists(scope, params.board ?? "", {
      before: one(search.before),
      after: one(search.after),
    });
    if (!view) notFound();
    return (
      <NetlistsPlace
        {...view}
        project={scope.slug}
        zone={scope.viewer.timeZone}
        canTake={!scope.archived && !view.board.archived && can(scope.role, "wiring.edit")}
      />
    );
  },
});
