import { formatQuantity } from "../units";
import type { PullUpLimits } from "./limits";
import type { Line } from "./line";

export const ohms = (value: number): string => formatQuantity({ value, unit: "Ω" });
export const seconds = (value: number): string => formatQuantity({ value, unit: "s" }, { significant: 3 });
export const amps = (value: number): string => formatQuantity({ value: Number(value.toPrecision(3)), unit: "A" });
export const volts = (value: number): string => formatQuantity({ value: Number(value.toPrecision(4)), unit: "V" });

/** Limits are written to three digits, rounded inwards, so that what is written fits. */
export const atLeast = (ohm: number): string => ohms(threeDigits(ohm, Math.ceil));
export const atMost = (ohm: number): string => ohms(threeDigits(ohm, Math.floor));

function threeDigits(value: number, round: (value: number) => number): number {
  if (value <= 0) return 0;
  const exponent = Number(value.toExponential(11).split("e")[1]);
  const scaled = Number(`${Number(value.toPrecision(12))}e${2 - exponent}`);
  return Number(`${round(Number(scaled.toPrecision(12)))}e${exponent - 2}`);
}

/** "the rise time of 300 ns at 400 pF asks for at most 885 Ω" */
export function whyAtMost(line: Line, limits: PullUpLimits): string {
  if (limits.maxBinds === "rise time" && line.riseLimitS !== null && limits.riseMaxOhm !== null) {
    const load = formatQuantity({ value: line.capacitancePf * 1e-12, unit: "F" }, { significant: 3 });
    return `the rise time of ${seconds(line.riseLimitS)} (${line.definition}) at ${load} asks for at most ${atMost(limits.riseMaxOhm)}`;
  }
  const lost = amps(line.leakageA + line.inputsHighA);
  return `${lost} of leakage and input current at a level of ${volts(line.highVolts)} ask for at most ${atMost(limits.leakageMaxOhm ?? 0)}`;
}

/** "the output's 3 mA ask for at least 967 Ω" */
export function whyAtLeast(line: Line, minOhm: number): string {
  const inputs = line.inputsLowA > 0 ? `, less ${amps(line.inputsLowA)} from the inputs,` : "";
  return `the output's ${amps(line.sinkA)}${inputs} ask for at least ${atLeast(minOhm)}`;
}

/** "4.7 kΩ", "4.7 kΩ ± 5 %" */
export const resistor = (line: Line, ohm: number): string =>
  line.tolerancePercent > 0 ? `${ohms(ohm)} ±\u202f${line.tolerancePercent}\u202f%` : ohms(ohm);
