import { randomUUID } from "node:crypto";
import { archiveProject } from "@/lib/project/archive-project";
import { invitePerson } from "@/lib/invitation/invite-person";
import { must } from "../../support/bench";
import type { Machine } from "../machine";
import type { Rows } from "./row";

const form = { name: "Tide computer", summary: "", timeZone: "UTC", decisionRule: "simple", layout: "rack" };

async function invited({ slug, scopes }: Machine): Promise<object> {
  const email = `${randomUUID()}@example.org`;
  const given = { project: slug, writeId: randomUUID(), email, role: "builder" as const };
  const { id } = await must(invitePerson(scopes.maintainer, given));
  return { invitation: id };
}

async function archived({ slug, scopes }: Machine): Promise<void> {
  await must(archiveProject(scopes.maintainer, { project: slug, writeId: randomUUID() }));
}

export const peopleRows: Record<string, Rows> = {
  "app/(workshop)/projects/[project]/digest/actions.ts": {
    sendToMe: { permission: "digest.preview", input: () => ({}) },
  },
  "app/(workshop)/projects/[project]/people/actions.ts": {
    invite: { permission: "member.manage", input: () => ({ email: `${randomUUID()}@example.org`, role: "builder" }) },
    resendInvitation: { permission: "member.manage", input: invited },
    withdrawInvitation: { permission: "member.manage", input: invited },
    changeRole: {
      permission: "member.manage",
      input: ({ viewers }) => ({ member: viewers.collaborator.userId, role: "builder" }),
    },
    removeMember: { permission: "member.manage", input: ({ viewers }) => ({ member: viewers.collaborator.userId }) },
    leaveProject: { permission: "membership.leave", input: () => ({}) },
  },
  "app/(workshop)/projects/actions.ts": {
    createProject: { permission: "own" },
    editProject: { permission: "project.edit", input: () => ({ ...form, version: 1 }) },
    archiveProject: { permission: "project.archive", input: () => ({}) },
    restoreProject: {
      permission: "project.archive",
      input: async (machine) => {
        await archived(machine);
        return {};
      },
    },
    purgeProject: {
      permission: "project.archive",
      input: async (machine) => {
        await archived(machine);
        return { confirmation: "Tide computer" };
      },
    },
  },
};
