"use client";

import { DateTime } from "@/components/ui/DateTime";
import { EmptyState } from "@/components/ui/EmptyState";
import { Table } from "@/components/ui/Table";
import type { TableColumn } from "@/components/ui/table-column";
import { HOURS, WEEKDAYS } from "./digest-options";

type Subscriber = {
  userId: string;
  name: string | null;
  email: string;
  role: string;
  verifiedAt: Date | null;
  bouncedAt: Date | null;
  enabled: boolean | null;
  weekday: number | null;
  hour: number | null;
  zone: string | null;
  nextDueAt: Date | null;
};
type Props = { subscribers: readonly Subscriber[]; zone: string };

/** Why somebody gets none comes before when they get one. */
function stateOf({ enabled, bouncedAt, verifiedAt }: Subscriber): string {
  if (!enabled) return "Off";
  if (bouncedAt) return "Held: mail to the address came back. It goes on once the address is confirmed again.";
  return verifiedAt ? "On" : "Held until the address is confirmed";
}

const nameOf = ({ name, email }: Subscriber) => name ?? email;

function when({ enabled, weekday, hour, zone }: Subscriber): string {
  if (!enabled || weekday === null || hour === null) return "";
  return `${WEEKDAYS[weekday - 1]?.label ?? ""} ${HOURS[hour]?.label ?? ""}, ${zone ?? ""}`;
}

export function SubscriberTable({ subscribers, zone }: Props) {
  const next = (one: Subscriber) => (one.enabled && one.nextDueAt ? <DateTime at={one.nextDueAt} zone={zone} /> : "");
  const columns: TableColumn<Subscriber>[] = [
    { id: "name", header: "Member", cell: nameOf, sortBy: nameOf, isRowHeader: true },
    { id: "state", header: "State", cell: stateOf, sortBy: stateOf },
    { id: "when", header: "When", cell: when },
    { id: "next", header: "Next", cell: next, sortBy: (one) => one.nextDueAt?.getTime() },
  ];
  return (
    <Table
      label="Members and their weekly e-mail"
      className="px-4 py-2"
      columns={columns}
      rows={subscribers}
      rowKey={(one) => one.userId}
      phone={(one) => (
        <div className="flex flex-col gap-0.5 border-b border-rule pb-2">
          <b>{nameOf(one)}</b>
          <span>{stateOf(one)}</span>
          {one.enabled && (
            <span className="text-sm text-ink-soft">
              {when(one)} · next {next(one)}
            </span>
          )}
        </div>
      )}
      empty={<EmptyState title="Nobody is on the project">Invite people on the page of people.</EmptyState>}
    />
  );
}
