/** Typical and worst of one quantity. */
export type Spread = { typical: number; worst: number };

/**
 * Logic packages of one kind that work alike. Currents in A, frequencies in Hz, capacitances in pF.
 * Null figures are left out of the sum and told.
 */
export type PackageItem = {
  kind: "package";
  /** "74HC283" */
  label: string;
  rail: string;
  count: number;
  /** Of one package at rest. Typical is what flows without a clock. */
  staticA: Spread | null;
  cpdPf: number | null;
  /** Gates or bits of one package that switch, on average; 1 where Cpd is stated per package. */
  switching: number;
  /** How often such an input changes to and fro. */
  inputHz: Spread;
  /** Outputs of one package that switch, on average, each into loadPf, each at outputHz (half of the input's for a divide by two). */
  outputs: number;
  outputHz: Spread;
  loadPf: number;
  /** Additional current of CMOS inputs with TTL levels (ΔICC × unit load), for all inputs of one package at TTL highs. */
  ttlInputs: { count: number; extraA: number; highShare: number } | null;
};

/** Lit through a resistor from the rail. */
export type LedItem = {
  kind: "led";
  label: string;
  rail: string;
  count: number;
  forwardVolts: number;
  ohm: number;
  /** Share of the time, or of the LEDs, that is lit: 0 … 1. */
  lit: Spread;
};

/** Takes current while its line is low. */
export type PullUpItem = {
  kind: "pull-up";
  label: string;
  rail: string;
  count: number;
  ohm: number;
  lowVolts: number;
  /** Share of the time that the line is low: 0 … 1. */
  lowShare: Spread;
};

/** Makes one rail of the board from another. */
export type RegulatorItem = {
  kind: "regulator";
  label: string;
  /** Where it takes its current. */
  rail: string;
  /** The rail it makes on the board. */
  output: string;
  outputVolts: number;
  /** A linear one passes the current on and adds its own; a switching one passes the power on through its efficiency. */
  type: { kind: "linear"; groundA: number } | { kind: "switching"; efficiency: number };
};

/** A figure that somebody read in a data sheet or guessed, added to the computed ones: a display, a memory, a relay. */
export type FixedItem = {
  kind: "fixed";
  label: string;
  rail: string;
  count: number;
  typicalA: number;
  worstA: number;
  /** Share that flows without a clock: 0 … 1. */
  atRest: number;
};

export type PowerItem = PackageItem | LedItem | PullUpItem | RegulatorItem | FixedItem;

/** Current from a rail, typed in or measured. */
export type TypedDraw = { rail: string; typicalA: number; worstA: number };

export type RailSupply = {
  name: string;
  volts: number;
  tolerancePercent: number;
};

export type BoardPowerInput = {
  items: PowerItem[];
  /** The machine's rails; those that regulators of the board make need not be among them. */
  rails: RailSupply[];
  /** For the whole board from a rail: stands instead of the computed sum, which is shown beside it. */
  typed: TypedDraw[];
  /** What other boards take from rails that this board makes. */
  elsewhere: TypedDraw[];
};
