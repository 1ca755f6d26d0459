import type { StandingCheck } from "../check-graph";

export const REWORK_KINDS = ["bodge wire", "cut track", "part swap", "reflow", "firmware", "crimp"] as const;
export type ReworkKind = (typeof REWORK_KINDS)[number];

/** What the rework touches, as people write it. */
export type Touched = {
  /** "PH6", "PH[7:0]". */
  signals: readonly string[];
  /** "J1 a4"; a pin stands for its signal too. */
  pins: readonly string[];
  /** Designators: "U7"; a part stands for its own pins, and for its signals and blocks where the map knows them. */
  parts: readonly string[];
  blocks: readonly string[];
  /** "+5 V", "GND". */
  rails: readonly string[];
};

export type Rework = {
  unitId: string;
  /** Code of the unit's board. */
  board: string;
  kind: ReworkKind;
  touches: Touched;
  /** Units that sit in the machine with it: their integration checks prove its signals too. Empty: it lies on the bench. */
  neighbours: readonly string[];
};

/** What a check says that it proves. */
export type Covers = Pick<Touched, "signals" | "pins" | "rails" | "blocks">;

export type CoveringCheck = StandingCheck & {
  /** Code of the unit's board. */
  board: string;
  covers: Covers;
};

/** What stands behind pins and parts of one board. What is not known is left away. */
export type BoardMap = {
  /** Code of the board. */
  board: string;
  /** By connector: "J1", "a4", "PH6"; by part where the netlist knows its pins: "U7", "3", "PH6". */
  pins: readonly { connector: string; pin: string; signal: string }[];
  /** From the netlist and the board's blocks; without grounds, which no part interrupts. */
  parts: readonly { part: string; signals: readonly string[]; blocks: readonly string[] }[];
  /** Other names that mean the same, agreed on: "PWROK" for "PWR_OK". */
  aliases: readonly { name: string; aliases: readonly string[] }[];
};

/** What the builder changes in the list before the rework is saved. */
export type DoubtChoices = {
  added: readonly { checkId: string; reason: string }[];
  /** Without a reason a check is not spared. */
  spared: readonly { checkId: string; reason: string }[];
};
