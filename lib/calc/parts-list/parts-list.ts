/** Money in the smallest unit of a currency (cents), for so many pieces. */
export type Price = { minor: number; pieces: number };

export type PartsListInput = {
  boards: {
    code: string;
    /** Units of the board to build. */
    units: number;
    lines: { part: string; description: string; count: number }[];
  }[];
  /** Spares of every part: this share of what is needed, rounded up, and at least so many. */
  spares: { percent: number; minimum: number };
  /** What is known of a part, by its number. `minimumSpares` goes above the rule for all. */
  known: Record<string, { stock: number; price: Price | null; minimumSpares?: number }>;
};

export type PartsListLine = {
  part: string;
  description: string;
  perBoard: { code: string; perUnit: number; units: number; total: number }[];
  /** On all units of all boards. */
  needed: number;
  spares: number;
  stock: number;
  /** needed + spares − stock, never below zero. */
  toBuy: number;
  price: Price | null;
  /** Of what is to buy, rounded up to the smallest unit; null without a price. */
  costMinor: number | null;
};

export type PartsList = {
  lines: PartsListLine[];
  totals: {
    parts: number;
    needed: number;
    toBuy: number;
    /** Of the lines that have a price. */
    costMinor: number;
    /** Parts to buy whose price is not known: the cost is too low by these. */
    withoutPrice: string[];
  };
};

export type PartsListProblem = { row: string; message: string };
