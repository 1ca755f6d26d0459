import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { ReworkEditor } from "@/components/rework/ReworkEditor";
import { definePage } from "@/lib/actions/define-page";
import { loadReworkForm } from "@/lib/rework/load-rework-form";
import { previewRework, recordRework } from "../actions";

export const metadata: Metadata = { title: "New rework" };

export default definePage({
  permission: "rework.record",
  path: (params) => `/projects/${params.project}/units/${params.unit}/reworks/new`,
  render: async (scope, { params, search }) => {
    const fault =
      typeof search.fault === "string" && /^[1-9]\d{0,8}$/.test(search.fault) ? Number(search.fault) : undefined;
    const form = await loadReworkForm(scope, {
      serial: decodeURIComponent(params.unit ?? ""),
      fault,
      from: typeof search.from === "string" ? search.from : "",
    });
    if (!form) notFound();
    return (
      <ReworkEditor
        project={scope.slug}
        zone={scope.viewer.timeZone}
        form={form}
        acts={{ preview: previewRework, record: recordRework }}
      />
    );
  },
});
