import clsx from "clsx";
import { Fragment } from "react";
import { Badge } from "@/components/ui/Badge";
import { counted } from "@/components/workshop/counted";
import type { FamilyLine } from "@/lib/family/load-families";
import { COLUMNS, type FamilyActs } from "./family-acts";
import { FamilyRowActs } from "./FamilyRowActs";

type Props = { label: string; lines: readonly FamilyLine[]; project: string; acts: FamilyActs | undefined };

/** Figures in columns, with their source under each; the name stays in sight while the figures go by. */
export function FamilyTable({ label, lines, project, acts }: Props) {
  return (
    <div
      tabIndex={0}
      role="group"
      aria-label={`${label}, scrolls sideways`}
      className="relative -mx-4 overflow-x-auto sm:-mx-5"
    >
      <table aria-label={label} className="w-full border-separate border-spacing-0 text-left">
        <thead>
          <tr className="text-sm text-ink-soft">
            <th scope="col" className="sticky left-0 z-10 bg-sheet py-1.5 pl-4 pr-3 font-semibold sm:pl-5">
              Family
            </th>
            {COLUMNS.map(({ header, title }) => (
              <th
                key={header}
                scope="col"
                className="mono whitespace-nowrap px-2 py-1.5 text-right text-xs font-semibold last:pr-5"
              >
                <abbr title={title} className="no-underline">
                  {header}
                </abbr>
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {lines.map((line) => (
            <Fragment key={line.id ?? line.family.name}>
              <FamilyRow line={line} />
              <SourceRow line={line} project={project} acts={acts} />
            </Fragment>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function FamilyRow({ line: { family, pins, replacedBy } }: { line: FamilyLine }) {
  return (
    <tr className={clsx(replacedBy !== null && "text-ink-faint")}>
      <th
        scope="row"
        className="sticky left-0 z-10 border-t border-rule bg-sheet py-2 pl-4 pr-3 align-baseline font-semibold sm:pl-5"
      >
        <span className="mono text-sm">{family.name}</span>
        <span className="block whitespace-nowrap text-xs font-normal text-ink-soft">
          {family.technology}
          {pins > 0 && `, ${counted(pins, "pin")}`}
        </span>
      </th>
      {COLUMNS.map(({ header, text }) => (
        <td
          key={header}
          className="mono whitespace-nowrap border-t border-rule px-2 py-2 text-right align-baseline text-xs last:pr-5"
        >
          {text(family) || <span className="text-ink-faint">–</span>}
        </td>
      ))}
    </tr>
  );
}

function SourceRow({ line, project, acts }: { line: FamilyLine } & Pick<Props, "project" | "acts">) {
  const { family, replaces, replacedBy } = line;
  const { supply } = family;
  return (
    <tr>
      <td colSpan={COLUMNS.length + 1} className="pb-2">
        <div className="sticky left-0 flex w-[min(calc(100vw-3rem),76rem)] flex-wrap items-center gap-x-3 gap-y-1 pl-4 pr-3 text-xs text-ink-soft sm:pl-5">
          {replaces && <Badge tone="copper">stands for the built-in {replaces}</Badge>}
          {replacedBy && <Badge>replaced by your {replacedBy}</Badge>}
          <span className="min-w-0 flex-1 basis-64">
            {family.source}
            {supply && ` For supplies from ${supply.minVolts} to ${supply.maxVolts} V.`}
          </span>
          {acts && <FamilyRowActs line={line} project={project} acts={acts} />}
        </div>
      </td>
    </tr>
  );
}
