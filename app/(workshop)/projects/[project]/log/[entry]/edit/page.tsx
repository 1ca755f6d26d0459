import type { Metadata } from "next";
import { notFound, redirect } from "next/navigation";
import { EntryEditor } from "@/components/log/EntryEditor";
import { Page } from "@/components/shell/Page";
import { definePage } from "@/lib/actions/define-page";
import { loadEntry } from "@/lib/log-entry/load-entries";
import { loadEntryUnits } from "@/lib/log-entry/load-entry-units";
import { editEntry } from "../../actions";

export const metadata: Metadata = { title: "Edit log entry" };

export default definePage({
  permission: "log.write",
  path: (params) => `/projects/${params.project}/log/${params.entry}/edit`,
  render: async (scope, { params }) => {
    const entry = await loadEntry(scope, params.entry ?? "");
    if (!entry) notFound();
    if (entry.archivedAt) redirect(`/projects/${scope.slug}/log/${entry.id}`);
    return (
      <Page title="Edit the entry" width="prose">
        <EntryEditor
          project={scope.slug}
          zone={scope.viewer.timeZone}
          units={await loadEntryUnits(scope)}
          unit={entry.unit?.serial ?? ""}
          entry={entry}
          edit={editEntry}
        />
      </Page>
    );
  },
});
