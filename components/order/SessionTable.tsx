"use client";

import { Badge } from "@/components/ui/Badge";
import { DateTime } from "@/components/ui/DateTime";
import { Table } from "@/components/ui/Table";
import type { TableColumn } from "@/components/ui/table-column";
import type { SessionLine } from "@/lib/bench-session/sessions-view";
import { formatDuration } from "@/lib/calc/units";

type Props = { sessions: readonly SessionLine[]; zone: string };

const lengthOf = ({ isRunning, seconds }: SessionLine) =>
  isRunning ? "runs" : seconds === 0 ? "one attempt" : formatDuration(seconds);

/** One session a row, the newest first. */
export function SessionTable({ sessions, zone }: Props) {
  const columns: TableColumn<SessionLine>[] = [
    {
      id: "when",
      header: "Began",
      cell: ({ startedAt }) => <DateTime at={startedAt} zone={zone} />,
      sortBy: ({ startedAt }) => startedAt,
      isRowHeader: true,
      className: "whitespace-nowrap",
    },
    { id: "builder", header: "Builder", cell: ({ builder }) => builder, sortBy: ({ builder }) => builder },
    {
      id: "length",
      header: "Length",
      cell: lengthOf,
      sortBy: ({ seconds }) => seconds,
      align: "end",
      className: "whitespace-nowrap",
    },
    { id: "done", header: "What was done", cell: (session) => <Done session={session} /> },
    { id: "how", header: "Known from", cell: ({ typed }) => <How typed={typed} />, sortBy: ({ typed }) => typed },
  ];
  return (
    <Table
      label="Sessions"
      columns={columns}
      rows={sessions}
      rowKey={({ key }) => key}
      empty={null}
      phone={(session) => (
        <div className="rounded-md border border-rule px-3 py-2">
          <p className="flex justify-between gap-3">
            <span className="font-semibold">
              <DateTime at={session.startedAt} zone={zone} />
            </span>
            <span className="whitespace-nowrap">{lengthOf(session)}</span>
          </p>
          <p className="mt-0.5 flex items-center gap-2 text-sm text-ink-soft">
            {session.builder} <How typed={session.typed} />
          </p>
          <div className="mt-1 text-[0.9375rem]">
            <Done session={session} />
          </div>
        </div>
      )}
    />
  );
}

function Done({ session: { stages, units, attempts } }: { session: SessionLine }) {
  if (attempts === 0) return <span className="text-ink-soft">Nothing was recorded.</span>;
  return (
    <>
      {stages} <span className="mono text-sm text-ink-soft">{units.join(", ")}</span>
    </>
  );
}

const How = ({ typed }: { typed: boolean }) => <Badge tone="plain">{typed ? "started by hand" : "attempts"}</Badge>;
