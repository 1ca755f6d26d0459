import type { Role } from "@/db/schema/projects";

const everyone: readonly Role[] = ["maintainer", "builder", "collaborator"];
const bench: readonly Role[] = ["maintainer", "builder"];
const maintainers: readonly Role[] = ["maintainer"];

/**
 * The whole permission table of a project. What is not listed is denied.
 * Asked through can() by every server action, route handler, page and button; there is no other check.
 */
export const PERMISSIONS = {
  "project.see": everyone,
  "attempt.record": bench,
  "attempt.void-own": bench,
  "evidence.attach": bench,
  "log.write": bench,
  "unit.edit": bench,
  "slot.edit": bench,
  "fault.write": bench,
  "rework.record": bench,
  "wiring.edit": bench,
  "parts.edit": bench,
  "finding.accept": maintainers,
  "procedure.edit": maintainers,
  "prerequisite.edit": maintainers,
  "attempt.void-any": maintainers,
  "check.reopen": maintainers,
  "concession.grant": maintainers,
  "hold.lift": maintainers,
  "board.edit": maintainers,
  "board.purge": maintainers,
  "project.edit": maintainers,
  "member.manage": maintainers,
  "digest.preview": maintainers,
  "project.archive": maintainers,
  "digest.own": everyone,
  "membership.leave": everyone,
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof PERMISSIONS;

/** A permission of a project, or one of the two that must be written out: nobody signed in, or one's own things. */
export type Requirement = Permission | "public" | "own";

/** Whether the role may do it. No role (a stranger to the project) may do nothing. */
export function can(role: Role | undefined, permission: Permission): boolean {
  const allowed: readonly Role[] = PERMISSIONS[permission];
  return role !== undefined && allowed.includes(role);
}
