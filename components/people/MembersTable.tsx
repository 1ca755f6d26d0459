"use client";

import { Avatar } from "@/components/ui/Avatar";
import { Badge } from "@/components/ui/Badge";
import { DateTime } from "@/components/ui/DateTime";
import { Table } from "@/components/ui/Table";
import type { TableColumn } from "@/components/ui/table-column";
import type { MemberLine } from "./member-line";
import { MemberActions, type MemberActs } from "./MemberActions";
import { ROLE_WORDS } from "./role-words";

type Props = MemberActs & { members: readonly MemberLine[]; zone: string; canManage: boolean };

export function MembersTable({ members, zone, canManage, ...acts }: Props) {
  const columns: TableColumn<MemberLine>[] = [
    {
      id: "name",
      header: "Name",
      cell: (member) => <Person member={member} />,
      sortBy: (member) => member.name,
      isRowHeader: true,
    },
    { id: "role", header: "Role", cell: (member) => ROLE_WORDS[member.role].name, sortBy: (member) => member.role },
    {
      id: "since",
      header: "Member since",
      cell: (member) => <DateTime at={member.since} zone={zone} form="day" />,
      sortBy: (member) => new Date(member.since).getTime(),
      className: "whitespace-nowrap",
    },
    {
      id: "digest",
      header: "Weekly e-mail",
      cell: (member) => (member.digest ? "on" : "off"),
      sortBy: (member) => member.digest,
    },
    ...(canManage
      ? [
          {
            id: "acts",
            header: "Change",
            isHeaderHidden: true,
            align: "end" as const,
            cell: (member: MemberLine) => <MemberActions member={member} {...acts} />,
          },
        ]
      : []),
  ];
  return (
    <Table
      label="Members"
      className="px-4 pb-3 sm:px-5"
      columns={columns}
      rows={members}
      rowKey={(member) => member.userId}
      empty={null}
      {...(members.length > 8 ? { search: "Find a member" } : {})}
      phone={(member) => (
        <div className="flex items-start justify-between gap-3 border-t border-rule pt-2.5">
          <div className="min-w-0">
            <Person member={member} />
            <p className="mt-1 text-sm text-ink-soft">
              {ROLE_WORDS[member.role].name} since <DateTime at={member.since} zone={zone} form="day" />,{" "}
              <span className="whitespace-nowrap">weekly e-mail {member.digest ? "on" : "off"}</span>
            </p>
          </div>
          {canManage && <MemberActions member={member} {...acts} />}
        </div>
      )}
    />
  );
}

function Person({ member }: { member: MemberLine }) {
  return (
    <span className="flex min-w-0 items-center gap-2.5">
      <Avatar name={member.name} />
      <span className="min-w-0">
        <span className="flex flex-wrap items-center gap-x-2">
          <span className="font-semibold">{member.name}</span>
          {member.isSelf && <Badge>you</Badge>}
        </span>
        {member.email && <span className="block truncate text-sm font-normal text-ink-soft">{member.email}</span>}
      </span>
    </span>
  );
}
