import type { Verdict } from "@/db/schema/travelers";
import type { CheckView } from "@/lib/traveler/traveler-view";
import type { HeldAttempt } from "./queue/held-attempt";

export type OnTheWay = { id: string; checkId: string; verdict: Verdict; summary: string; arrived: boolean };

const line = ({ body, foreseen, summary }: HeldAttempt, arrived: boolean): OnTheWay => ({
  id: body.id,
  checkId: body.checkId,
  verdict: foreseen,
  summary,
  arrived,
});

/**
 * The attempts that the traveler does not show yet: what has arrived but is not in the last picture from the server,
 * then what is still on the device. Refused ones are rolled back and not among them.
 */
export function onTheWay(
  checks: readonly CheckView[],
  held: readonly HeldAttempt[],
  arrived: readonly HeldAttempt[],
): OnTheWay[] {
  const known = new Set(checks.flatMap((check) => check.attempts.map((attempt) => attempt.id)));
  const mine = new Set(checks.map((check) => check.id));
  const going = held.filter((attempt) => attempt.trouble?.kind !== "refused");
  return [...arrived.map((attempt) => line(attempt, true)), ...going.map((attempt) => line(attempt, false))].filter(
    ({ id, checkId }) => mine.has(checkId) && !known.has(id),
  );
}
