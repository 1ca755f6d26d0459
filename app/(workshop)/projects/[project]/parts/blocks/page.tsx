import type { Metadata } from "next";
import { BlocksPlace } from "@/components/parts/BlocksPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadBlocks } from "@/lib/block/load-blocks";
import { restoreBlock } from "./actions";

export const metadata: Metadata = { title: "Blocks" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/parts/blocks`,
  render: async (scope) => (
    <BlocksPlace
      project={scope.slug}
      blocks={await loadBlocks(scope)}
      canEdit={!scope.archived && can(scope.role, "parts.edit")}
      restore={restoreBlock}
    />
  ),
});
