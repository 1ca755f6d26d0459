import type { CheckState } from "@/db/schema/travelers";

type Seen = { id: string; state: CheckState; holdPoint: boolean };

/** States in which the builder has something to do now, the most telling first only by place on the traveler. */
const TO_DO: readonly CheckState[] = ["untested", "reopened", "doubtful", "failed"];

export function isToDo(state: CheckState): boolean {
  return TO_DO.includes(state);
}

/**
 * The next check that is free to do after the given one, going round; failed ones only when nothing fresh is left,
 * so that one does not stand in the way of the rest.
 */
export function nextFree<Check extends Seen>(checks: readonly Check[], afterId: string | undefined): Check | undefined {
  const start = checks.findIndex((check) => check.id === afterId) + 1;
  const round = [...checks.slice(start), ...checks.slice(0, start)].filter(
    (check) => check.id !== afterId && isToDo(check.state),
  );
  return round.find((check) => check.state !== "failed") ?? round[0];
}

/** The next hold point from the given check on that is not passed yet, itself included. */
export function nextHold<Check extends Seen>(checks: readonly Check[], fromId: string): Check | undefined {
  const start = Math.max(
    0,
    checks.findIndex((check) => check.id === fromId),
  );
  return checks.slice(start).find((check) => check.holdPoint && check.state !== "passed" && check.state !== "conceded");
}
