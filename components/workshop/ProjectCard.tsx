import Link from "next/link";
import { Badge } from "@/components/ui/Badge";
import { StateWord } from "@/components/ui/glyphs/StateWord";
import type { ProjectCardView } from "@/lib/project/load-projects";

const counted = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

/** One machine among others: how far it is, and what wants attention. */
export function ProjectCard({ project }: { project: ProjectCardView }) {
  const { checks, holding, failing, doubtful } = project;
  const share = (count: number) => `${(count / Math.max(checks, 1)) * 100}%`;
  return (
    <Link
      href={`/projects/${project.slug}`}
      className="group flex h-full flex-col gap-3 rounded-lg border border-rule bg-sheet px-5 py-4 no-underline transition-colors hover:border-ink-soft"
    >
      <span className="flex items-start justify-between gap-3">
        <span className="font-head text-xl font-semibold leading-tight tracking-tight group-hover:text-copper">
          {project.name}
        </span>
        <Badge>{project.role}</Badge>
      </span>
      {project.summary && <span className="line-clamp-2 text-[0.9375rem] text-ink-soft">{project.summary}</span>}
      <span className="mt-auto flex flex-col gap-2 pt-1">
        <span aria-hidden="true" className="flex h-2 gap-px overflow-hidden rounded-sm bg-rule">
          <span className="bg-passed" style={{ width: share(holding) }} />
          <span className="bg-failed" style={{ width: share(failing) }} />
          <span className="bg-doubtful" style={{ width: share(doubtful) }} />
        </span>
        <span className="flex flex-wrap items-center gap-x-4 gap-y-1 text-sm text-ink-soft">
          {checks === 0 ? (
            <span>{project.boards === 0 ? "No boards yet." : "No checks yet."}</span>
          ) : (
            <span>
              <span className="mono text-ink">
                {holding}/{checks}
              </span>{" "}
              checks hold
            </span>
          )}
          {failing > 0 && (
            <StateWord state="failed" size="sm">
              {counted(failing, "fails", "fail")}
            </StateWord>
          )}
          {doubtful > 0 && <StateWord state="doubtful" size="sm">{`${doubtful} to repeat`}</StateWord>}
        </span>
        <span className="text-sm text-ink-soft">
          {counted(project.boards, "board", "boards")}, {counted(project.units, "unit", "units")}
        </span>
      </span>
    </Link>
  );
}
