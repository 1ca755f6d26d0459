import { fault, needsPositive, type Computed } from "../computed";
import { loadedEdge } from "../levels";
import { type DelayCondition, type Derating } from "./path";

/** The 1/V rule is trusted this far from the supply that a figure is for. */
const LEAST_RATIO = 0.8;
const MOST_RATIO = 1.25;

/** Turns a delay of the data sheet into one on the board. */
export type Derate = { min: (seconds: number) => number; typical: Turn; max: Turn };
type Turn = (seconds: number) => number;

export const UNCHANGED: Derate = {
  min: (seconds) => seconds,
  typical: (seconds) => seconds,
  max: (seconds) => seconds,
};

/**
 * Load: + ln 2 · R · (C − C stated), R the output of the family taken as a resistor (`loadedEdge` of lib/calc/levels).
 * Supply, CMOS only: a lower one slows typical and highest delays by V stated / V; a higher one quickens only the lowest
 * delay by the same ratio. Gains are not credited: from 4.5 V to 6 V sheets of the 86 give 0.78 (typical) and 0.83
 * (highest), where 1/V would give 0.75. Bipolar delays are left as they are between 4.5 and 5.5 V.
 * Common practice, no source; refused further than 0.8 to 1.25 of the stated supply, where it no longer holds.
 * Leaves out temperature: the sheet's highest delays already hold over its range.
 */
export function deratingOf({ family, typicalAt, limitsAt, board }: Derating): Computed<Derate> {
  const conditions: [string, DelayCondition][] = [
    ["board", board],
    ["typicalAt", typicalAt],
    ["limitsAt", limitsAt],
  ];
  for (const [field, condition] of conditions) {
    const bad = needsPositive(field, "supply", condition.volts);
    if (bad) return bad;
    const ratio = board.volts / condition.volts;
    if (ratio < LEAST_RATIO || ratio > MOST_RATIO)
      return fault(
        field,
        `Delays stated at ${condition.volts} V say nothing of ${board.volts} V: take those that the data sheet gives there.`,
      );
  }
  const added = (stated: DelayCondition): Computed<number> => {
    const [there, here] = [loadedEdge(family, stated.loadPf), loadedEdge(family, board.loadPf)];
    if (!there.ok) return there;
    if (!here.ok) return here;
    return { ok: true, value: here.value.addedDelayS - there.value.addedDelayS };
  };
  const [typical, limits] = [added(typicalAt), added(limitsAt)];
  if (!typical.ok) return typical;
  if (!limits.ok) return limits;

  const slower = (stated: DelayCondition) =>
    family.technology === "CMOS" ? Math.max(1, stated.volts / board.volts) : 1;
  const quicker = family.technology === "CMOS" ? Math.min(1, limitsAt.volts / board.volts) : 1;
  const turn = (factor: number, more: number) => (seconds: number) => Math.max(0, seconds * factor + more);
  return {
    ok: true,
    value: {
      min: turn(quicker, limits.value),
      typical: turn(slower(typicalAt), typical.value),
      max: turn(slower(limitsAt), limits.value),
    },
  };
}
