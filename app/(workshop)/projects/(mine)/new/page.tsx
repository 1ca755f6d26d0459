import type { Metadata } from "next";
import { Page } from "@/components/shell/Page";
import { Panel } from "@/components/ui/Panel";
import { NewProject } from "@/components/workshop/NewProject";
import { definePage } from "@/lib/actions/define-page";
import { timeZones } from "@/lib/project/time-zones";
import { createProject } from "../../actions";

export const metadata: Metadata = { title: "New project" };

export default definePage({
  permission: "own",
  path: () => "/projects/new",
  render: async (scope) => (
    <Page
      title="Set up a project"
      lede="You are its first maintainer. Boards, slots and people come next."
      width="prose"
    >
      <Panel>
        <NewProject zones={timeZones(new Date())} timeZone={scope.viewer.timeZone} create={createProject} />
      </Panel>
    </Page>
  ),
});
