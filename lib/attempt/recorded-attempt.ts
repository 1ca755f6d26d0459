import type { CheckState, Verdict } from "@/db/schema/travelers";

/** What the bench is answered. */
export type RecordedAttempt = {
  attemptId: string;
  checkId: string;
  /** Order of arrival at the server; send it back as seenArrival. */
  arrival: number;
  recordedAt: string;
  verdict: Verdict;
  /** In a few characters: "4.983 V". */
  summary: string;
  sentences: string[];
  from: CheckState;
  state: CheckState;
  stateReason: string;
  /** Somebody else recorded the same check just before, or since the client last looked. Both are kept; this one counts. */
  overtook: { by: string; at: string; summary: string } | null;
};
