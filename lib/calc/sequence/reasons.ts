import type { CheckState, StandingCheck } from "../check-graph";
import { formatDuration } from "../units";
import type { Behind } from "./count-behind";

export const counted = (count: number): string => `${count} ${count === 1 ? "check" : "checks"}`;

const MOST_UNITS = 2;

/** "14 checks of SUM-01", "14 checks of SUM-01 and 3 of CON-01", "9 checks of SUM-01, 3 of CON-01 and 4 of 2 other units". */
function byUnit({ units }: Behind): string {
  const [first, ...others] = units.length > MOST_UNITS + 1 ? units.slice(0, MOST_UNITS) : units;
  if (!first) return "";
  const hidden = units.slice(others.length + 1);
  const words = others.map(({ serial, checks }) => `${checks} of ${serial}`);
  if (hidden.length > 0) {
    words.push(`${hidden.reduce((sum, { checks }) => sum + checks, 0)} of ${hidden.length} other units`);
  }
  const last = words.pop();
  const head = [`${counted(first.checks)} of ${first.serial}`, ...words].join(", ");
  return last === undefined ? head : `${head} and ${last}`;
}

const HOW_IT_STANDS: Record<CheckState, string> = {
  failed: "It fails",
  reopened: "It was reopened",
  doubtful: "It is in doubt",
  untested: "It has not been done",
  waiting: "It has not been done",
  passed: "It passed",
  conceded: "It is accepted",
};

/** "It is a hold point; 14 checks of SUM-01 wait for it." */
export function whyNow({ holdPoint, lifted, state }: StandingCheck, behind: Behind): string {
  const isHold = holdPoint && !lifted;
  const stands = state === "untested" || state === "waiting" ? [] : [HOW_IT_STANDS[state]];
  const what = [...stands, ...(isHold ? [stands.length > 0 ? "is a hold point" : "It is a hold point"] : [])].join(
    " and ",
  );
  if (behind.checks === 0) return `${what || HOW_IT_STANDS[state]}; nothing waits for it.`;
  const waiting = `${byUnit(behind)} ${behind.checks === 1 ? "waits" : "wait"} for it.`;
  return what === "" ? waiting : `${what}; ${waiting}`;
}

/** "about 43 min", and that it is a guess where paces are missing. */
export const about = (seconds: number, isGuess: boolean): string =>
  `about ${formatDuration(seconds)}${isGuess ? ", guessed where no pace is known yet" : ""}`;
