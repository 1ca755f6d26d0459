import type { CheckState, Verdict } from "@/db/schema/travelers";
import type { BlockerView } from "@/lib/traveler/traveler-view";

type Seen = { id: string; state: CheckState; blockers: BlockerView[] };
/** Newest last. */
type OnTheWay = { checkId: string; verdict: Verdict };

const HOLDS: readonly CheckState[] = ["passed", "conceded"];

/**
 * The states as they will be when the attempts still on the device have arrived: what they conform to is passed, and
 * a check frees itself when everything it waits for holds. Only a picture; the server decides.
 */
export function foresee<Check extends Seen>(checks: readonly Check[], onTheWay: readonly OnTheWay[]): Check[] {
  const verdicts = new Map(onTheWay.map(({ checkId, verdict }) => [checkId, verdict]));
  const states = new Map<string, CheckState>();
  for (const check of checks) {
    const verdict = verdicts.get(check.id);
    states.set(check.id, verdict ? (verdict === "does-not-conform" ? "failed" : "passed") : check.state);
  }
  return checks.map((check) => {
    const blockers = check.blockers.filter((blocker) => !HOLDS.includes(states.get(blocker.checkId) ?? blocker.state));
    const own = states.get(check.id) ?? check.state;
    const freed = own === "waiting" && check.blockers.length > 0 && blockers.length === 0;
    return { ...check, blockers, state: freed ? "untested" : own };
  });
}
