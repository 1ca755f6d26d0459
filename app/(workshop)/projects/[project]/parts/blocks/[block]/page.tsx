import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { BlockPlace } from "@/components/parts/BlockPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadBlock } from "@/lib/block/load-block";
import { archiveBlock, restoreBlock, saveBlock } from "../actions";

export const metadata: Metadata = { title: "Block" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/parts/blocks/${params.block}`,
  render: async (scope, { params }) => {
    const canEdit = !scope.archived && can(scope.role, "parts.edit");
    const view = await loadBlock(scope, params.block ?? "");
    if (!view || (!view.block && !canEdit)) notFound();
    return (
      <BlockPlace
        key={view.block ? `${view.block.id} ${view.block.version}` : "new"}
        project={scope.slug}
        zone={scope.viewer.timeZone}
        view={view}
        canEdit={canEdit}
        acts={{ save: saveBlock, archive: archiveBlock, restore: restoreBlock }}
      />
    );
  },
});
