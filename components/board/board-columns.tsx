import Link from "next/link";
import { Badge } from "@/components/ui/Badge";
import type { TableColumn } from "@/components/ui/table-column";
import type { BoardLine } from "@/lib/board/load-boards";
import { findConnector } from "@/lib/calc/connector";

export function columnsFor(project: string): TableColumn<BoardLine>[] {
  return [
    { id: "code", header: "Code", mono: true, sortBy: (board) => board.code, cell: (board) => board.code },
    {
      id: "name",
      header: "Board",
      isRowHeader: true,
      sortBy: (board) => board.name,
      cell: (board) => (
        <span className="flex flex-col">
          <Link href={`/projects/${project}/boards/${board.code}`} className="link w-fit">
            {board.name}
          </Link>
          {board.summary && <span className="line-clamp-1 text-sm font-normal text-ink-soft">{board.summary}</span>}
        </span>
      ),
    },
    {
      id: "connector",
      header: "Edge connector",
      sortBy: (board) => edgeWords(board.connectorType),
      cell: (board) => (
        <span className="text-sm text-ink-soft">
          {board.kind === "backplane" ? "backplane" : edgeWords(board.connectorType)}
        </span>
      ),
    },
    { id: "revision", header: "Rev", mono: true, sortBy: (board) => board.revision, cell: (board) => board.revision },
    {
      id: "units",
      header: "Units",
      mono: true,
      align: "end",
      sortBy: (board) => board.units,
      cell: (board) => board.units,
    },
    {
      id: "procedure",
      header: "Procedure",
      sortBy: (board) => board.issued ?? 0,
      cell: (board) => <ProcedureWord board={board} project={project} />,
    },
  ];
}

function ProcedureWord({ board, project }: { board: BoardLine; project: string }) {
  return (
    <Link
      href={`/projects/${project}/boards/${board.code}/procedure`}
      className="flex flex-wrap items-center gap-2 text-sm hover:text-copper"
    >
      {board.issued === null ? <span className="text-ink-soft">none issued</span> : <span>version {board.issued}</span>}
      {board.hasDraft && <Badge tone="copper">draft</Badge>}
    </Link>
  );
}

export function PhoneBoard({ board, project }: { board: BoardLine; project: string }) {
  return (
    <div className="flex flex-col gap-1 border-b border-rule pb-2.5">
      <Link href={`/projects/${project}/boards/${board.code}`} className="link w-fit font-semibold">
        {board.name}
      </Link>
      <p className="flex flex-wrap items-baseline gap-x-3 text-sm text-ink-soft">
        <span className="mono text-xs">
          {board.code} rev {board.revision}
        </span>
        <span>{board.units === 1 ? "1 unit" : `${board.units} units`}</span>
        <ProcedureWord board={board} project={project} />
      </p>
    </div>
  );
}

const edgeWords = (type: string | null): string =>
  type === "grid" ? "face of one's own" : (findConnector(type)?.label ?? "none");
