/** Seconds a probe where nobody has probed yet: from memory of doing it, no source. */
const USUAL_S = 8;
/** A longer gap is a break. */
const BREAK_S = 120;
const ENOUGH = 10;

export type Pace = { secondsEach: number; isOwn: boolean };

/** One's own pace: the middle one of the gaps between probes that followed each other without a break. */
export function paceOf(times: readonly Date[]): Pace {
  const sorted = times.map((at) => at.getTime() / 1000).sort((a, b) => a - b);
  const gaps = sorted
    .slice(1)
    .map((at, index) => at - (sorted[index] ?? at))
    .filter((gap) => gap > 0 && gap < BREAK_S)
    .sort((a, b) => a - b);
  const middle = gaps[Math.floor(gaps.length / 2)];
  return gaps.length < ENOUGH || middle === undefined
    ? { secondsEach: USUAL_S, isOwn: false }
    : { secondsEach: middle, isOwn: true };
}
