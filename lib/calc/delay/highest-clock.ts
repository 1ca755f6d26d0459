import { computed, fault, needsNotNegative, type Computed } from "../computed";
import { shortQuantity } from "../units";
import { type PathDelay } from "./path";

export type ClockInput = {
  /** The path between two registers. */
  path: PathDelay;
  clockToOutputMaxS: number;
  setupS: number;
  /** By how much the receiving clock may come early or late. */
  skewS: number;
  /** For the hold check; null: not asked for. */
  hold: { clockToOutputMinS: number | null; holdS: number } | null;
};

export type ClockLimit = {
  /** The sum that the period must not fall below, s; null while the path has no highest delay. */
  periodS: number | null;
  highestHz: number | null;
  /** Time by which the data outlast the hold time, s; null: not known or not asked for. Below zero: they change too early. */
  holdSlackS: number | null;
  sentences: string[];
};

/**
 * Highest clock of two registers with a path between them:
 * period ≥ clock to output (highest) + path (worst case) + set-up + skew; hold: clock to output (lowest) + path (lowest) −
 * skew − hold ≥ 0. Worst case only: a root-sum-square would promise a clock that some of the units do not reach.
 * Source: common practice. Leaves out jitter and duty factor.
 */
export function highestClock({ path, clockToOutputMaxS, setupS, skewS, hold }: ClockInput): Computed<ClockLimit> {
  const bad =
    needsNotNegative("clockToOutputMaxS", "delay from clock to output", clockToOutputMaxS) ??
    needsNotNegative("setupS", "set-up time", setupS) ??
    needsNotNegative("skewS", "skew", skewS) ??
    (hold ? needsNotNegative("hold", "hold time", hold.holdS) : undefined) ??
    (hold && hold.clockToOutputMinS !== null
      ? needsNotNegative("hold", "lowest delay from clock to output", hold.clockToOutputMinS)
      : undefined);
  if (bad) return bad;
  const fixed = clockToOutputMaxS + setupS + skewS;
  const periodS = path.worstCaseS === null ? null : fixed + path.worstCaseS;
  if (periodS === 0) return fault("path", "All times are 0: there is no highest clock.");
  const highestHz = periodS === null ? null : 1 / periodS;
  const holdSlackS =
    hold === null || hold.clockToOutputMinS === null || path.minS === null
      ? null
      : hold.clockToOutputMinS + path.minS - skewS - hold.holdS;
  const sentences = [clockSentence(periodS), ...(hold ? [holdSentence(holdSlackS)] : [])];
  return computed({ periodS, highestHz, holdSlackS, sentences });
}

function clockSentence(periodS: number | null): string {
  if (periodS === null) return "Without a highest delay of every part there is no highest clock.";
  return `The period must be at least ${shortQuantity(periodS, "s")}: a clock of ${shortQuantity(1 / periodS, "Hz")} at most.`;
}

function holdSentence(slackS: number | null): string {
  if (slackS === null) return "Whether the hold time is kept is not known: lowest delays are missing.";
  if (slackS < 0) return `The data change ${shortQuantity(-slackS, "s")} too early for the hold time.`;
  return `The hold time is kept with ${shortQuantity(slackS, "s")} to spare.`;
}
