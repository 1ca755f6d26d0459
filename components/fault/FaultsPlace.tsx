import Link from "next/link";
import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { DateTime } from "@/components/ui/DateTime";
import { EmptyState } from "@/components/ui/EmptyState";
import { LinkTabs } from "@/components/ui/LinkTabs";
import type { FaultLine, FaultQuery, FaultShow, FaultsView } from "@/lib/fault/load-faults";
import { writeHours } from "@/lib/fault/fault-words";
import { faultsAddress } from "./fault-address";
import { FaultFilters } from "./FaultFilters";
import { FaultStateMark } from "./FaultStateMark";

type Props = { project: string; zone: string; query: FaultQuery; view: FaultsView; canWrite: boolean };

const TABS: readonly [FaultShow, string][] = [
  ["standing", "Not mended"],
  ["open", "Open"],
  ["traced", "Traced"],
  ["mended", "Mended"],
  ["no-fault", "No fault"],
  ["all", "All"],
];

/** Every recorded defect of the project, the newest first. */
export function FaultsPlace({ project, zone, query, view, canWrite }: Props) {
  const { open, traced, mended } = view.counts;
  return (
    <Page
      title="Faults"
      lede={sentence(open, traced, mended)}
      actions={
        canWrite && (
          <ButtonLink
            kind="primary"
            href={`/projects/${project}/faults/new${query.unit ? `?unit=${encodeURIComponent(query.unit)}` : ""}`}
          >
            Write a fault down
          </ButtonLink>
        )
      }
    >
      <div className="flex flex-col gap-4">
        <LinkTabs
          label="Which faults"
          tabs={TABS.map(([show, label]) => ({
            href: faultsAddress(project, { ...query, show }),
            label,
            isCurrent: query.show === show,
            count: view.counts[show],
          }))}
        />
        <FaultFilters project={project} query={query} boards={view.boards} units={view.units} />
        {view.lines.length === 0 ? (
          <Nothing {...{ project, query, canWrite }} isFirst={view.counts.all === 0} />
        ) : (
          <ul className="border-rule bg-sheet divide-rule divide-y rounded-lg border">
            {view.lines.map((line) => (
              <Line key={line.number} {...{ project, zone, line }} />
            ))}
          </ul>
        )}
      </div>
    </Page>
  );
}

function Line({ project, zone, line }: { project: string; zone: string; line: FaultLine }) {
  const names = [...line.signals, ...line.pins];
  return (
    <li className="hover:bg-raised relative grid grid-cols-[2.25rem_minmax(0,1fr)] gap-x-3 px-4 py-3.5 sm:grid-cols-[3.5rem_minmax(0,1fr)_11rem] sm:px-5">
      <span className="mono pt-0.5 font-semibold">F{line.number}</span>
      <div className="min-w-0">
        <p className="flex flex-wrap items-baseline gap-x-2.5 gap-y-1">
          <Link
            href={`/projects/${project}/faults/${line.number}`}
            className="font-semibold after:absolute after:inset-0 hover:underline"
          >
            {line.title}
          </Link>
          <FaultStateMark state={line.state} />
        </p>
        {line.says && <p className="text-ink-soft mt-0.5 line-clamp-2 text-[0.9375rem]">{line.says}</p>}
        {names.length > 0 && <p className="mono text-ink-soft mt-1 text-xs">{names.join("  ")}</p>}
      </div>
      <p className="text-ink-soft text-sm max-sm:col-start-2 max-sm:mt-1.5 sm:text-right">
        <span className="mono text-ink font-semibold">{line.serial}</span>
        <span className="sm:hidden"> · </span>
        <span className="sm:block">{line.by}</span>
        <span className="sm:hidden">, </span>
        <DateTime at={line.at} zone={zone} form="short" className="sm:block" />
        {(line.reworks > 0 || line.hours !== null) && (
          <span className="block">
            {[
              line.reworks > 0 ? `${line.reworks} ${line.reworks === 1 ? "rework" : "reworks"}` : "",
              line.hours === null ? "" : writeHours(line.hours),
            ]
              .filter(Boolean)
              .join(", ")}
          </span>
        )}
      </p>
    </li>
  );
}

function sentence(open: number, traced: number, mended: number): string {
  if (open + traced + mended === 0) return "What was found to be wrong, what it was and how it was mended.";
  const parts = [
    ...(open > 0 ? [`${open} ${open === 1 ? "is" : "are"} open`] : []),
    ...(traced > 0 ? [`${traced} traced`] : []),
    ...(mended > 0 ? [`${mended} mended`] : []),
  ];
  return `${parts.join(", ")}.`;
}

type NothingProps = { project: string; query: FaultQuery; canWrite: boolean; isFirst: boolean };

function Nothing({ project, query, canWrite, isFirst }: NothingProps) {
  if (isFirst) {
    return (
      <EmptyState
        title="No fault has been written down"
        action={canWrite && <ButtonLink href={`/projects/${project}/faults/new`}>Write the first one down</ButtonLink>}
      >
        A fault keeps what was seen, what it turned out to be, how it was mended and what the next revision should
        change. A failing check on a traveler becomes one with a single press.
      </EmptyState>
    );
  }
  const isFiltered = query.q !== "" || query.board !== undefined || query.unit !== undefined;
  return (
    <EmptyState
      title={isFiltered ? "Nothing matches" : query.show === "standing" ? "Everything is mended" : "None stands so"}
      action={<ButtonLink href={faultsAddress(project, { show: "all" })}>Show all faults</ButtonLink>}
    >
      {isFiltered
        ? "Words are found in any of their forms, signals and pins as they are written."
        : query.show === "standing"
          ? "No fault is open or waits for its mend."
          : "No fault of this project is in this state."}
    </EmptyState>
  );
}
