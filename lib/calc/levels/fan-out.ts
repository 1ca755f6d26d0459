import { nanoamperes } from "./exact";
import type { Family } from "./family";
import { amps, inputs, output } from "./wording";

export type FanOut = {
  /** Receiver inputs that one output drives; null where the inputs take no current, so that nothing limits them. */
  loads: number | null;
  /** Likewise by the currents of each level alone. */
  high: number | null;
  low: number | null;
  binds: "high" | "low" | "both" | "nothing";
  sentence: string;
};

/**
 * DC fan-out = min(⌊IOH/IIH⌋, ⌊IOL/IIL⌋), magnitudes in whole nanoamperes so that 4 mA / 0.4 mA is 10 and not 9.
 * Says nothing of levels (see margins) and nothing of speed: CMOS inputs load an output by their capacitance long
 * before they load it by current (see netLoad and loadedEdge).
 */
export function fanOut(driver: Family, receiver: Family): FanOut {
  const high = howMany(driver.iohA, receiver.iihA);
  const low = howMany(driver.iolA, receiver.iilA);
  const loads = high === null || low === null ? (high ?? low) : Math.min(high, low);
  const binds = loads === null ? "nothing" : high === low ? "both" : loads === high ? "high" : "low";
  return { loads, high, low, binds, sentence: sentence(driver, receiver, loads, binds) };
}

function howMany(gives: number, takes: number): number | null {
  const each = nanoamperes(takes);
  return each <= 0 ? null : Math.floor(nanoamperes(gives) / each);
}

function sentence(driver: Family, receiver: Family, loads: number | null, binds: FanOut["binds"]): string {
  if (loads === null) return `${output(driver)} drives any number of ${receiver.name} inputs as far as current goes.`;
  const lowBinds = binds === "low" || binds === "both";
  const [gives, takes, what] = lowBinds ? [driver.iolA, receiver.iilA, "takes"] : [driver.iohA, receiver.iihA, "gives"];
  const side = binds === "both" ? "either level" : lowBinds ? "low" : "high";
  const count = loads === 0 ? `no ${receiver.name} input` : inputs(receiver, loads);
  return `${output(driver)} drives ${count}: it ${what} ${amps(gives)} at ${side}, each input ${amps(takes)}.`;
}
