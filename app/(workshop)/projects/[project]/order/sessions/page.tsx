import type { Metadata } from "next";
import { SessionControl } from "@/components/order/SessionControl";
import { SessionsPlace } from "@/components/order/SessionsPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadBenchSessions } from "@/lib/bench-session/load-bench-sessions";
import { startBenchSession, stopBenchSession } from "../actions";

export const metadata: Metadata = { title: "Sessions at the bench" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/order/sessions`,
  render: async (scope) => {
    const view = await loadBenchSessions(scope);
    const mayRecord = !scope.archived && can(scope.role, "attempt.record");
    const acts = { start: startBenchSession, stop: stopBenchSession };
    const zone = scope.viewer.timeZone;
    const control = mayRecord && <SessionControl project={scope.slug} zone={zone} running={view.running} acts={acts} />;
    return <SessionsPlace view={view} project={scope.slug} zone={zone} control={control} />;
  },
});
