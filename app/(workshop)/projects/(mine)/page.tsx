import type { Metadata } from "next";
import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { ProjectList } from "@/components/workshop/ProjectList";
import { definePage } from "@/lib/actions/define-page";
import { loadProjects } from "@/lib/project/load-projects";

export const metadata: Metadata = { title: "Projects" };

export default definePage({
  permission: "own",
  path: () => "/projects",
  render: async (scope) => {
    const projects = await loadProjects(scope);
    return (
      <Page
        title="Projects"
        actions={projects.length > 0 && <ButtonLink href="/projects/new">Set up a project</ButtonLink>}
      >
        <ProjectList projects={projects} />
      </Page>
    );
  },
});
