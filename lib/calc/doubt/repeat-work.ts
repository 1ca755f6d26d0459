import { CHECK_STAGES, type StandingCheck } from "../check-graph";
import type { Paces } from "../forecast";
import { formatDuration } from "../units";
import type { RepeatWork } from "./doubt-line";

/** What it takes to repeat checks at one's own pace: of each stage the checks times its seconds, where a pace is known. */
export function repeatWork(checks: readonly Pick<StandingCheck, "stage">[], paces: Paces): RepeatWork {
  const stages = CHECK_STAGES.flatMap((stage) => {
    const count = checks.filter((check) => check.stage === stage).length;
    const pace = paces[stage];
    return count === 0 ? [] : [{ stage, checks: count, seconds: pace === null ? null : pace * count }];
  });
  const known = stages.flatMap(({ seconds }) => (seconds === null ? [] : [seconds]));
  const seconds = known.length === 0 ? null : known.reduce((sum, one) => sum + one, 0);
  const withoutPace = stages.reduce((sum, stage) => sum + (stage.seconds === null ? stage.checks : 0), 0);
  return { checks: checks.length, stages, seconds, withoutPace, sentence: say(checks.length, seconds, withoutPace) };
}

const counted = (count: number) => `${count} ${count === 1 ? "check" : "checks"}`;

function say(checks: number, seconds: number | null, withoutPace: number): string {
  if (checks === 0) return "Nothing is to be repeated.";
  if (seconds === null) return `${counted(checks)} to repeat; no pace is known yet.`;
  const rest = withoutPace === 0 ? "" : `, and ${withoutPace} of a stage whose pace is not known`;
  return `${counted(checks)} to repeat, about ${formatDuration(seconds)}${rest}.`;
}
