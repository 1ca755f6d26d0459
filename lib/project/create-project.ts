import { memberships, projects } from "@/db/schema/projects";
import type { OwnScope } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { subscribe } from "@/lib/member/join-project";
import { freeSlug } from "./make-slug";
import type { CreateProjectInput } from "./schema";

/** Whoever sets a project up is its first maintainer. */
export async function createProject(scope: OwnScope, input: CreateProjectInput): Promise<Answer<{ slug: string }>> {
  const { userId, timeZone: zone } = scope.viewer;
  return change({ writeId: input.writeId, userId, action: "create-project" }, async (tx) => {
    const slug = await freeSlug(tx, input.name);
    const { name, summary, timeZone, decisionRule, layout } = input;
    const [project] = await tx
      .insert(projects)
      .values({ slug, name, summary, timeZone, decisionRule, layout })
      .returning({ id: projects.id });
    if (!project) throw new Error("inserting a project returned no row");
    await tx.insert(memberships).values({ projectId: project.id, userId, role: "maintainer" });
    await subscribe(tx, { projectId: project.id, userId, role: "maintainer", zone });
    await recordEvent(tx, { projectId: project.id, actorId: userId, subjectId: project.id }, "project.created", {
      name,
    });
    return { slug };
  });
}
