import type { Metadata } from "next";
import { SessionControl } from "@/components/order/SessionControl";
import { TonightPlace } from "@/components/order/TonightPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadTonight } from "@/lib/order/load-tonight";
import { readAsked } from "@/lib/order/read-asked";
import { startBenchSession, stopBenchSession } from "./actions";

export const metadata: Metadata = { title: "Order" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/order`,
  render: async (scope, { search }) => {
    const { view, running, paceLines } = await loadTonight(scope, readAsked(search));
    const mayRecord = !scope.archived && can(scope.role, "attempt.record");
    const acts = { start: startBenchSession, stop: stopBenchSession };
    const control = mayRecord && (
      <SessionControl project={scope.slug} zone={scope.viewer.timeZone} running={running} acts={acts} />
    );
    return <TonightPlace tonight={view} paces={paceLines} project={scope.slug} control={control} />;
  },
});
