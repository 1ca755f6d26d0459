import { type PathDelay } from "./path";

/** What a capture of the delay may show, s. Null: open on this side. */
export type DelayWindow = { lowerS: number | null; expectedS: number; upperS: number | null; rule: string };

/**
 * Limits for a capture of the path: from the sum of the lowest delays to the worst case. A side whose figures are not
 * known stays open rather than being made up. Leaves out what the scope and its probes add.
 */
export function delayWindow({ minS, typicalS, worstCaseS, steps }: PathDelay): DelayWindow {
  const assumed = steps.some((step) => step.minAssumed || step.maxAssumed);
  const lower = minS === null ? "open below, since lowest delays are not known" : "from the sum of the lowest delays";
  const upper = worstCaseS === null ? "open above, since highest delays are not known" : "up to the worst case";
  const status = assumed ? " Some limits are assumed shares of typical delays (common practice, no source)." : "";
  return {
    lowerS: minS,
    expectedS: typicalS,
    upperS: worstCaseS,
    rule: `Expected: the sum of typical delays; ${lower}, ${upper}.${status}`,
  };
}
