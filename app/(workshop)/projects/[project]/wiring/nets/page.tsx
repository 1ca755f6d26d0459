import type { Metadata } from "next";
import { NetsPlace } from "@/components/wiring/nets/NetsPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadNets } from "@/lib/net/load-nets";
import { saveSignal } from "../signals/actions";

export const metadata: Metadata = { title: "Nets" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/wiring/nets`,
  render: async (scope) => (
    <NetsPlace
      {...await loadNets(scope)}
      project={scope.slug}
      canEdit={!scope.archived && can(scope.role, "wiring.edit")}
      save={saveSignal}
    />
  ),
});
