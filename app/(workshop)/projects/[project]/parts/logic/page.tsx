import type { Metadata } from "next";
import { LogicPlace } from "@/components/parts/LogicPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadParts } from "@/lib/part/load-parts";
import { archivePart, restorePart, savePart } from "../actions";

export const metadata: Metadata = { title: "Logic parts" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/parts/logic`,
  render: async (scope) => (
    <LogicPlace
      project={scope.slug}
      view={await loadParts(scope)}
      canEdit={!scope.archived && can(scope.role, "parts.edit")}
      acts={{ save: savePart, archive: archivePart, restore: restorePart }}
    />
  ),
});
