import { computed, needsPositive, type Computed } from "../computed";
import { restVolts } from "./behaviour";
import { limitsOf } from "./limits";
import { badLine, type Line } from "./line";
import { riseTimeS } from "./rise-time";
import { amps, atLeast, atMost, resistor, seconds, volts, whyAtLeast, whyAtMost } from "./wording";

export type PullUpJudgement = { verdict: "fits" | "too small" | "too large"; sentence: string };

/** Whether the resistance that a line has fits it, and what it does if not; see limitsOf. */
export function judgePullUp(line: Line, ohm: number): Computed<PullUpJudgement> {
  const bad = badLine(line) ?? needsPositive("ohm", "resistor", ohm);
  if (bad) return bad;
  const limits = limitsOf(line);
  const { minOhm, maxOhm } = limits;
  if (minOhm === null || ohm < minOhm) {
    const smallest = ohm * (1 - line.tolerancePercent / 100);
    const gives = amps((line.supply.maxVolts - line.lowVolts) / smallest + line.inputsLowA);
    const least = minOhm === null ? "and no resistor is large enough" : `so ${atLeast(minOhm)} at least`;
    const sentence = `With ${resistor(line, ohm)} the output must take ${gives} at low; it takes ${amps(line.sinkA)}, ${least}.`;
    return computed({ verdict: "too small", sentence });
  }
  if (maxOhm !== null && ohm > maxOhm) return computed({ verdict: "too large", sentence: tooLarge(line, ohm, maxOhm) });
  const most = maxOhm === null ? "" : `; ${whyAtMost(line, limits)}`;
  return computed({ verdict: "fits", sentence: `${resistor(line, ohm)} fits: ${whyAtLeast(line, minOhm)}${most}.` });
}

function tooLarge(line: Line, ohm: number, maxOhm: number): string {
  const most = maxOhm > 0 ? `, so ${atMost(maxOhm)} at most` : "";
  const { leakageMaxOhm, riseMaxOhm } = limitsOf(line);
  const largest = ohm * (1 + line.tolerancePercent / 100);
  const rise = riseTimeS(largest, line.capacitancePf, line.definition);
  if (riseMaxOhm === maxOhm && maxOhm !== leakageMaxOhm && rise.ok && line.riseLimitS !== null) {
    return `With ${resistor(line, ohm)} the line rises in ${seconds(rise.value)} (${line.definition}); ${seconds(line.riseLimitS)} are allowed${most}.`;
  }
  const rest = volts(Math.max(0, restVolts(line, largest)));
  return `With ${resistor(line, ohm)} the line reaches only ${rest} for leakage and input current; ${volts(line.highVolts)} are wanted${most}.`;
}

/** Resistance of several resistors on one line, Ω; null for none. */
export function inParallelOhm(ohms: readonly number[]): number | null {
  return ohms.length === 0 ? null : 1 / ohms.reduce((sum, ohm) => sum + 1 / ohm, 0);
}
