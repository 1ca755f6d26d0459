import type { Queryable } from "@/db/client";
import {
  findTravelerAttempts,
  findTravelerChecks,
  findTravelerConcessions,
  findTravelerDoubts,
  findTravelerEvidence,
  findTravelerFaults,
  findTravelerHoldLifts,
  findTravelerPrerequisites,
  findTravelerReadings,
  findTravelerReopenings,
} from "@/db/queries/traveler-history";

/** Everything that was ever recorded or decided on one unit's checks. */
export async function loadHistory(db: Queryable, projectId: string, unitId: string) {
  const [checks, attempts, readings, evidence, reopenings, concessions, holdLifts, prerequisites, doubts, faults] =
    await Promise.all([
      findTravelerChecks(db, projectId, unitId),
      findTravelerAttempts(db, projectId, unitId),
      findTravelerReadings(db, projectId, unitId),
      findTravelerEvidence(db, projectId, unitId),
      findTravelerReopenings(db, projectId, unitId),
      findTravelerConcessions(db, projectId, unitId),
      findTravelerHoldLifts(db, projectId, unitId),
      findTravelerPrerequisites(db, projectId, unitId),
      findTravelerDoubts(db, projectId, unitId),
      findTravelerFaults(db, projectId, unitId),
    ]);
  return { checks, attempts, readings, evidence, reopenings, concessions, holdLifts, prerequisites, doubts, faults };
}

export type History = Awaited<ReturnType<typeof loadHistory>>;
