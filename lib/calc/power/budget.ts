import { type Spread } from "./item";

/** What one item takes from a rail, for all its pieces. */
export type DrawLine = {
  label: string;
  kind: string;
  rail: string;
  count: number;
  amps: Spread;
  /** Of the typical current, what flows without a clock. */
  atRestA: number;
  /** How it comes together: "4 × (Cpd 88 pF + 5 outputs × 50 pF) × 5 V × 2 MHz …" */
  reason: string;
};

export type RailDraw = {
  rail: string;
  volts: number;
  lines: DrawLine[];
  computed: Spread;
  typed: Spread | null;
  /** The typed-in figures where there are some, else the computed ones. */
  taken: Spread;
  source: "typed" | "computed";
  /** Of the typical current, what flows without a clock; scaled to the typed-in figure. */
  atRestA: number;
};

export type BoardPower = {
  rails: RailDraw[];
  /** All of it becomes heat on the board, W. */
  heatW: Spread;
  /** What the sum leaves out: "74HC05 has no Cpd: its switching is left out." */
  notes: string[];
};

export type PowerProblem = { row: string; message: string };

/** What a bench supply shall show at first power, and where it shall stop, A. */
export type CurrentWindow = {
  rail: string;
  volts: number;
  lowerA: number;
  expectedA: number;
  upperA: number;
  /** To set on the bench supply. */
  limitA: number;
  /** How the figures come about, for the sheet. */
  rule: string;
};
