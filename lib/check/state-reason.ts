import type { CheckState, Verdict } from "@/db/schema/travelers";
import { nameCheck } from "@/lib/calc/check-graph";
import type { Blocker, CheckHistory } from "./check-history";
import type { Doubt } from "./find-doubt";
import { isReworked } from "./is-reworked";

/** "the hold point “Rails to ground” and 2 more". */
export function nameBlockers(blockers: readonly Blocker[], fromSerial: string): string {
  const [first, ...rest] = blockers;
  if (!first) return "nothing";
  const name = `${first.why === "hold point" ? "the hold point " : ""}${nameCheck(first, fromSerial)}`;
  return rest.length === 0 ? name : `${name} and ${rest.length} more`;
}

/** Why a check is in its state, in one sentence; empty when the state says it all. */
export function reasonFor(
  state: CheckState,
  check: CheckHistory,
  blockers: readonly Blocker[],
  doubt: Doubt | undefined,
): string {
  switch (state) {
    case "waiting":
      return `Waits for ${nameBlockers(blockers, check.serial)}.`;
    case "reopened":
      return `Reopened: ${check.reopened?.reason ?? ""}`;
    case "doubtful":
      return [
        ...(isReworked(check) ? [check.reworked?.reason ?? ""] : []),
        ...(doubt ? [`${nameCheck(doubt.by, check.serial)} failed afterwards, and this check relies on it.`] : []),
      ].join(" ");
    case "conceded":
      return `Accepted: ${check.concessions.find((concession) => concession.attemptId === check.last?.id)?.reason ?? ""}`;
    case "passed":
      return check.last ? reasonForPass(check.last.verdict) : "";
    case "failed":
    case "untested":
      return "";
  }
}

/** The same for a check that passed, whatever else is known of it. */
export function reasonForPass(verdict: Verdict): string {
  return verdict === "guard-band"
    ? "Conforms inside the guard band: repeat it with a better instrument if you can."
    : "";
}
