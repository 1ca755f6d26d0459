import type { Metadata } from "next";
import { FamiliesPlace } from "@/components/wiring/families/FamiliesPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadFamilies } from "@/lib/family/load-families";
import { removeFamily, saveFamily } from "./actions";

export const metadata: Metadata = { title: "Families" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/wiring/families`,
  render: async (scope) => (
    <FamiliesPlace
      {...await loadFamilies(scope)}
      project={scope.slug}
      canEdit={!scope.archived && can(scope.role, "wiring.edit")}
      save={saveFamily}
      remove={removeFamily}
    />
  ),
});
