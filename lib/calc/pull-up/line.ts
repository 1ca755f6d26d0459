import { computed, fault, needsCount, needsNotNegative, needsPositive, type Computed, type Fault } from "../computed";
import { type Family, type Group, type SupplyRange } from "../levels";
import { RISE_DEFINITIONS, type RiseDefinition } from "./rise-time";

/** A line that open-drain or open-collector outputs pull low and a resistor pulls high. Currents are magnitudes, A. */
export type Line = {
  supply: SupplyRange;
  /** Level that the line must reach: the receivers' VIH,min, plus a margin if one wants it. */
  highVolts: number;
  /** VOL,max of the outputs while they take sinkA: a pair of the data sheet (LS: 0.5 V at 8 mA, 0.4 V at 4 mA). */
  lowVolts: number;
  sinkA: number;
  /** Leakage of all outputs together while none pulls, Σ n·IOZ. */
  leakageA: number;
  /** Into all inputs together at high, Σ n·IIH. */
  inputsHighA: number;
  /** Out of all inputs together at low, Σ n·|IIL|. */
  inputsLowA: number;
  /** 0 when it is not known; then nothing is said of rise times. */
  capacitancePf: number;
  definition: RiseDefinition;
  /** Longest rise allowed, s; null where only the levels count. */
  riseLimitS: number | null;
  /** Of the resistor, so that it fits even at its ends; 0 looks at nominal values. */
  tolerancePercent: number;
};

/** Everything that a line's resistor depends on but the families: for lineOf. */
export type LineConditions = Pick<
  Line,
  "supply" | "capacitancePf" | "definition" | "riseLimitS" | "tolerancePercent"
> & {
  /** How far above the receivers' thresholds the line shall come, V. */
  marginVolts: number;
};

/**
 * The line of a net by the families of its outputs and inputs, worst of each: the weakest sink, the highest low level, the
 * highest threshold. Figures are taken as they stand: bring them to supply.minVolts with familyAt first, where the window
 * is narrowest. Without receivers the outputs' own threshold is the level wanted.
 */
export function lineOf(
  outputs: readonly Group[],
  inputs: readonly Group[],
  { marginVolts, ...conditions }: LineConditions,
): Computed<Line> {
  const bad = [...outputs, ...inputs]
    .map(({ family, count }) => needsCount("count", `number of ${family.name} pins`, count))
    .find((found) => found !== undefined);
  if (bad) return bad;
  const sinks = familiesOf(outputs);
  if (sinks.length === 0) return fault("outputs", "There is no output on the line to pull it low.");
  const receivers = familiesOf(inputs);
  const takers = receivers.length > 0 ? receivers : sinks;
  return computed({
    ...conditions,
    highVolts: Math.max(...takers.map(({ vihMin }) => vihMin)) + marginVolts,
    lowVolts: Math.max(...sinks.map(({ volMax }) => volMax)),
    sinkA: Math.min(...sinks.map(({ iolA }) => iolA)),
    leakageA: sum(outputs, ({ iozA }) => iozA),
    inputsHighA: sum(inputs, ({ iihA }) => iihA),
    inputsLowA: sum(inputs, ({ iilA }) => iilA),
  });
}

const familiesOf = (groups: readonly Group[]) => groups.filter(({ count }) => count > 0).map(({ family }) => family);

const sum = (groups: readonly Group[], each: (family: Family) => number) =>
  groups.reduce((total, { family, count }) => total + count * each(family), 0);

/** What makes a line impossible to compute, in a sentence; undefined when it can be. */
export function badLine(line: Line): Fault | undefined {
  return (
    needsPositive("minVolts", "lowest supply", line.supply.minVolts) ??
    needsPositive("maxVolts", "highest supply", line.supply.maxVolts) ??
    needsPositive("highVolts", "high level", line.highVolts) ??
    needsNotNegative("lowVolts", "low level", line.lowVolts) ??
    needsPositive("sinkA", "current of the output", line.sinkA) ??
    needsNotNegative("leakageA", "leakage", line.leakageA) ??
    needsNotNegative("inputsHighA", "current of the inputs at high", line.inputsHighA) ??
    needsNotNegative("inputsLowA", "current of the inputs at low", line.inputsLowA) ??
    needsNotNegative("capacitancePf", "capacitance of the line", line.capacitancePf) ??
    (line.riseLimitS === null ? undefined : badRise(line, line.riseLimitS)) ??
    needsNotNegative("tolerancePercent", "tolerance of the resistor", line.tolerancePercent) ??
    crossed(line)
  );
}

function badRise({ capacitancePf }: Line, riseLimitS: number): Fault | undefined {
  return (
    needsPositive("riseLimitS", "rise time", riseLimitS) ??
    (capacitancePf > 0
      ? undefined
      : fault("capacitancePf", "A limit for the rise time needs the capacitance of the line."))
  );
}

function crossed({ supply, highVolts, lowVolts, tolerancePercent, definition }: Line): Fault | undefined {
  if (supply.minVolts > supply.maxVolts) return fault("minVolts", "The lowest supply lies above the highest.");
  if (lowVolts >= highVolts) return fault("lowVolts", "The low level must lie below the high level.");
  if (tolerancePercent >= 100) return fault("tolerancePercent", "The tolerance of the resistor must be below 100 %.");
  if (!RISE_DEFINITIONS.includes(definition)) return fault("definition", "The rise time has no such definition.");
  return undefined;
}
