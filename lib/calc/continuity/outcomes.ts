import type { Probe, ProbeResult } from "./plan";
import { POPULATED_ISOLATION_OHM } from "./populated";

/** What lies between the two points: copper, copper that is not as it should be, or nothing. */
export type Outcome = "joined" | "poor" | "apart";

/** Above this a path is no bad joint any more but goes through a part, or through nothing (common practice, no source). */
const OPEN_OHM = 1000;

export function outcomeOf({ expect, limitOhm }: Probe, { beeps, ohm }: ProbeResult): Outcome | undefined {
  if (ohm === null || Number.isNaN(ohm)) return beeps === null ? undefined : beeps ? "joined" : "apart";
  if (expect === "joined") {
    if (ohm <= limitOhm) return "joined";
    return ohm <= Math.max(OPEN_OHM, 10 * limitOhm) ? "poor" : "apart";
  }
  if (ohm >= limitOhm) return "apart";
  return ohm <= POPULATED_ISOLATION_OHM ? "joined" : "poor";
}

/** By number of the probe; of several results for one probe the last one counts. */
export function lastResults(results: readonly ProbeResult[]): Map<number, ProbeResult> {
  const last = new Map<number, ProbeResult>();
  for (const result of results) if (result.beeps !== null || result.ohm !== null) last.set(result.probe, result);
  return last;
}
