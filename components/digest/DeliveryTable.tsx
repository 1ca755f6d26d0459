"use client";

import { DateTime } from "@/components/ui/DateTime";
import { EmptyState } from "@/components/ui/EmptyState";
import { Table } from "@/components/ui/Table";
import type { TableColumn } from "@/components/ui/table-column";

type Delivery = {
  id: string;
  name: string | null;
  email: string;
  dueAt: Date;
  state: "claimed" | "sent" | "quiet" | "failed";
  tries: number;
  error: string | null;
  sentAt: Date | null;
};
type Props = { deliveries: readonly Delivery[]; zone: string };

const nameOf = ({ name, email }: Delivery) => name ?? email;

function stateOf({ state, tries, error }: Delivery): string {
  const after = tries > 1 ? ` after ${tries} tries` : "";
  if (state === "sent") return `Sent${after}`;
  if (state === "quiet") return "Nothing happened, no mail wanted";
  if (state === "failed") return `Given up${after}${error ? `: ${error}` : ""}`;
  return error ? `Tried ${tries === 1 ? "once" : `${tries} times`}, goes on: ${error}` : "Under way";
}

export function DeliveryTable({ deliveries, zone }: Props) {
  const columns: TableColumn<Delivery>[] = [
    {
      id: "due",
      header: "Due",
      cell: (one) => <DateTime at={one.dueAt} zone={zone} />,
      sortBy: (one) => one.dueAt.getTime(),
    },
    { id: "name", header: "To", cell: nameOf, sortBy: nameOf, isRowHeader: true },
    { id: "state", header: "What became of it", cell: stateOf, sortBy: stateOf },
  ];
  return (
    <Table
      label="Weekly e-mails sent lately"
      className={deliveries.length > 0 ? "px-4 py-2" : ""}
      columns={columns}
      rows={deliveries}
      rowKey={(one) => one.id}
      pageSize={15}
      phone={(one) => (
        <div className="flex flex-col gap-0.5 border-b border-rule pb-2">
          <b>{nameOf(one)}</b>
          <span>{stateOf(one)}</span>
          <span className="text-sm text-ink-soft">
            <DateTime at={one.dueAt} zone={zone} />
          </span>
        </div>
      )}
      empty={
        <EmptyState title="Nothing was sent yet">
          The first weekly e-mail goes out at the first reader’s hour.
        </EmptyState>
      }
    />
  );
}
