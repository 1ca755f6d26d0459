"use client";

import Link from "next/link";
import { useAct } from "@/components/board/use-act";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { IconButton } from "@/components/ui/IconButton";
import { Table } from "@/components/ui/Table";
import type { TableColumn } from "@/components/ui/table-column";
import type { CheckName, WaitLine } from "@/lib/order/waits-view";
import type { WaitActs } from "./order-acts";
import { checkHref } from "./order-addresses";

type Props = { waits: readonly WaitLine[]; project: string; acts: WaitActs | null };

const words = ({ serial, title }: CheckName) => `${serial} ${title}`;

/** Every prerequisite that people set, one a row. */
export function WaitsTable({ waits, project, acts }: Props) {
  const { act } = useAct();
  const remove = ({ check, needs }: WaitLine, { add, remove: take }: WaitActs) => {
    const input = () => ({
      ...{ project, writeId: crypto.randomUUID() },
      ...{ checkId: check.checkId, needsCheckId: needs.checkId },
    });
    const said = () => `“${check.title}” no longer waits for “${needs.title}”.`;
    void act(
      () => take(input()),
      said,
      () => add(input()),
    );
  };
  const button = (wait: WaitLine) =>
    acts && (
      <IconButton
        icon="close"
        label={`No longer let ${words(wait.check)} wait for ${words(wait.needs)}`}
        onPress={() => remove(wait, acts)}
      />
    );
  const columns: TableColumn<WaitLine>[] = [
    {
      id: "check",
      header: "Check",
      cell: ({ check }) => <Check check={check} project={project} />,
      sortBy: ({ check }) => words(check),
      isRowHeader: true,
    },
    {
      id: "needs",
      header: "waits for",
      cell: ({ needs }) => <Check check={needs} project={project} />,
      sortBy: ({ needs }) => words(needs),
    },
    ...(acts ? [{ id: "remove", header: "Remove", isHeaderHidden: true, width: "3rem", cell: button }] : []),
  ];
  return (
    <Table
      label="Prerequisites"
      columns={columns}
      rows={waits}
      rowKey={({ check, needs }) => `${check.checkId} ${needs.checkId}`}
      empty={null}
      search="Find a check"
      phone={(wait) => (
        <div className="flex items-start gap-2 rounded-md border border-rule px-3 py-2">
          <div className="min-w-0 flex-1">
            <Check check={wait.check} project={project} />
            <p className="my-0.5 text-sm text-ink-soft">waits for</p>
            <Check check={wait.needs} project={project} />
          </div>
          {button(wait)}
        </div>
      )}
    />
  );
}

function Check({ check, project }: { check: CheckName; project: string }) {
  const { checkId, serial, title, state } = check;
  return (
    <Link
      href={checkHref(project, serial, checkId)}
      className="group flex items-baseline gap-2 font-normal no-underline"
    >
      <StateGlyph state={state} size={12} label={state} className="translate-y-px" />
      <span className="mono text-sm whitespace-nowrap">{serial}</span>
      <span className="min-w-0 group-hover:text-copper">{title}</span>
    </Link>
  );
}
