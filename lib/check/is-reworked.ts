import type { CheckHistory } from "./check-history";

/** Whether a rework touched what the check proves, and no attempt has arrived since. */
export function isReworked({ last, reworked }: CheckHistory): boolean {
  return last !== null && reworked !== null && reworked.afterArrival >= last.arrival;
}
