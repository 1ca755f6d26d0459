"use client";

import { useAct } from "@/components/board/use-act";
import { Button } from "@/components/ui/Button";
import type { Reply } from "@/components/ui/form/reply";
import { formatDuration } from "@/lib/calc/units";

type Input = { project: string; writeId: string };
export type SessionActs = {
  start: (input: Input) => Promise<Reply<{ startedAt: string }>>;
  stop: (input: Input) => Promise<Reply<{ seconds: number; endedBefore: boolean }>>;
};

type Props = { project: string; isRunning: boolean; acts: SessionActs; className?: string };

/** Sits down at the bench and gets up again. */
export function SessionButton({ project, isRunning, acts, className = "" }: Props) {
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
    <Button className={className} isPending={isPending} onPress={() => void (isRunning ? stop() : start())}>
      {isRunning ? "Stop the session" : "Start a session"}
    </Button>
  );
}
