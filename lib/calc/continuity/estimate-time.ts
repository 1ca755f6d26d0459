import type { ProbePlan } from "./plan";

/** Seconds for a plan, or for what is left of it, at one's own pace; a pace that is no time counts as 0. */
export function estimateTime({ probes }: Pick<ProbePlan, "probes">, secondsPerProbe: number): number {
  return secondsPerProbe > 0 && Number.isFinite(secondsPerProbe) ? probes.length * secondsPerProbe : 0;
}
