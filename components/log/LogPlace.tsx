import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { LinkTabs } from "@/components/ui/LinkTabs";
import { EVENT_GROUPS, GROUP_LABELS } from "@/lib/event/event-group";
import type { LogQuery, LogView } from "@/lib/log-entry/load-log";
import { logAddress } from "@/lib/log-entry/log-address";
import { LogDay } from "./LogDay";
import { LogFilters } from "./LogFilters";
import { byDay } from "./by-day";

type Props = { project: string; zone: string; query: LogQuery; log: LogView; canWrite: boolean };

/** Everything that happened, newest first, and what people wrote about it. */
export function LogPlace({ project, zone, query, log, canWrite }: Props) {
  const { show, unit, by } = query;
  const isFiltered = show !== undefined || unit !== undefined || by !== undefined;
  const tab = (group: LogQuery["show"], label: string) => ({
    href: logAddress(project, { show: group, unit, by }),
    label,
    isCurrent: show === group,
  });
  return (
    <Page
      title="Log"
      lede="What people wrote and what happened, newest first."
      actions={
        canWrite && (
          <ButtonLink kind="primary" href={`/projects/${project}/log/new`}>
            Write an entry
          </ButtonLink>
        )
      }
    >
      <div className="flex flex-col gap-5">
        <div className="flex flex-col gap-3 print:hidden">
          <LinkTabs
            label="What to show"
            tabs={[tab(undefined, "Everything"), ...EVENT_GROUPS.map((group) => tab(group, GROUP_LABELS[group]))]}
          />
          <LogFilters project={project} query={query} units={log.units} people={log.people} />
        </div>
        {log.items.length === 0 ? (
          <Nothing {...{ project, isFiltered, canWrite }} />
        ) : (
          byDay(log.items, zone).map((day) => <LogDay key={day.label} {...{ project, zone }} {...day} />)
        )}
        <nav aria-label="Pages of the log" className="flex flex-wrap justify-between gap-2 empty:hidden print:hidden">
          {query.before !== undefined && <ButtonLink href={logAddress(project, { show, unit, by })}>Newest</ButtonLink>}
          {log.older !== null && (
            <ButtonLink className="ml-auto" href={logAddress(project, { show, unit, by, before: log.older })}>
              Older
            </ButtonLink>
          )}
        </nav>
      </div>
    </Page>
  );
}

function Nothing({ project, isFiltered, canWrite }: { project: string; isFiltered: boolean; canWrite: boolean }) {
  if (isFiltered) {
    return (
      <EmptyState
        title="Nothing of this kind"
        action={<ButtonLink href={logAddress(project, {})}>Show everything</ButtonLink>}
      >
        No event fits these filters.
      </EmptyState>
    );
  }
  return (
    <EmptyState
      title="Nothing has happened yet"
      action={canWrite && <ButtonLink href={`/projects/${project}/log/new`}>Write the first entry</ButtonLink>}
    >
      Each attempt, reopening and change of the machine comes here by itself. Entries are what people write beside it:
      what was tried, what was found, with pictures.
    </EmptyState>
  );
}
