import { type PackingMode } from "./design";

/** Packages of one kind: all of a function on the board, or those of one block when blocks keep their own. */
export type PackageLine = {
  /** "74HC86" */
  part: string;
  partName: string;
  gateFunction: string;
  count: number;
  gatesPerPackage: number;
  gatesUsed: number;
  spareGates: number;
  /** Name of the block whose packages these are; null: shared by the board. */
  forBlock: string | null;
};

/** One gate of one package. */
export type PackedGate = {
  /** "A", "B" … in the order of the package's gates. */
  gate: string;
  /** Pins by number; null where the part's pins are not known. */
  inputs: number[] | null;
  outputs: number[] | null;
  /** "Full adder 3 of 4", "loose gates"; null: spare. */
  usedBy: string | null;
};

/** A suggestion that a builder may follow: which gate goes where. */
export type PlacedPackage = {
  /** "U1" */
  designator: string;
  part: string;
  gateFunction: string;
  gates: PackedGate[];
};

/** What to do with the pins of a spare gate. */
export type SpareGate = {
  designator: string;
  part: string;
  gate: string;
  gateFunction: string;
  inputCount: number;
  /** Pins to tie to ground, and pins to tie to the rail; both empty where the pins are not known. */
  tieLow: number[];
  tieHigh: number[];
  /** Outputs stay open. */
  leaveOpen: number[];
  /** "U3 gate D (74HC32): pins 12 and 13 to ground, pin 11 stays open." */
  sentence: string;
};

export type Decoupling = {
  /** One a package. */
  packageCapacitors: number;
  packageFarad: number;
  bulkCapacitors: number;
  bulkFarad: number;
  /** The rule and where it comes from. */
  rule: string;
};

export type Packing = {
  mode: PackingMode;
  lines: PackageLine[];
  packages: PlacedPackage[];
  packageCount: number;
  gatesUsed: number;
  spares: SpareGate[];
  decoupling: Decoupling;
  /** Packages when each use of a block has its own, and when all share. */
  perBlockCount: number;
  pooledCount: number;
  /** Packages that pooling saves: perBlockCount − pooledCount. */
  poolingSaves: number;
  /** No packing can do with fewer: Σ ⌈gates of a function / gates per package⌉. */
  lowerBound: number;
  /** What the count cannot know: "Gates of 74HC157 share a select …". */
  notes: string[];
};
