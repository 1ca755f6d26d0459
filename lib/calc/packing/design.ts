import { type LogicPart } from "../logic-parts";

export type GateCount = { gateFunction: string; count: number };

/** A reusable sub-circuit: gates of its own and other blocks, each so many times. */
export type BlockDesign = {
  id: string;
  name: string;
  gates: GateCount[];
  children: { block: string; count: number }[];
};

/** pooled: gates of all blocks of a board share packages; per-block: each use of a block has packages of its own. */
export type PackingMode = "pooled" | "per-block";

export type PackingInput = {
  blocks: BlockDesign[];
  board: {
    /** `block` is the id of one of `blocks`. */
    use: { block: string; count: number }[];
    /** Gates on the board that belong to no block. */
    loose: GateCount[];
  };
  /** The part that implements each gate function, by function; see `choosePackages`. */
  packages: Record<string, LogicPart>;
  /** Family of the packages: "HC". Its inputs decide how spare gates are tied. */
  family: { name: string; technology: "CMOS" | "bipolar" };
  mode: PackingMode;
};

/** Why a design cannot be packed, with the row it is about. */
export type PackingProblem = {
  /** "block:<id>", "block:<id>/gates/2", "block:<id>/children/0", "board/use/1", "board/loose/0". */
  row: string;
  /** For people, naming the row. */
  message: string;
};
