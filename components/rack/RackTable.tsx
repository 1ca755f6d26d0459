"use client";

import Link from "next/link";
import { Panel } from "@/components/ui/Panel";
import { Table } from "@/components/ui/Table";
import type { TableColumn } from "@/components/ui/table-column";
import { STAGES } from "@/lib/procedure/stages";
import type { RackBoard, RackSlot, RackUnit, RackView } from "@/lib/rack/rack-view";
import { CardStages } from "./CardStages";
import { slotAddress, unitAddress } from "./rack-addresses";
import { ToMend } from "./ToMend";

type Row = { key: string; slot: RackSlot | null; unit: RackUnit | null; board: RackBoard | null; name: string };

const held = (unit: RackUnit | null, index: number) => {
  const states = unit?.stages[index]?.states ?? [];
  return { held: states.filter((state) => state === "passed" || state === "conceded").length, total: states.length };
};

/** The same content as the drawing, to sort by any column. */
export function RackTable({ rack, project }: { rack: RackView; project: string }) {
  const rows: Row[] = [
    ...rack.slots.map((slot) => ({
      key: slot.id,
      slot,
      unit: slot.unit,
      board: slot.unit?.board ?? slot.board,
      name: slot.unit?.board.name ?? (slot.board ? `empty, wired for ${slot.board.name}` : "empty"),
    })),
    ...(rack.backplane ? [{ key: "backplane", slot: null, ...rack.backplane, name: rack.backplane.board.name }] : []),
    ...rack.loose.map((unit) => ({ key: unit.id, slot: null, unit, board: unit.board, name: unit.board.name })),
  ];
  return (
    <Panel className="@container">
      <Table<Row>
        label="Units by slot"
        columns={columnsFor(project)}
        rows={rows}
        rowKey={(row) => row.key}
        pageSize={100}
        empty={<p className="text-ink-soft">There are no slots and no units yet.</p>}
        phone={(row) => <PhoneRow row={row} project={project} />}
      />
    </Panel>
  );
}

function columnsFor(project: string): TableColumn<Row>[] {
  return [
    {
      id: "slot",
      header: "Slot",
      mono: true,
      sortBy: (row) => row.slot?.position ?? null,
      cell: (row) => row.slot?.position ?? "–",
    },
    {
      id: "card",
      header: "Card",
      isRowHeader: true,
      sortBy: (row) => row.name,
      cell: (row) => <RowName row={row} project={project} />,
    },
    {
      id: "unit",
      header: "Unit",
      mono: true,
      className: "whitespace-nowrap",
      sortBy: (row) => row.unit?.serial,
      cell: (row) => row.unit?.serial ?? "",
    },
    {
      id: "revision",
      header: "Rev",
      mono: true,
      sortBy: (row) => row.unit?.revision,
      cell: (row) => row.unit?.revision ?? "",
    },
    ...STAGES.map(({ id, short }, index) => ({
      id,
      header: short,
      mono: true,
      align: "end" as const,
      sortBy: (row: Row) => {
        const { held: count, total } = held(row.unit, index);
        return total === 0 ? null : count / total;
      },
      cell: (row: Row) => {
        const { held: count, total } = held(row.unit, index);
        return total === 0 ? "" : `${count}/${total}`;
      },
    })),
    {
      id: "open",
      header: "Fails",
      mono: true,
      align: "end",
      sortBy: (row) => row.unit?.failing,
      cell: (row) => (row.unit?.failing ? <span className="font-semibold text-failed">{row.unit.failing}</span> : ""),
    },
    {
      id: "doubt",
      header: "To repeat",
      mono: true,
      align: "end",
      sortBy: (row) => (row.unit ? row.unit.doubtful + row.unit.reopened : null),
      cell: (row) => {
        const count = (row.unit?.doubtful ?? 0) + (row.unit?.reopened ?? 0);
        return count > 0 ? <span className="font-semibold text-doubtful">{count}</span> : "";
      },
    },
    {
      id: "mend",
      header: "To mend",
      mono: true,
      align: "end",
      sortBy: (row) => row.board?.toMend,
      cell: (row) => (row.board?.toMend ? <span className="font-semibold text-failed">{row.board.toMend}</span> : ""),
    },
  ];
}

function RowName({ row, project }: { row: Row; project: string }) {
  if (row.unit)
    return (
      <Link href={unitAddress(project, row.unit.serial)} className="link">
        {row.name}
      </Link>
    );
  if (!row.slot) return <>{row.name}</>;
  return (
    <Link href={slotAddress(project, row.slot.position)} className="link font-normal text-ink-soft">
      {row.name}
    </Link>
  );
}

function PhoneRow({ row, project }: { row: Row; project: string }) {
  return (
    <div className="flex flex-col gap-2 border-b border-rule pb-3">
      <p className="flex flex-wrap items-baseline gap-x-2.5">
        <span className="mono w-6 text-sm text-ink-soft">{row.slot?.position ?? "–"}</span>
        <span className="font-semibold">
          <RowName row={row} project={project} />
        </span>
        <span className="mono text-xs text-ink-soft">
          {row.unit ? `${row.unit.serial} rev ${row.unit.revision}` : ""}
        </span>
        <ToMend board={row.board} className="mono" />
      </p>
      {row.unit && <CardStages unit={row.unit} layout="flow" />}
    </div>
  );
}
