import type { CheckStage } from "../check-graph";
import type { BenchSession, Paces } from "./history";
import { median } from "./quantile";

/** Fewer say nothing. Common practice, no source. */
const LEAST = 3;

/**
 * Seconds a check takes, by stage: the median time between consecutive attempts of one session, counted for the stage of the
 * later one, whose work lies between. Null below three such times. Left out: the first check of a session, whose beginning
 * nobody recorded.
 */
export function findPaces(sessions: readonly BenchSession[]): Paces {
  const times = sessions.flatMap(({ attempts }) =>
    attempts.slice(1).map(({ atMs, stage }, at) => ({ stage, seconds: (atMs - (attempts[at]?.atMs ?? atMs)) / 1000 })),
  );
  const pace = (stage: CheckStage): number | null => {
    const own = times.flatMap((time) => (time.stage === stage ? [time.seconds] : []));
    return own.length < LEAST ? null : median(own);
  };
  return {
    inspection: pace("inspection"),
    continuity: pace("continuity"),
    "power-on": pace("power-on"),
    function: pace("function"),
    integration: pace("integration"),
  };
}
