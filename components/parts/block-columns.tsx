import Link from "next/link";
import type { TableColumn } from "@/components/ui/table-column";
import { counted } from "@/components/workshop/counted";
import type { BlockLine } from "@/lib/block/load-blocks";

const gateCount = ({ allGates }: BlockLine) => allGates.reduce((sum, { count }) => sum + count, 0);

export const columnsFor = (project: string): TableColumn<BlockLine>[] => [
  {
    id: "name",
    header: "Block",
    isRowHeader: true,
    sortBy: (block) => block.name,
    cell: (block) => (
      <span className="flex flex-col">
        <BlockLink project={project} block={block} />
        {block.summary && <span className="line-clamp-1 text-sm font-normal text-ink-soft">{block.summary}</span>}
      </span>
    ),
  },
  {
    id: "holds",
    header: "Holds",
    searchIn: (block) => contentsText(block),
    cell: (block) => <span className="text-sm text-ink-soft">{contentsText(block) || "nothing yet"}</span>,
  },
  { id: "gates", header: "Gates in all", align: "end", mono: true, sortBy: gateCount, cell: gateCount },
  {
    id: "boards",
    header: "On boards",
    searchIn: (block) => block.boards.map(({ code }) => code).join(" "),
    cell: (block) => <Boards project={project} block={block} />,
  },
];

const contentsText = ({ gates, children }: BlockLine) =>
  [...gates, ...children].map(({ count, name }) => `${count} × ${name}`).join(", ");

const BlockLink = ({ project, block }: { project: string; block: BlockLine }) => (
  <Link href={`/projects/${project}/parts/blocks/${block.id}`} className="link w-fit">
    {block.name}
  </Link>
);

function Boards({ project, block }: { project: string; block: BlockLine }) {
  if (block.boards.length === 0) return <span className="text-sm text-ink-soft">none</span>;
  return (
    <span className="flex flex-wrap gap-x-3 gap-y-0.5 text-sm">
      {block.boards.map(({ code, count }) => (
        <Link
          key={code}
          href={`/projects/${project}/parts/boards/${code}`}
          className="inline-flex min-h-6 items-center gap-1 whitespace-nowrap hover:text-copper"
        >
          <span className="mono">{code}</span>
          <span className="text-ink-soft">× {count}</span>
        </Link>
      ))}
    </span>
  );
}

export function PhoneBlock({ project, block }: { project: string; block: BlockLine }) {
  return (
    <div className="flex flex-col gap-1 border-b border-rule pb-2.5">
      <span className="flex items-baseline justify-between gap-3">
        <BlockLink project={project} block={block} />
        <span className="mono shrink-0 text-sm">{counted(gateCount(block), "gate")}</span>
      </span>
      <p className="text-sm text-ink-soft">{contentsText(block) || "nothing yet"}</p>
      <Boards project={project} block={block} />
    </div>
  );
}
