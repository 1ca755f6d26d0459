import { voltsBetween } from "./exact";
import type { Family } from "./family";
import { input, output, volts } from "./wording";

export type Margins = {
  /** VOH,min of the driver − VIH,min of the receiver, V. */
  highVolts: number;
  /** VIL,max of the receiver − VOL,max of the driver, V. */
  lowVolts: number;
  verdict: "fits" | "does not fit";
  sentence: string;
};

/**
 * Noise margins of a driver into a receiver, worst case, at the output currents the driver's figures are for.
 * Fits when neither is below zero. Figures of both families are taken as they stand: at one supply for both cards. For
 * cards whose supplies differ within their tolerance see marginsOverSupply.
 *
 * Source: the definitions of the trade; JESD7-A for HC and HCT (named in data sheets, not opened).
 * Leaves out: ringing, crosstalk, drop in the ground between cards, outputs loaded beyond their figures.
 */
export function margins(driver: Family, receiver: Family): Margins {
  const highVolts = voltsBetween(driver.vohMin, receiver.vihMin);
  const lowVolts = voltsBetween(receiver.vilMax, driver.volMax);
  const fits = highVolts >= 0 && lowVolts >= 0;
  const sentence = fits
    ? spare(driver, receiver, highVolts, lowVolts)
    : [highVolts < 0 ? tooLow(driver, receiver) : "", lowVolts < 0 ? tooHigh(driver, receiver) : ""]
        .filter(Boolean)
        .join(" ");
  return { highVolts, lowVolts, verdict: fits ? "fits" : "does not fit", sentence };
}

const tooLow = (driver: Family, receiver: Family) =>
  `${output(driver)} gives ${volts(driver.vohMin)} at worst; the ${input(receiver)} wants ${volts(receiver.vihMin)}.`;

const tooHigh = (driver: Family, receiver: Family) =>
  `${output(driver)} leaves ${volts(driver.volMax)} at worst; the ${input(receiver)} takes up to ${volts(receiver.vilMax)} as low.`;

const spare = (driver: Family, receiver: Family, high: number, low: number) =>
  `${output(driver)} drives the ${input(receiver)} with ${volts(high)} to spare at high and ${volts(low)} at low.`;
