/**
 * What a logic family promises at one supply, worst case over its temperature range.
 * Currents are magnitudes in A, voltages in V against ground.
 */
export type Family = {
  /** "HC", "LS", or the project's own: "HC, maker B". */
  name: string;
  technology: "CMOS" | "bipolar";
  /** Supply at which the figures hold, V. */
  volts: number;
  vihMin: number;
  vilMax: number;
  /** High output at worst while it gives iohA. */
  vohMin: number;
  iohA: number;
  /** Low output at worst while it takes iolA. */
  volMax: number;
  iolA: number;
  /** Current into one input at a high level. */
  iihA: number;
  /** Current out of one input at a low level. */
  iilA: number;
  /** Leakage of a switched-off three-state or open-drain output. */
  iozA: number;
  inputPf: number;
  outputPf: number;
  /** Typical delay of a gate into 50 pF (15 pF where the source says so), s; null where no generic figure exists. */
  tpdTypicalS: number | null;
  /** Typical edge of an output into 50 pF, 10–90 %, s. */
  edgeS: number;
  /** Highest voltage an input bears; null: its own supply and no more. */
  inputMaxVolts: number | null;
  /**
   * Supplies at which the family may be used by these figures, V; familyAt moves them inside it and refuses outside.
   * Left away: 4.5 to 5.5 V for figures given in that range, else a tenth up and down.
   */
  supply?: SupplyRange | undefined;
  /** Where the figures come from, and what is from memory. */
  source: string;
};

export type SupplyRange = { minVolts: number; maxVolts: number };
