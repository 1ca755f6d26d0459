import type { Metadata } from "next";
import { BenchPicker } from "@/components/bench/BenchPicker";
import { definePage } from "@/lib/actions/define-page";
import { loadBench } from "@/lib/traveler/load-bench";

export const metadata: Metadata = { title: "Bench" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/bench`,
  render: async (scope) => <BenchPicker project={scope.slug} bench={await loadBench(scope)} />,
});
