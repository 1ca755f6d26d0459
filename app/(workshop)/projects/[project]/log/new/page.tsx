import type { Metadata } from "next";
import { EntryEditor } from "@/components/log/EntryEditor";
import { Page } from "@/components/shell/Page";
import { definePage } from "@/lib/actions/define-page";
import { loadEntryUnits } from "@/lib/log-entry/load-entry-units";
import { writeEntry } from "../actions";

export const metadata: Metadata = { title: "New log entry" };

export default definePage({
  permission: "log.write",
  path: (params) => `/projects/${params.project}/log/new`,
  render: async (scope, { search }) => (
    <Page title="New entry" width="prose">
      <EntryEditor
        project={scope.slug}
        zone={scope.viewer.timeZone}
        units={await loadEntryUnits(scope)}
        unit={typeof search.unit === "string" ? search.unit : ""}
        write={writeEntry}
      />
    </Page>
  ),
});
