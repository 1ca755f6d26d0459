"use client";

import { useAct } from "@/components/board/use-act";
import { Button } from "@/components/ui/Button";
import { DateTime } from "@/components/ui/DateTime";
import type { Reply } from "@/components/ui/form/reply";
import { Panel } from "@/components/ui/Panel";
import { formatDuration } from "@/lib/calc/units";

type Input = { project: string; writeId: string };
export type SessionActs = {
  start: (input: Input) => Promise<Reply<{ startedAt: string }>>;
  stop: (input: Input) => Promise<Reply<{ seconds: number; endedBefore: boolean }>>;
};

type Props = { project: string; zone: string; running: string | null; acts: SessionActs };

/** Sits down at the bench and gets up again. Whoever forgets it is up when nothing was recorded for an hour and a half. */
export function SessionControl({ project, zone, running, acts }: Props) {
  const { act, isPending } = useAct();
  const input = () => ({ project, writeId: crypto.randomUUID() });
  const start = () =>
    act(
      () => acts.start(input()),
      () => "You are at the bench.",
    );
  const stop = () =>
    act(
      () => acts.stop(input()),
      ({ seconds, endedBefore }) =>
        endedBefore
          ? `That session had ended by itself after ${formatDuration(seconds)}.`
          : `${formatDuration(seconds)} at the bench.`,
    );
  return (
    <Panel title="At the bench">
      <p className="text-[0.9375rem] text-ink-soft">
        {running ? (
          <>
            You sat down <DateTime at={running} zone={zone} form="short" />.
          </>
        ) : (
          "Start a session and its length counts, also where nothing is recorded. Without one the attempts say when you were here."
        )}
      </p>
      <Button className="mt-3" isPending={isPending} onPress={() => void (running ? stop() : start())}>
        {running ? "Stop the session" : "Start a session"}
      </Button>
    </Panel>
  );
}
