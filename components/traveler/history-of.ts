import type {
  AttemptView,
  CheckDoubtView,
  CheckView,
  ConcessionView,
  HoldLiftView,
  PersonView,
  ReopeningView,
} from "@/lib/traveler/traveler-view";

export type HistoryEntry =
  | { kind: "attempt"; at: string; attempt: AttemptView }
  | { kind: "reopening"; at: string; reopening: ReopeningView }
  | { kind: "concession"; at: string; concession: ConcessionView }
  | { kind: "withdrawal"; at: string; id: string; by: PersonView; reason: string }
  | { kind: "doubt"; at: string; doubt: CheckDoubtView }
  | { kind: "lift"; at: string; lift: HoldLiftView };

/** Everything that ever happened to a check, newest first. Attempts stand where they arrived: the later one counts. */
export function historyOf(
  check: Pick<CheckView, "attempts" | "reopenings" | "concessions" | "holdLifts" | "doubts">,
): HistoryEntry[] {
  const entries: HistoryEntry[] = [
    ...check.attempts.map((attempt) => ({ kind: "attempt" as const, at: attempt.recordedAt, attempt })),
    ...check.reopenings.map((reopening) => ({ kind: "reopening" as const, at: reopening.at, reopening })),
    ...check.concessions.map((concession) => ({ kind: "concession" as const, at: concession.at, concession })),
    ...check.concessions.flatMap(({ id, withdrawn }) =>
      withdrawn ? [{ kind: "withdrawal" as const, id, ...withdrawn }] : [],
    ),
    ...check.doubts.map((doubt) => ({ kind: "doubt" as const, at: doubt.at, doubt })),
    ...check.holdLifts.map((lift) => ({ kind: "lift" as const, at: lift.at, lift })),
  ];
  return entries.sort((a, b) => Date.parse(b.at) - Date.parse(a.at));
}
