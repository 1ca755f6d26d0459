import type { CheckStage } from "../check-graph";
import { median, type Paces } from "../forecast";

/** Where no pace is known at all, s. Common practice, no source. */
const USUAL_S = 5 * 60;

export type ExpectedTime = {
  /** Seconds that a check of the stage takes. */
  of(stage: CheckStage): number;
  isGuess(stage: CheckStage): boolean;
};

/** One's own pace; for a stage without one the median of the others, and five minutes where there is none. */
export function expectedTime(paces: Paces): ExpectedTime {
  const known = Object.values(paces).filter((pace) => pace !== null);
  const other = known.length === 0 ? USUAL_S : median(known);
  return { of: (stage) => paces[stage] ?? other, isGuess: (stage) => paces[stage] === null };
}
