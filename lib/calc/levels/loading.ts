import { computed, needsCount, needsNotNegative, needsPositive, type Computed } from "../computed";
import { amperes, nanoamperes } from "./exact";
import type { Family } from "./family";
import { output, share } from "./wording";

export type Group = { family: Family; count: number };

/** What hangs on one output. */
export type Burden = {
  inputs: readonly Group[];
  /** Three-state or open-drain outputs on the net that are switched off. */
  offOutputs: readonly Group[];
  /** A resistor to the supply; it takes low-level current. */
  pullUp: { ohm: number; supplyVolts: number } | null;
};

export type LevelLoad = { usedA: number; availableA: number; leftA: number; holds: boolean };

export type Loading = { high: LevelLoad; low: LevelLoad; holds: boolean; sentence: string };

/**
 * DC load of an output by receivers of several families, on both levels: Σ n·IIH + Σ n·IOZ against IOH, and
 * Σ n·|IIL| + Σ n·IOZ + (VCC − VOL)/R against IOL. Magnitudes; sums in whole nanoamperes.
 * Leaves out: what a pull-up gives at high (it only helps), currents while switching.
 */
export function loading(driver: Family, { inputs, offOutputs, pullUp }: Burden): Computed<Loading> {
  const bad =
    [...inputs, ...offOutputs]
      .map(({ family, count }) => needsCount("count", `number of ${family.name} pins`, count))
      .find((found) => found !== undefined) ??
    (pullUp ? needsPositive("pullUp", "pull-up", pullUp.ohm) : undefined) ??
    (pullUp ? needsNotNegative("supplyVolts", "supply of the pull-up", pullUp.supplyVolts) : undefined);
  if (bad) return bad;

  const off = sum(offOutputs, (family) => family.iozA);
  const resistor = pullUp ? nanoamperes(Math.max(0, pullUp.supplyVolts - driver.volMax) / pullUp.ohm) : 0;
  const high = level(sum(inputs, (family) => family.iihA) + off, driver.iohA);
  const low = level(sum(inputs, (family) => family.iilA) + off + resistor, driver.iolA);
  const holds = high.holds && low.holds;
  return computed({ high, low, holds, sentence: sentence(driver, high, low) });
}

const sum = (groups: readonly Group[], each: (family: Family) => number): number =>
  groups.reduce((total, { family, count }) => total + count * nanoamperes(each(family)), 0);

function level(used: number, availableA: number): LevelLoad {
  const left = nanoamperes(availableA) - used;
  return { usedA: amperes(used), availableA, leftA: amperes(left), holds: left >= 0 };
}

function sentence(driver: Family, high: LevelLoad, low: LevelLoad): string {
  const told = `${share(high.usedA, high.availableA)} at high and ${share(low.usedA, low.availableA)} at low`;
  if (high.holds && low.holds) return `${output(driver)} is loaded with ${told}.`;
  const over = !high.holds && !low.holds ? "on both levels" : high.holds ? "at low" : "at high";
  return `${output(driver)} is loaded too much ${over}: with ${told}.`;
}
