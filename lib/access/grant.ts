import { cache } from "react";
import type { Queryable } from "@/db/client";
import { findMembership } from "@/db/queries/memberships";
import { refuse, ok, type Answer } from "@/lib/actions/answer";
import { can, type Permission } from "./permissions";
import type { ProjectScope, Viewer } from "./scope";

/** Permissions that an archived project still grants: looking, leaving, and bringing it back. */
const WHILE_ARCHIVED: readonly Permission[] = ["project.see", "project.archive", "membership.leave", "digest.own"];

/** Layout and page of one request ask for the same membership; outside a render it asks every time. */
const membershipOnce = cache(findMembership);

/**
 * The scope of one project for one person, or why not. A project one may not see answers 404, like one that does
 * not exist.
 */
export async function grant(
  db: Queryable,
  viewer: Viewer | undefined,
  slug: string,
  permission: Permission,
): Promise<Answer<ProjectScope>> {
  if (!viewer) return refuse("signed-out", "Sign in first. What you typed is still here.");
  const row = await membershipOnce(db, viewer.userId, slug);
  if (!row) return refuse("not-found", "There is no such project, or you are not a member of it.");
  if (!can(row.role, permission)) {
    return refuse("forbidden", `As ${row.role} you cannot do this. A maintainer of the project can.`);
  }
  const archived = row.archivedAt !== null;
  if (archived && !WHILE_ARCHIVED.includes(permission)) {
    return refuse("conflict", "The project is archived. Restore it first; nothing was changed.");
  }
  return ok({
    projectId: row.projectId,
    slug: row.slug,
    projectName: row.projectName,
    timeZone: row.timeZone,
    decisionRule: row.decisionRule,
    archived,
    viewer,
    role: row.role,
  });
}
