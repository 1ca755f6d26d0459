import type { Machine } from "../interconnect";

export type BoardOrderInput = {
  machine: Machine;
  /** Whether the unit at a placement has passed its stages up to power-on. A placement that is not listed is unproven. */
  proofs: readonly { placement: string; proven: boolean }[];
  /** Which board feeds each rail; rails that are fed from outside are left away. */
  railSources: readonly { rail: string; board: string }[];
  overrides: readonly BoardOverride[];
};

/** By codes; stronger than what the machine says. */
export type BoardOverride = { board: string; before: string; reason: string };

export type BoardLink = {
  from: string;
  to: string;
  /** carries: a backplane, through which all boards meet; said: an override. */
  kind: "supplies" | "drives" | "carries" | "said";
  /** Names of the nets that say so, in natural order. */
  nets: string[];
  sentence: string;
};

export type BoardStep = {
  board: string;
  /** Where it stands: labels of its placements. */
  units: { label: string; proven: boolean }[];
  /** Boards that supply or drive it and come before it. */
  after: string[];
  /** Prove it on the extender, with what the named boards would drive held by the bench; null: not needed. */
  apart: { from: string[]; nets: string[]; sentence: string } | null;
  reason: string;
};

/** An unproven board that drives or supplies a proven one as the machine stands. */
export type BoardRisk = { unproven: string; proven: string; nets: string[]; sentence: string };

export type BoardOrder = {
  /** Unproven boards in the order of proving them. */
  steps: BoardStep[];
  proven: string[];
  links: BoardLink[];
  risks: BoardRisk[];
  /** Overrides that go against what the machine says, and what to mind. */
  remarks: string[];
};

export type BoardOrdering = { ok: true; value: BoardOrder } | { ok: false; circle: string[]; message: string };
