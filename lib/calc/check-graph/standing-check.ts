/** In the order of the work. */
export const CHECK_STAGES = ["inspection", "continuity", "power-on", "function", "integration"] as const;
export type CheckStage = (typeof CHECK_STAGES)[number];

export type CheckState = "waiting" | "untested" | "passed" | "failed" | "reopened" | "doubtful" | "conceded";

/** A check where it stands on its unit's traveler, what it waits for, and how it stands. */
export type StandingCheck = {
  id: string;
  unitId: string;
  /** Of the unit: "SUM-01". */
  serial: string;
  stage: CheckStage;
  title: string;
  /** On the traveler. */
  position: number;
  /** Until it holds nothing after it on its unit may be recorded. */
  holdPoint: boolean;
  /** The hold was lifted for this unit: nothing waits for it or relies on it as a hold point. */
  lifted: boolean;
  /** Ids of the checks that must hold first, in this unit or another. An id that is not among the checks is ignored. */
  needs: readonly string[];
  state: CheckState;
};

/** A check that holds lets go what waits for it. */
export const holds = (state: CheckState): boolean => state === "passed" || state === "conceded";
