import type { ReactNode } from "react";
import { Page } from "@/components/shell/Page";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import type { BenchSessionsView } from "@/lib/bench-session/sessions-view";
import { formatDuration } from "@/lib/calc/units";
import { PaceTable } from "./PaceTable";
import { SessionTable } from "./SessionTable";

type Props = { view: BenchSessionsView; project: string; zone: string; control: ReactNode };

/** Who was at the bench, when, for how long, and what came of it. */
export function SessionsPlace({ view: { sessions, paceLines }, project, zone, control }: Props) {
  const seconds = sessions.reduce((sum, session) => sum + session.seconds, 0);
  return (
    <Page
      title="Sessions at the bench"
      lede={
        sessions.length === 0
          ? "A session begins when somebody starts it, or with the first attempt of an evening."
          : `${sessions.length} in half a year, ${formatDuration(seconds)} from the first to the last attempt. One ends when nothing was recorded for an hour and a half.`
      }
      aside={
        <>
          {control}
          <PaceTable lines={paceLines} project={project} />
        </>
      }
    >
      {sessions.length === 0 ? (
        <EmptyState title="Nobody was at the bench yet">
          Sessions appear here with the first attempt that is recorded.
        </EmptyState>
      ) : (
        <Panel title="Sessions" note={`${sessions.length}`}>
          <SessionTable sessions={sessions} zone={zone} />
        </Panel>
      )}
    </Page>
  );
}
