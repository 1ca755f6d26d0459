import { type PowerItem, type Spread } from "./item";

/** What one item takes from a rail, for all its pieces. */
export type DrawLine = {
  label: string;
  kind: PowerItem["kind"];
  rail: string;
  count: number;
  amps: Spread;
  /** Of the typical current, what surely flows without a clock. */
  atRestA: number;
  /** What it is made of: "at rest 80 µA, Cpd 1.2 mA, loads 3.1 mA". */
  reason: string;
};

export type RailDraw = {
  rail: string;
  volts: number;
  /** A regulator of the board makes it; the board's own connector does not bring it. */
  madeHere: boolean;
  lines: DrawLine[];
  /** Sum of the lines. */
  computed: Spread;
  typed: Spread | null;
  /** What other boards take from this rail through this board. */
  passedOn: Spread;
  /** The typed-in figures where there are some, else the computed ones; with what is passed on. */
  taken: Spread;
  source: "typed" | "computed";
  /** Of the typical current, what surely flows without a clock; in proportion where the figure is typed in. */
  atRestA: number;
};

export type BoardPower = {
  rails: RailDraw[];
  /** What the board takes in and does not pass on, W. */
  heatW: Spread;
  /** What the sum leaves out: "No Cpd is known of 74HC05: its switching is left out." */
  notes: string[];
};
