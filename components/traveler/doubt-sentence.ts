import { writeDate } from "@/components/ui/DateTime";
import type { CheckView } from "@/lib/traveler/traveler-view";

/** "Bodge wire W3 on Wed 25 Nov 2026 put 5 in doubt.": the newest rework that checks still wait for; empty without one. */
export function doubtSentence(checks: readonly Pick<CheckView, "state" | "doubts">[], zone: string): string {
  const newest = checks.flatMap(({ state, doubts }) => {
    const doubt = doubts.find(({ isSpared }) => !isSpared);
    return state === "doubtful" && doubt ? [doubt] : [];
  });
  const [last] = [...newest].sort((a, b) => Date.parse(b.at) - Date.parse(a.at));
  if (!last) return "";
  const count = newest.filter(({ id }) => id === last.id).length;
  return `${last.rework} on ${writeDate(last.at, zone, "day")} put ${count} in doubt.`;
}
