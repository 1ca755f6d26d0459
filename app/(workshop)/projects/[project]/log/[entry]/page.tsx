import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { EntryPlace } from "@/components/log/EntryPlace";
import { can } from "@/lib/access/permissions";
import { definePage } from "@/lib/actions/define-page";
import { loadEntry } from "@/lib/log-entry/load-entries";
import { captionEvidence, removeEvidence, restoreEvidence } from "../../evidence/actions";
import { archiveEntry, restoreEntry } from "../actions";

export const metadata: Metadata = { title: "Log entry" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/log/${params.entry}`,
  render: async (scope, { params }) => {
    const entry = await loadEntry(scope, params.entry ?? "");
    if (!entry) notFound();
    const canWrite = !scope.archived && can(scope.role, "log.write");
    return (
      <EntryPlace
        project={scope.slug}
        zone={scope.viewer.timeZone}
        entry={entry}
        actions={canWrite ? { archive: archiveEntry, restore: restoreEntry } : undefined}
        evidenceActions={
          canWrite ? { caption: captionEvidence, remove: removeEvidence, restore: restoreEvidence } : undefined
        }
      />
    );
  },
});
