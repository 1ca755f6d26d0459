/** What stands behind the outputs of a part. */
export type PartOutput = "push-pull" | "three-state" | "open-drain";

/** Pins of one gate, flip-flop or other unit of a package. */
export type GatePins = {
  inputs: number[];
  outputs: number[];
  /** Inputs of this gate that rest at the rail when the gate is spare: active-low enables, sets and resets. */
  restHigh: number[];
};

/** Figures of a part in one family. Null: no generic figure; take the data sheet's. */
export type FamilyFigures = {
  /** Supply current of the whole package at rest, at most, A (ICC max over temperature). */
  staticA: number | null;
  /** Power dissipation capacitance, pF. */
  cpdPf: number | null;
  /** Makers state it per gate (per bit of a register or buffer) or per package; a factor of four or eight lies between. */
  cpdPer: "gate" | "package";
  /** At 5 V into 15 pF, 25 °C; the slowest path of the part. */
  tpdTypicalS: number | null;
  /** At worst; the note says at which supply, load and temperature. */
  tpdMaxS: number | null;
  /** Conditions and status of the figures. */
  note: string;
};

/** A logic part of the 74 series in DIP or SO numbering, or the project's own. */
export type LogicPart = {
  /** Number without series and family: "283" of 74HC283. */
  number: string;
  name: string;
  /** What one gate of it does; blocks count gates by this key: "nand2", "xor2", "adder4". */
  gateFunction: string;
  gatesPerPackage: number;
  /** Bits that one gate handles: 1 for a NAND, 8 for an 8-bit register. */
  bitsPerGate: number;
  /** Pins of one gate alone; pins that all gates share are in sharedInputs and sharedOutputs. */
  inputsPerGate: number;
  outputsPerGate: number;
  output: PartOutput;
  pins: number;
  /** One entry a gate, in the order of their letters A, B, C …; null where the pins are not known. */
  pinout: GatePins[] | null;
  /** Selects, clocks, resets and enables common to all gates: such gates can share a package only if these may be common. */
  sharedInputs: number[];
  sharedOutputs: number[];
  /** Pins that carry nothing. */
  unconnectedPins: number[];
  powerPins: number[];
  groundPins: number[];
  /** Of one input, typical, pF. */
  inputPf: number;
  /** By family name: "HC", "HCT", "LS". */
  perFamily: Record<string, FamilyFigures>;
  /** Where pins and figures come from, and what is from memory. */
  source: string;
};
