import { useCallback, useEffect, useState } from "react";
import type { BenchProps } from "./bench-props";
import type { NewAttempt } from "./queue/held-attempt";
import { restore, type Bench } from "./use-bench";

const OFFERED_MS = 8_000;

export type Slip = { attempt: NewAttempt; state: "offered" | "undoing" | "failed"; sentence: string };

/**
 * Taking back the last recording for some seconds. Still on the device: it never goes. Already there: it is voided
 * with its reason, since an attempt is never deleted.
 */
export function useSlip({ project, voidAttempt }: BenchProps, bench: Bench) {
  const [slip, setSlip] = useState<Slip>();

  useEffect(() => {
    if (slip?.state !== "offered") return;
    const timer = setTimeout(() => setSlip(undefined), OFFERED_MS);
    return () => clearTimeout(timer);
  }, [slip]);

  const offer = useCallback((attempt: NewAttempt) => setSlip({ attempt, state: "offered", sentence: "" }), []);

  async function undo() {
    if (!slip) return;
    const { attempt } = slip;
    setSlip({ ...slip, state: "undoing" });
    const failure = await takeBack(attempt);
    if (failure) {
      setSlip({ attempt, state: "failed", sentence: failure });
      return;
    }
    await restore(attempt).catch(() => undefined);
    setSlip(undefined);
    bench.open(attempt.body.checkId);
    bench.refresh();
  }

  async function takeBack({ body }: NewAttempt): Promise<string | undefined> {
    try {
      if (await bench.queue().withdraw(body.id)) return undefined;
      const answer = await voidAttempt({
        project: project.slug,
        writeId: crypto.randomUUID(),
        attemptId: body.id,
        reason: "slip of the finger",
      });
      return answer.ok ? undefined : answer.error.message;
    } catch {
      return "It has gone out and the network is away, so it could not be voided. Void it on the unit's page.";
    }
  }

  // Refused meanwhile: it is in the form again and there is nothing to take back.
  const refused = bench.queueState.held.some(
    (one) => one.body.id === slip?.attempt.body.id && one.trouble?.kind === "refused",
  );

  return { slip: refused ? undefined : slip, offer, undo, dismiss: () => setSlip(undefined) };
}
