import type { Machine } from "../interconnect";

export type BoardOrderInput = {
  machine: Machine;
  /** Whether the unit at a placement has passed its stages up to power-on. A placement that is not listed is unproven. */
  proofs: readonly { placement: string; proven: boolean }[];
  /** Which board feeds each rail; rails that are fed from outside are left away. */
  railSources: readonly { rail: string; board: string }[];
  overrides: readonly BoardOverride[];
};

/** By codes: `board` comes before `before`, whatever the machine says. */
export type BoardOverride = { board: string; before: string; reason: string };

export type BoardLink = {
  from: string;
  to: string;
  /** carries: a backplane, through which the boards meet; said: an override. */
  kind: "supplies" | "drives" | "carries" | "said";
  /** Names of the nets that say so, in natural order; empty for carries and said. */
  nets: string[];
  sentence: string;
};

/** Lines between a board on the extender and other boards. */
export type Apart = { boards: string[]; nets: string[]; sentence: string };

export type BoardStep = {
  board: string;
  /** Where it stands; empty: nowhere in the machine yet. */
  units: { label: string; proven: boolean }[];
  /** Boards that carry, supply or drive it and are proven by then, or said to come before it. */
  after: string[];
  /** What boards that are not proven by then would give it: the bench holds these lines instead. Null: nothing. */
  held: Apart | null;
  /** What it would give to boards that are proven by then: the extender leaves these lines open. Null: nothing. */
  open: Apart | null;
  reason: string;
};

/** An unproven board that drives or supplies a proven one as the machine stands. */
export type BoardRisk = { unproven: string; proven: string; nets: string[]; sentence: string };

export type BoardOrder = {
  /** Unproven boards in the order of proving them. */
  steps: BoardStep[];
  /** In natural order. */
  proven: string[];
  /** All that the machine and the overrides say, by names of the boards. */
  links: BoardLink[];
  risks: BoardRisk[];
  /** Overrides that go against the machine, and what cannot be used. */
  remarks: string[];
};

export type BoardOrdering = { ok: true; value: BoardOrder } | { ok: false; circle: string[]; message: string };
