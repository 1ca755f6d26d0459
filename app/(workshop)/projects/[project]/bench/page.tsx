import type { Metadata } from "next";
import { BenchPicker } from "@/components/bench/BenchPicker";
import { SessionButton } from "@/components/order/SessionButton";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { isAtBench } from "@/lib/bench-session/is-at-bench";
import { loadBench } from "@/lib/traveler/load-bench";
import { startBenchSession, stopBenchSession } from "../order/actions";

export const metadata: Metadata = { title: "Bench" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/bench`,
  render: async (scope) => {
    const bench = await loadBench(scope);
    const maySit = bench.units.length > 0 && !scope.archived && can(scope.role, "attempt.record");
    const acts = { start: startBenchSession, stop: stopBenchSession };
    const session = maySit && <SessionButton project={scope.slug} isRunning={await isAtBench(scope)} acts={acts} />;
    return <BenchPicker project={scope.slug} bench={bench} session={session} />;
  },
});
