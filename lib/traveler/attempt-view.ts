import { checkKind } from "@/lib/check-kinds/list";
import type { History } from "./load-history";
import { personView } from "./person-view";
import type { AttemptView, EvidenceView } from "./traveler-view";

type Parts = {
  wording: { kind: string; spec: unknown };
  readings: History["readings"][number]["reading"][];
  evidence: EvidenceView[];
};

export function attemptView(
  { attempt, byName, void: voided, voidedByName }: History["attempts"][number],
  parts: Parts,
): AttemptView {
  const { wording, readings, evidence } = parts;
  return {
    id: attempt.id,
    arrival: attempt.arrival,
    by: personView(attempt.userId, byName),
    performedAt: attempt.performedAt.toISOString(),
    recordedAt: attempt.recordedAt.toISOString(),
    verdict: attempt.verdict,
    record: attempt.record,
    summary: checkKind(wording.kind).summary(wording.spec, attempt.record, readings),
    readings: readings.map(({ label, typed, value, unit, lower, upper, expandedUncertainty, verdict }) => {
      return { label, typed, value, unit, lower, upper, expandedUncertainty, verdict };
    }),
    sentences: attempt.sentences,
    note: attempt.note,
    instrument: attempt.instrumentSnapshot?.name ?? null,
    evidence,
    voided: voided
      ? { by: personView(voided.userId, voidedByName), at: voided.createdAt.toISOString(), reason: voided.reason }
      : null,
  };
}
