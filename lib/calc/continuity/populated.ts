import { shortQuantity } from "../units";
import type { ProbeLimits } from "./limits";

/**
 * With parts on the board, two nets read what lies between them: pull-ups, terminations, inputs, capacitors. Below this they
 * are taken to touch (common practice, no source).
 */
export const POPULATED_ISOLATION_OHM = 100;

/** Above this a limit of one's own will report parts, not shorts. */
const BOLD_OHM = 1000;

/** Limits as they are meant for the board: a standard's isolation holds for bare boards only; one's own is kept. */
export function effectiveLimits(limits: ProbeLimits, populated: boolean): ProbeLimits {
  if (!populated || limits.class === "own") return limits;
  return { ...limits, isolationOhm: Math.min(limits.isolationOhm, POPULATED_ISOLATION_OHM), testVolts: null };
}

export const CAUTION =
  "Parts are fitted: power off, supply unplugged, capacitors discharged. Use a meter whose test voltage stays below 0.3\u202fV, so that no diode and no input conducts, and no insulation tester.";

export function limitRemark(limits: ProbeLimits, populated: boolean): string {
  const ohms = shortQuantity(limits.isolationOhm, "Ω");
  if (!populated) {
    const volts = limits.testVolts === null ? "" : ` at ${shortQuantity(limits.testVolts, "V")} or more`;
    return `A buzzer finds shorts; to prove ${ohms}${volts} take a meter that shows them and type what it reads.`;
  }
  return limits.class === "own" && limits.isolationOhm > BOLD_OHM
    ? `With parts fitted, ${ohms} between two nets may be a part and no fault.`
    : `With parts fitted, isolation says no more than that there is no short: at least ${ohms}.`;
}
