import { DateTime } from "@/components/ui/DateTime";
import { Panel } from "@/components/ui/Panel";
import { SessionButton, type SessionActs } from "./SessionButton";

type Props = { project: string; zone: string; running: string | null; acts: SessionActs };

/** Whether one is at the bench. Whoever forgets to stop is up when nothing was recorded for an hour and a half. */
export function SessionControl({ project, zone, running, acts }: Props) {
  return (
    <Panel title="At the bench">
      <p className="text-[0.9375rem] text-ink-soft">
        {running ? (
          <>
            You sat down <DateTime at={running} zone={zone} form="short" />. The session ends by itself when nothing was
            recorded for an hour and a half.
          </>
        ) : (
          "Start a session and its length counts, also where nothing is recorded. Without one the attempts say when you were here."
        )}
      </p>
      <SessionButton className="mt-3" project={project} isRunning={running !== null} acts={acts} />
    </Panel>
  );
}
