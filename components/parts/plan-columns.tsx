import Link from "next/link";
import { Badge } from "@/components/ui/Badge";
import type { TableColumn } from "@/components/ui/table-column";
import { counted } from "@/components/workshop/counted";
import type { PlanLine } from "@/lib/board-plan/load-plan-overview";

export const columnsFor = (project: string): TableColumn<PlanLine>[] => [
  { id: "code", header: "Code", mono: true, sortBy: ({ code }) => code, cell: ({ code }) => code },
  {
    id: "name",
    header: "Board",
    isRowHeader: true,
    sortBy: ({ name }) => name,
    cell: (line) => (
      <span className="flex flex-col">
        <BoardLink project={project} line={line} />
        <span className="text-sm font-normal text-ink-soft">{blocksText(line)}</span>
      </span>
    ),
  },
  { id: "family", header: "Family", mono: true, sortBy: familyText, cell: familyText },
  {
    id: "packages",
    header: "Packages",
    mono: true,
    align: "end",
    sortBy: ({ packages }) => packages,
    cell: ({ packages }) => packages || "–",
  },
  {
    id: "spares",
    header: "Spare gates",
    align: "end",
    sortBy: ({ spares }) => spares,
    cell: (line) => <Spares line={line} />,
  },
  {
    id: "others",
    header: "Other parts",
    mono: true,
    align: "end",
    sortBy: ({ otherParts }) => otherParts,
    cell: ({ otherParts }) => otherParts || "–",
  },
  {
    id: "planned",
    header: "To build",
    mono: true,
    align: "end",
    sortBy: toBuild,
    cell: toBuild,
  },
  { id: "built", header: "There", mono: true, align: "end", sortBy: ({ built }) => built, cell: ({ built }) => built },
];

function toBuild({ planned, built }: PlanLine): number {
  return planned ?? built;
}

function familyText({ family, packages }: PlanLine): string {
  return packages > 0 ? family : "–";
}

const blocksText = ({ blocks, problem }: PlanLine) =>
  problem ?? (blocks.map(({ name, count }) => (count === 1 ? name : `${count} × ${name}`)).join(", ") || "no blocks");

const BoardLink = ({ project, line }: { project: string; line: PlanLine }) => (
  <Link href={`/projects/${project}/parts/boards/${line.code}`} className="link w-fit">
    {line.name}
  </Link>
);

function Spares({ line }: { line: PlanLine }) {
  if (line.spares === 0) return <span className="mono text-sm">–</span>;
  return (
    <span className="inline-flex items-center gap-2">
      {line.tied === false && <Badge tone="doubtful">not tied</Badge>}
      <span className="mono text-sm">{line.spares}</span>
    </span>
  );
}

export function PhoneLine({ project, line }: { project: string; line: PlanLine }) {
  return (
    <div className="flex flex-col gap-1 border-b border-rule pb-2.5">
      <span className="flex items-baseline gap-2">
        <span className="mono text-sm">{line.code}</span>
        <BoardLink project={project} line={line} />
      </span>
      <p className="text-sm text-ink-soft">{blocksText(line)}</p>
      <p className="flex flex-wrap items-center gap-x-4 gap-y-0.5 text-sm">
        <span>{line.packages > 0 ? `${counted(line.packages, "package")}, ${line.family}` : "no packages"}</span>
        {line.spares > 0 && (
          <span className="inline-flex items-center gap-1.5">
            {line.spares} spare {line.tied === false && <Badge tone="doubtful">not tied</Badge>}
          </span>
        )}
        {line.otherParts > 0 && <span>{counted(line.otherParts, "other part")}</span>}
        <span>
          {toBuild(line)} to build, {line.built} there
        </span>
      </p>
    </div>
  );
}
