import type { Metadata } from "next";
import { Page } from "@/components/shell/Page";
import { Panel } from "@/components/ui/Panel";
import { ProjectEnd } from "@/components/workshop/ProjectEnd";
import { ProjectSettings } from "@/components/workshop/ProjectSettings";
import { definePage } from "@/lib/actions/define-page";
import { loadSettings } from "@/lib/project/load-settings";
import { timeZones } from "@/lib/project/time-zones";
import { archiveProject, editProject, purgeProject, restoreProject } from "../../actions";

export const metadata: Metadata = { title: "Settings" };

/** Under the permission that an archived project still grants, so that it can be restored or purged from here. */
export default definePage({
  permission: "project.archive",
  path: (params) => `/projects/${params.project}/settings`,
  render: async (scope) => {
    const settings = await loadSettings(scope);
    return (
      <Page title="Settings" width="prose">
        <div className="flex flex-col gap-5">
          {!settings.archived && (
            <Panel>
              <ProjectSettings
                key={settings.version}
                project={scope.slug}
                settings={settings}
                zones={timeZones(new Date())}
                edit={editProject}
              />
            </Panel>
          )}
          <ProjectEnd
            project={scope.slug}
            settings={settings}
            actions={{ archive: archiveProject, restore: restoreProject, purge: purgeProject }}
          />
        </div>
      </Page>
    );
  },
});
