import type { Metadata } from "next";
import { WaitsPlace } from "@/components/order/WaitsPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadWaits } from "@/lib/order/load-waits";
import { addPrerequisite, removePrerequisite } from "../../units/[unit]/actions";

export const metadata: Metadata = { title: "Order of the checks" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/order/checks`,
  render: async (scope) => {
    const mayEdit = !scope.archived && can(scope.role, "prerequisite.edit");
    return (
      <WaitsPlace
        waits={await loadWaits(scope)}
        project={scope.slug}
        acts={mayEdit ? { add: addPrerequisite, remove: removePrerequisite } : null}
      />
    );
  },
});
