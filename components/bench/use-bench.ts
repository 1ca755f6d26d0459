"use client";

import { useCallback, useEffect, useMemo, useState, useSyncExternalStore } from "react";
import { benchKind } from "@/lib/check-kinds/bench-list";
import type { CheckView } from "@/lib/traveler/traveler-view";
import type { BenchProps } from "./bench-props";
import { draftOf, keepDraft } from "./draft-store";
import { foresee } from "./foresee";
import { nextFree } from "./next-check";
import { onTheWay } from "./on-the-way";
import { arrivalIn, overtakenBy } from "./overtaken-by";
import { putBack } from "./queue/file-shelf";
import type { HeldAttempt, NewAttempt } from "./queue/held-attempt";
import { useQueue } from "./queue/use-queue";
import { useOvertaking } from "./use-overtaking";
import { useTraveler } from "./use-traveler";

/** Puts what was typed and taken for an attempt back into the check. */
export async function restore({ userId, body, files }: NewAttempt): Promise<void> {
  keepDraft(userId, body.checkId, { entry: body.record, note: body.note });
  await putBack(files);
}

/** A page kept for use without network was made for another check than its address may ask for now. */
function useCheckInAddress(): string | undefined {
  return useSyncExternalStore(
    () => () => undefined,
    () => new URL(location.href).searchParams.get("check") ?? undefined,
    () => undefined,
  );
}

/** The unit on the bench: the server's picture with what is on its way laid over it, and which check is open. */
export function useBench({ project, viewer, traveler: initial, openCheck }: BenchProps) {
  const { traveler, refresh } = useTraveler(project.slug, initial);
  const { queue, state } = useQueue(viewer.id);
  const [arrived, setArrived] = useState<HeldAttempt[]>([]);
  const overtaking = useOvertaking(traveler.checks, viewer.id, refresh);
  const [told, setTold] = useState<{ checkId: string; sentence: string }>();
  const first =
    initial.checks.find((check) => check.id === openCheck) ?? nextFree(initial.checks, undefined) ?? initial.checks[0];
  const [chosenId, setChosenId] = useState<string>();
  const addressed = useCheckInAddress();
  const inAddress = initial.checks.some((check) => check.id === addressed) ? addressed : undefined;
  const currentId = chosenId ?? inAddress ?? first?.id;

  useEffect(
    () =>
      queue().listen((event) => {
        if (event.kind === "sent") {
          setArrived((before) => [...before.slice(-19), event.attempt]);
          const { checkId } = event.attempt.body;
          const arrival = arrivalIn(event.answer);
          if (arrival !== undefined) overtaking.arrived({ checkId, arrival, at: Date.now() });
          const sentence = overtakenBy(event.answer);
          if (sentence) setTold({ checkId, sentence: `${event.attempt.checkTitle}: ${sentence}` });
        }
        // Rolled back: what was typed stands in the check again, unless something newer does.
        else if (!draftOf(viewer.id, event.attempt.body.checkId)) void restore(event.attempt).catch(() => undefined);
        refresh();
      }),
    // One queue a person for the life of the page.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [viewer.id, refresh],
  );

  const coming = useMemo(() => onTheWay(traveler.checks, state.held, arrived), [traveler.checks, state.held, arrived]);
  const checks = useMemo(() => foresee<CheckView>(traveler.checks, coming), [traveler.checks, coming]);
  const index = Math.max(
    0,
    checks.findIndex((check) => check.id === currentId),
  );
  const current = checks[index];

  const open = useCallback((id: string) => {
    setChosenId(id);
    const address = new URL(location.href);
    address.searchParams.set("check", id);
    // Only the address: the page is already here, also without network.
    history.replaceState(null, "", address);
  }, []);

  const step = useCallback(
    (by: 1 | -1) => {
      const next = checks[index + by];
      if (next) open(next.id);
    },
    [checks, index, open],
  );

  return {
    traveler,
    refresh,
    queue,
    queueState: state,
    checks,
    index,
    current,
    kind: current ? benchKind(current.kind) : undefined,
    coming: coming.filter((attempt) => attempt.checkId === current?.id),
    refused: state.held.filter(
      (attempt) => attempt.body.checkId === current?.id && attempt.trouble?.kind === "refused",
    ),
    told: told?.sentence ?? overtaking.sentence,
    dismissTold: () => {
      setTold(undefined);
      overtaking.dismiss();
    },
    open,
    step,
  };
}

export type Bench = ReturnType<typeof useBench>;
