import type { Line } from "./line";
import { ohmForRise } from "./rise-time";

/** What bounds the resistor, Ω, nominal: its tolerance is taken off already. */
export type PullUpLimits = {
  /** Least that the output can pull low; null when the inputs alone give it more than it takes. */
  minOhm: number | null;
  /** Most by leakage and by rise time; null where nothing of the kind limits. */
  leakageMaxOhm: number | null;
  riseMaxOhm: number | null;
  /** The smaller of the two. */
  maxOhm: number | null;
  maxBinds: "leakage" | "rise time" | "nothing";
};

/**
 * Rmin = (VCC,max − VOL) / (IOL − Σ n·|IIL|), the lower bound that one output alone must pull low;
 * Rmax = (VCC,min − VIH) / (Σ n·IOZ + Σ n·IIH), where the line still reaches the level; and tr / (0.8473 C) or
 * tr / (2.1972 C) where a rise time is asked for. Currents are magnitudes: sheets that print IOL + n·IIL mean IIL with
 * its sign, and a magnitude put into that form gives a resistor that is too small.
 *
 * Source: DM74LS03 and DM74LS12 sheets; UM10204 §7.1, equations 1 and 2. The line must be sound (see badLine).
 * Leaves out: several outputs that pull at once (they share, so it gets easier), the sheet's VOL at other currents.
 */
export function limitsOf(line: Line): PullUpLimits {
  const tolerance = line.tolerancePercent / 100;
  const sunkA = inNanoamperes(line.sinkA - line.inputsLowA);
  const lostA = inNanoamperes(line.leakageA + line.inputsHighA);
  const headroom = Math.max(0, line.supply.minVolts - line.highVolts);

  const minOhm = sunkA > 0 ? ohm((line.supply.maxVolts - line.lowVolts) / sunkA / (1 - tolerance)) : null;
  const leakageMaxOhm = headroom === 0 ? 0 : lostA > 0 ? ohm(headroom / lostA / (1 + tolerance)) : null;
  const rise = line.riseLimitS === null ? null : ohmForRise(line.riseLimitS, line.capacitancePf, line.definition);
  const riseMaxOhm = rise?.ok ? ohm(rise.value / (1 + tolerance)) : null;

  const [byLeakage, byRise] = [leakageMaxOhm ?? Infinity, riseMaxOhm ?? Infinity];
  const maxOhm = Math.min(byLeakage, byRise);
  const maxBinds = maxOhm === Infinity ? "nothing" : byRise < byLeakage ? "rise time" : "leakage";
  return { minOhm, leakageMaxOhm, riseMaxOhm, maxOhm: maxOhm === Infinity ? null : maxOhm, maxBinds };
}

/** Rounds a sum of data-sheet currents to whole nanoamperes, so that 4 mA − 10 · 0.4 mA is 0. */
const inNanoamperes = (amperes: number): number => Math.round(amperes * 1e9) / 1e9;

/** Takes the noise of computing off, so that a value on a limit fits. */
const ohm = (value: number): number => Number(value.toPrecision(12));
