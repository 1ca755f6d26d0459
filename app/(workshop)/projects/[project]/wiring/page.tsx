import type { Metadata } from "next";
import { WiringPlace } from "@/components/wiring/WiringPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadWiring } from "@/lib/pin-map/load-wiring";
import { addConnector, copyPinMap, editConnector, removeConnector, savePinMap } from "./actions";
import { acceptFinding } from "./findings/actions";

export const metadata: Metadata = { title: "Wiring" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/wiring`,
  render: async (scope, { search }) => (
    <WiringPlace
      project={scope.slug}
      userId={scope.viewer.userId}
      zone={scope.viewer.timeZone}
      view={await loadWiring(scope)}
      startPin={typeof search.pin === "string" ? search.pin : undefined}
      canEdit={!scope.archived && can(scope.role, "wiring.edit")}
      save={savePinMap}
      connectorActs={{ add: addConnector, edit: editConnector, remove: removeConnector, copy: copyPinMap }}
      canAccept={!scope.archived && can(scope.role, "finding.accept")}
      accept={acceptFinding}
    />
  ),
});
