"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { useWriteId } from "@/components/account/use-write-id";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { reach, type Reply } from "@/components/ui/form/reply";
import { IconButton } from "@/components/ui/IconButton";
import { Menu, type MenuEntry } from "@/components/ui/Menu";
import { toast } from "@/components/ui/toast-store";
import type { MemberLine } from "./member-line";
import { ROLE_WORDS, type RoleName } from "./role-words";

type Target = { project: string; writeId: string; member: string };
export type MemberActs = {
  project: string;
  projectName: string;
  changeRole: (input: Target & { role: RoleName }) => Promise<Reply<null>>;
  removeMember: (input: Target) => Promise<Reply<{ name: string }>>;
};

const ROLES: readonly RoleName[] = ["maintainer", "builder", "collaborator"];
type Asked = { act: "remove" } | { act: "role"; role: RoleName };

export function MemberActions({ member, ...acts }: MemberActs & { member: MemberLine }) {
  const [asked, setAsked] = useState<Asked>();
  const { name, role, isLast } = member;
  const why = isLast ? "The last maintainer keeps the role" : undefined;
  const entries: MenuEntry[] = [
    ...ROLES.filter((one) => one !== role).map((one) => ({
      id: one,
      label: `Make ${one}`,
      onAction: () => setAsked({ act: "role" as const, role: one }),
      isDisabled: isLast,
      ...(why ? { description: why } : {}),
    })),
    "line",
    {
      id: "remove",
      label: "Remove from the project",
      isDanger: true,
      isDisabled: isLast,
      onAction: () => setAsked({ act: "remove" }),
    },
  ];
  return (
    <>
      <Menu
        label={`Change ${name}`}
        trigger={<IconButton icon="more" label={`Change ${name}`} tooltip={false} />}
        entries={entries}
      />
      {asked && <Ask key={asked.act} asked={asked} member={member} close={() => setAsked(undefined)} {...acts} />}
    </>
  );
}

type AskProps = MemberActs & { asked: Asked; member: MemberLine; close: () => void };

function Ask({ asked, member, close, project, projectName, changeRole, removeMember }: AskProps) {
  const router = useRouter();
  const { writeId } = useWriteId();
  const target = { project, writeId, member: member.userId };
  const { name } = member;

  async function perform(): Promise<string | void> {
    const reply =
      asked.act === "role"
        ? await reach(() => changeRole({ ...target, role: asked.role }))
        : await reach<unknown>(() => removeMember(target));
    if (!reply.ok) return reply.error.message;
    toast({ text: asked.act === "role" ? `${name} is ${asked.role} now.` : `${name} is no longer on the project.` });
    router.refresh();
  }

  return (
    <ConfirmDialog
      isOpen
      onOpenChange={(isOpen) => !isOpen && close()}
      title={asked.act === "role" ? `Make ${name} ${asked.role}?` : `Remove ${name} from ${projectName}?`}
      kind={asked.act === "role" ? "primary" : "danger"}
      confirmLabel={asked.act === "role" ? `Make ${asked.role}` : `Remove ${name}`}
      consequences={asked.act === "role" ? roleConsequences(member, asked.role) : removalConsequences(member)}
      onConfirm={perform}
    />
  );
}

function roleConsequences(member: MemberLine, role: RoleName): string[] {
  const who = member.isSelf ? "You" : member.name;
  const own =
    member.isSelf && member.role === "maintainer" ? ["Another maintainer has to make you maintainer again."] : [];
  return [`${who}, as ${role}: ${ROLE_WORDS[role].may}`, "It holds at once, on every device.", ...own];
}

function removalConsequences(member: MemberLine): string[] {
  return [
    `${member.isSelf ? "You see" : `${member.name} sees`} nothing of the project from now on, and the weekly e-mail ends.`,
    "What was recorded, attached and written stays, with the name.",
    "A new invitation brings the person back.",
  ];
}
