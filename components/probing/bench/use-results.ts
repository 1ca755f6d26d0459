"use client";

import { useCallback, useEffect, useMemo, useRef, useState } from "react";
import type { RoundView, SaidResult } from "@/lib/probing/round-view";
import { NOTHING_HELD, readHeld, withAnswer, without, writeHeld, type Held, type HeldResult } from "./held-results";
import { batchOf, fetchResults, sendResults, type Sent } from "./send-results";

const LOOK_EVERY_MS = 6_000;
const RETRY_MS = 3_000;

type Asked = { project: string; round: Pick<RoundView, "id" | "results" | "closedAt">; userId: string };

/** What was said so far, by everybody; what this device says is shown at once and sent until it arrives. */
export function useResults({ project, round, userId }: Asked) {
  const [known, setKnown] = useState<readonly SaidResult[]>(round.results);
  const [isClosed, setClosed] = useState(round.closedAt !== null);
  const [held, setHeld] = useState<Held>(NOTHING_HELD);
  const [refused, setRefused] = useState<string>();
  const latest = useRef(held);
  const isSending = useRef(false);

  const hold = useCallback(
    (next: Held) => {
      latest.current = next;
      setHeld(next);
      writeHeld(round.id, userId, next);
    },
    [round.id, userId],
  );

  const settle = useCallback((sent: Sent) => {
    if (sent.kind !== "arrived") return;
    setKnown(sent.results);
    setClosed(sent.closed);
  }, []);

  const send = useCallback(async () => {
    if (isSending.current) return;
    isSending.current = true;
    try {
      while (latest.current.results.length + latest.current.voids.length > 0) {
        const batch = batchOf(latest.current);
        const sent = await sendResults(project, round.id, batch);
        if (sent.kind === "away") return;
        if (sent.kind === "refused") {
          setRefused(sent.sentence);
          return;
        }
        settle(sent);
        setRefused(undefined);
        hold(without(latest.current, batch));
      }
    } finally {
      isSending.current = false;
    }
  }, [project, round.id, hold, settle]);

  useEffect(() => {
    // What an earlier visit left here is known to the browser only.
    // eslint-disable-next-line react-hooks/set-state-in-effect
    hold(readHeld(round.id, userId));
    void send();
    const retry = setInterval(() => void send(), RETRY_MS);
    const look = setInterval(async () => {
      const isQuiet = latest.current.results.length + latest.current.voids.length === 0;
      if (document.visibilityState === "visible" && isQuiet) settle(await fetchResults(project, round.id));
    }, LOOK_EVERY_MS);
    const now = () => void send();
    addEventListener("online", now);
    return () => {
      clearInterval(retry);
      clearInterval(look);
      removeEventListener("online", now);
    };
  }, [project, round.id, userId, hold, send, settle]);

  const said = useMemo(() => saidBy(known, held), [known, held]);
  const say = (result: HeldResult) => {
    hold(withAnswer(latest.current, result, said.get(result.probe)?.id));
    void send();
  };
  const discard = () => {
    hold(NOTHING_HELD);
    setRefused(undefined);
  };
  return { said, say, discard, refused, isClosed, heldCount: held.results.length + held.voids.length };
}

/** The last word on each probe, with what is still on this device. */
function saidBy(known: readonly SaidResult[], held: Held): Map<number, SaidResult> {
  const voids = new Set(held.voids);
  const said = new Map<number, SaidResult>();
  for (const one of known) if (!voids.has(one.id)) said.set(one.probe, one);
  for (const { id, probe, beeps, typed, performedAt } of held.results) {
    said.set(probe, { id, probe, beeps, typed, ohm: null, by: null, at: performedAt });
  }
  return said;
}
