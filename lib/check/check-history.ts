import type { Stage } from "@/db/schema/procedures";
import type { CheckState, Verdict } from "@/db/schema/travelers";

/** Where a check stands on its unit's traveler, and what it waits for. */
export type PlacedCheck = {
  id: string;
  unitId: string;
  serial: string;
  stage: Stage;
  title: string;
  position: number;
  holdPoint: boolean;
  /** A maintainer lifted the hold for this unit: it neither blocks what comes after nor casts doubt on it. */
  lifted: boolean;
  /** Ids of the checks that must hold first, in this unit or another. */
  needs: readonly string[];
};

/** All that the state of one check depends on. Voided attempts and retired checks are left out. */
export type CheckHistory = PlacedCheck & {
  /** The last valid attempt. */
  last: { id: string; arrival: number; verdict: Verdict } | null;
  /** Arrival of the newest valid attempt that does not conform. */
  failedArrival: number | null;
  /** The newest reopening: it concerns the attempts that had arrived by then. */
  reopened: { afterArrival: number; reason: string } | null;
  /** The newest rework that puts it in doubt: it concerns the attempts that had arrived by then. */
  reworked: { afterArrival: number; reason: string } | null;
  /** Standing concessions. */
  concessions: readonly { attemptId: string; reason: string }[];
};

export type Blocker = {
  checkId: string;
  serial: string;
  title: string;
  state: CheckState;
  why: "hold point" | "prerequisite";
};

export type DerivedCheck = {
  id: string;
  state: CheckState;
  /** Why, in one sentence; empty when the state says it all. */
  reason: string;
  insideGuardBand: boolean;
  lastAttemptId: string | null;
  /** What it waits for; not empty: nothing may be recorded, whatever the state. */
  blockers: Blocker[];
};

/** A check that holds lets go what waits for it. */
export function holds(state: CheckState): boolean {
  return state === "passed" || state === "conceded";
}
