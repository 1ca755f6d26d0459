/** One kind of part in a chain, so many times. Null: no figure. */
export type DelayStep = {
  name: string;
  count: number;
  minS: number | null;
  typicalS: number | null;
  maxS: number | null;
};

/** Load and supply at which a step's figures hold, and at which it works; null: as the data sheet says. */
export type Derating = {
  technology: "CMOS" | "bipolar";
  /** The data sheet's, V and pF. */
  statedVolts: number;
  statedPf: number;
  /** What the board has. */
  volts: number;
  loadPf: number;
  /** Resistance of the output while it switches, Ω: about VOL / IOL of the family. */
  outputOhm: number;
};

export type DelayPath = {
  steps: DelayStep[];
  derating: Derating | null;
  /**
   * Where a step has no lowest (highest) delay: null leaves the sum open; a number takes this share of the typical one.
   * Common practice, no source: ¼ for the lowest, 2 for the highest.
   */
  unknownMinShare: number | null;
  unknownMaxShare: number | null;
};

export type StepDelay = DelayStep & {
  /** For all pieces of the step, derated; null where unknown and no share is given. */
  sumMinS: number | null;
  sumTypicalS: number;
  sumMaxS: number | null;
  /** True where the figure comes from a share of the typical delay and not from a data sheet. */
  minAssumed: boolean;
  maxAssumed: boolean;
};

export type PathDelay = {
  steps: StepDelay[];
  minS: number | null;
  typicalS: number;
  /** Every part at its slowest at once. */
  worstCaseS: number | null;
  /** Parts vary independently: typical + √Σ(max − typical)². Not a bound. */
  rootSumSquareS: number | null;
  /** What was derated, assumed or left open. */
  notes: string[];
};

export type DelayProblem = { row: string; message: string };

/** What a capture of the delay may show, s. Null: open on this side. */
export type DelayWindow = { lowerS: number | null; expectedS: number; upperS: number | null; rule: string };

export type ClockInput = {
  /** The path between two registers. */
  path: PathDelay;
  clockToOutputMaxS: number;
  setupS: number;
  /** By how much the receiving clock may come early. */
  skewS: number;
  /** For the hold check; null: not asked for or not known. */
  hold: { clockToOutputMinS: number | null; holdS: number } | null;
};

export type ClockLimit = {
  /** The sum that the period must not fall below, s; null while the path has no highest delay. */
  periodS: number | null;
  highestHz: number | null;
  /** Time by which the data outlast the hold time, s; null: not known. Below zero: they change too early. */
  holdSlackS: number | null;
  sentences: string[];
};
