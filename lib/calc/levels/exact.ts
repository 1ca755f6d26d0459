/** Sums and differences of data-sheet figures in whole microvolts, so that 3.84 − 3.85 is −0.01 and not nearly so. */
const MICRO = 1e6;

const inMicrovolts = (volts: number): number => Math.round(volts * MICRO);

export const voltsBetween = (upper: number, lower: number): number =>
  (inMicrovolts(upper) - inMicrovolts(lower)) / MICRO;

export const roundedVolts = (volts: number): number => inMicrovolts(volts) / MICRO;

/** A current in whole nanoamperes: fine enough for CMOS inputs, and whole numbers divide and add without noise. */
export const nanoamperes = (amperes: number): number => Math.round(amperes * 1e9);

export const amperes = (nano: number): number => nano / 1e9;
