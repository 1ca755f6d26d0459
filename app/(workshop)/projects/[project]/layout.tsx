import type { Metadata } from "next";
import type { ReactNode } from "react";
import { ProjectSearch } from "@/components/search/ProjectSearch";
import { Notice } from "@/components/ui/Notice";
import { ProjectPlaces } from "@/components/workshop/ProjectPlaces";
import { database } from "@/db/client";
import { grant } from "@/lib/access/grant";
import { can } from "@/lib/access/permissions";
import { currentViewer } from "@/lib/auth/current-viewer";
import { loadPlaceCounts } from "@/lib/rack/load-place-counts";
import { WorkshopHeader } from "../../WorkshopHeader";

type Props = { children: ReactNode; params: Promise<{ project: string }> };

async function scopeOf(params: Props["params"]) {
  const { project } = await params;
  return grant(database(), await currentViewer(), project, "project.see");
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const scope = await scopeOf(params);
  if (!scope.ok) return {};
  return {
    title: {
      template: `%s · ${scope.value.projectName} · Boardwake`,
      default: `${scope.value.projectName} · Boardwake`,
    },
  };
}

/** Where one may not look there is no frame either: the page itself sends to sign-in or answers not found. */
export default async function ProjectLayout({ children, params }: Props) {
  const granted = await scopeOf(params);
  if (!granted.ok) return children;
  const scope = granted.value;
  const counts = await loadPlaceCounts(scope);
  return (
    <>
      <WorkshopHeader
        crumbs={[
          { label: "Projects", href: "/projects" },
          { label: scope.projectName, href: `/projects/${scope.slug}/rack` },
        ]}
        search={<ProjectSearch project={scope.slug} />}
        nav={<ProjectPlaces project={scope.slug} {...counts} canEdit={can(scope.role, "project.archive")} />}
      />
      {scope.archived && (
        <div className="mx-auto max-w-sheet px-4 pt-4 sm:px-6">
          <Notice kind="waiting">
            <p>
              This project is archived. Everything can be looked at; nothing can be changed until a maintainer restores
              it.
            </p>
          </Notice>
        </div>
      )}
      {children}
    </>
  );
}
