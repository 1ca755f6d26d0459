import { computed, needsPositive, type Computed } from "../computed";
import { badLine, type Line } from "./line";
import { riseTimeS } from "./rise-time";

export type PullUpBehaviour = {
  ohm: number;
  /** By the line's definition, nominal; null while the capacitance is not known. */
  riseS: number | null;
  /** From the low level to the level wanted, at the lowest supply with the leakage of the line; null: never or unknown. */
  toHighS: number | null;
  /** See pullUpBehaviour; null where toHighS is. */
  highestRateHz: number | null;
  /** Through the resistor while the line is low, A. */
  lowCurrentA: number;
  /** In the resistor while the line is low, W. */
  lowPowerW: number;
};

/**
 * How a line with one resistor behaves.
 *
 * - toHigh = RC · ln((V∞ − VOL) / (V∞ − VIH)), V∞ = VCC,min − R · (leakage + inputs).
 * - highest rate = 1 / (4 · toHigh): of a square wave whose high half is twice as long as the line takes to reach its
 *   level, so that half of it remains for whoever reads. A definition of this program's own; a fall is taken to be quick.
 * - while low: VCC,max / R and VCC,max² / R, with the line at 0 V, the most that can be.
 */
export function pullUpBehaviour(line: Line, ohm: number): Computed<PullUpBehaviour> {
  const bad = badLine(line) ?? needsPositive("ohm", "resistor", ohm);
  if (bad) return bad;
  const rise = riseTimeS(ohm, line.capacitancePf, line.definition);
  const toHighS = timeToHigh(line, ohm);
  return computed({
    ohm,
    riseS: rise.ok ? rise.value : null,
    toHighS,
    highestRateHz: toHighS === null ? null : 1 / (4 * toHighS),
    lowCurrentA: line.supply.maxVolts / ohm,
    lowPowerW: line.supply.maxVolts ** 2 / ohm,
  });
}

/** Where the line comes to rest while nobody pulls it low, V, at the lowest supply. */
export const restVolts = ({ supply, leakageA, inputsHighA }: Line, ohm: number): number =>
  supply.minVolts - ohm * (leakageA + inputsHighA);

function timeToHigh(line: Line, ohm: number): number | null {
  const rest = restVolts(line, ohm);
  if (line.capacitancePf === 0 || rest <= line.highVolts) return null;
  return ohm * line.capacitancePf * 1e-12 * Math.log((rest - line.lowVolts) / (rest - line.highVolts));
}
