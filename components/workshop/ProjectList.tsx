import { Disclosure } from "@/components/workshop/Disclosure";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { EmptyRackDrawing } from "@/components/rack/EmptyRackDrawing";
import type { ProjectCardView } from "@/lib/project/load-projects";
import { ProjectCard } from "./ProjectCard";

export function ProjectList({ projects }: { projects: readonly ProjectCardView[] }) {
  const inWork = projects.filter((project) => !project.archived);
  const archived = projects.filter((project) => project.archived);
  return (
    <div className="flex flex-col gap-8">
      {inWork.length === 0 ? (
        <EmptyState
          title={archived.length > 0 ? "No project in work" : "No projects yet"}
          drawing={<EmptyRackDrawing />}
          action={
            <ButtonLink kind="primary" href="/projects/new">
              Set up a project
            </ButtonLink>
          }
        >
          <p>
            A project is one machine and the people around it: its boards, its slots, every unit with its traveler, the
            log. Set one up, or ask the maintainer of a machine for an invitation; it comes by e-mail.
          </p>
        </EmptyState>
      ) : (
        <ProjectGrid projects={inWork} />
      )}
      {archived.length > 0 && (
        <Disclosure summary={archived.length === 1 ? "1 archived project" : `${archived.length} archived projects`}>
          <ProjectGrid projects={archived} />
        </Disclosure>
      )}
    </div>
  );
}

function ProjectGrid({ projects }: { projects: readonly ProjectCardView[] }) {
  return (
    <ul className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,21rem),1fr))] gap-4">
      {projects.map((project) => (
        <li key={project.slug}>
          <ProjectCard project={project} />
        </li>
      ))}
    </ul>
  );
}
