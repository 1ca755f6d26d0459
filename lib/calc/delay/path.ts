import type { Family } from "../levels";

/** One kind of part in a chain, so many times. Null: no figure. */
export type DelayStep = {
  name: string;
  count: number;
  minS: number | null;
  typicalS: number | null;
  maxS: number | null;
};

/** Supply and load at which a figure holds or a part works. */
export type DelayCondition = { volts: number; loadPf: number };

/** How the data sheet's conditions and the board's differ; the same for all steps of a path. */
export type Derating = {
  family: Family;
  /** Of the typical delays: often 5 V, 15 pF. */
  typicalAt: DelayCondition;
  /** Of the lowest and highest delays: often 4.5 V, 50 pF. */
  limitsAt: DelayCondition;
  board: DelayCondition;
};

export type DelayPath = {
  steps: DelayStep[];
  /** Null: the figures are taken as they are. */
  derating: Derating | null;
  /**
   * Where a step has no lowest (highest) delay: null leaves the sum open; a number takes this share of the typical one.
   * Common practice, no source: a quarter for the lowest, twice for the highest.
   */
  unknownMinShare: number | null;
  unknownMaxShare: number | null;
};

export type StepDelay = {
  name: string;
  count: number;
  /** For all pieces of the step at the board's load and supply; null where unknown and no share is given. */
  minS: number | null;
  typicalS: number;
  maxS: number | null;
  /** True where the figure is a share of the typical delay and not a data sheet's. */
  minAssumed: boolean;
  maxAssumed: boolean;
};

export type PathDelay = {
  steps: StepDelay[];
  minS: number | null;
  typicalS: number;
  /** Every part at its slowest at once. */
  worstCaseS: number | null;
  /** Parts vary independently: typical + √Σ(max − typical)². Likely, not a bound. */
  rootSumSquareS: number | null;
  /** What was derated, assumed or left open. */
  notes: string[];
};
