import type { Metadata } from "next";
import { SignalsPlace } from "@/components/wiring/signals/SignalsPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadSignals } from "@/lib/signal/load-signals";
import { removeSignal, saveSignal } from "./actions";

export const metadata: Metadata = { title: "Signals" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/wiring/signals`,
  render: async (scope) => (
    <SignalsPlace
      signals={await loadSignals(scope)}
      project={scope.slug}
      canEdit={!scope.archived && can(scope.role, "wiring.edit")}
      save={saveSignal}
      remove={removeSignal}
    />
  ),
});
