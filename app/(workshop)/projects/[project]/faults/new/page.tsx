import type { Metadata } from "next";
import { NewFaultPlace } from "@/components/fault/NewFaultPlace";
import { definePage } from "@/lib/actions/define-page";
import { loadNewFault } from "@/lib/fault/load-new-fault";
import { openFault, similarFaults } from "../actions";

export const metadata: Metadata = { title: "New fault" };

export default definePage({
  permission: "fault.write",
  path: (params) => `/projects/${params.project}/faults/new`,
  render: async (scope, { search }) => {
    const text = (value: string | string[] | undefined) => (typeof value === "string" ? value : "");
    const list = (value: string | string[] | undefined) =>
      text(value)
        .split(",")
        .filter((name) => name.trim() !== "");
    const found = {
      ...{ title: text(search.title), symptom: text(search.symptom) },
      ...{ signals: list(search.signals), pins: list(search.pins) },
    };
    const wanted = { unit: text(search.unit), check: text(search.check), plan: text(search.plan), found };
    const view = await loadNewFault(scope, wanted);
    return <NewFaultPlace project={scope.slug} view={view} acts={{ open: openFault, similar: similarFaults }} />;
  },
});
