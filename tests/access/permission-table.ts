import type { Role } from "@/db/schema/projects";
import type { Permission } from "@/lib/access/permissions";

const everyone: readonly Role[] = ["maintainer", "builder", "collaborator"];
const bench: readonly Role[] = ["maintainer", "builder"];
const maintainers: readonly Role[] = ["maintainer"];

/** The table as the design states it, written out a second time: a slip of the pen in the code shows as a difference. */
export const MAY: Record<Permission, readonly Role[]> = {
  // see project, traveler, captures, log
  "project.see": everyone,
  // record / void own attempt, attach, log entry, fault, rework
  "fault.write": bench,
  "rework.record": bench,
  "attempt.record": bench,
  "attempt.void-own": bench,
  "evidence.attach": bench,
  "log.write": bench,
  // procedures, prerequisites, hold points
  "procedure.edit": maintainers,
  "prerequisite.edit": maintainers,
  // pin map, blocks, parts, netlists; accepting a finding is a decision about the design
  "wiring.edit": bench,
  "parts.edit": bench,
  "finding.accept": maintainers,
  // reopen, concession, lift a hold, void any
  "check.reopen": maintainers,
  "concession.grant": maintainers,
  "hold.lift": maintainers,
  "attempt.void-any": maintainers,
  // boards, revisions, units, slots; a builder: units and slots
  "board.edit": maintainers,
  "unit.edit": bench,
  "slot.edit": bench,
  // members, invitations, digest of the project, archive, purge
  "project.edit": maintainers,
  "member.manage": maintainers,
  "digest.preview": maintainers,
  "project.archive": maintainers,
  "board.purge": maintainers,
  // own digest; leaving
  "digest.own": everyone,
  "membership.leave": everyone,
};

export const ROLES: readonly Role[] = everyone;
