import type { CheckStage } from "../check-graph";

export type DoubtReason = {
  /** touched: what the check covers meets the rework; relies: it depends on a check that does; added: by hand. */
  why: "touched" | "implied" | "relies" | "added";
  sentence: string;
  /** For relies: the checks in between, the nearest first, the one that is touched last. */
  through: string[];
};

/** What the rework does to one check. Each check has one line. */
export type DoubtLine =
  | { checkId: string; outcome: "doubtful"; reasons: [DoubtReason, ...DoubtReason[]] }
  /** Would be doubtful; the builder said why not. */
  | { checkId: string; outcome: "spared"; reason: string; reasons: [DoubtReason, ...DoubtReason[]] }
  /** Touched, but there is no pass to doubt: the sentence says how it stands. */
  | { checkId: string; outcome: "open"; sentence: string; reasons: [DoubtReason, ...DoubtReason[]] }
  | { checkId: string; outcome: "untouched"; sentence: string };

export type RepeatWork = {
  checks: number;
  stages: { stage: CheckStage; checks: number; /** Null: no pace is known. */ seconds: number | null }[];
  /** Of the stages whose pace is known; null when none is. */
  seconds: number | null;
  /** Checks of stages without a pace. */
  withoutPace: number;
  sentence: string;
};

export type DoubtAfter = {
  /** By unit and position, the reworked unit first. */
  lines: DoubtLine[];
  /** Ids of the checks that become doubtful, in the order of the lines. */
  doubtful: string[];
  repeat: RepeatWork;
  /** What was named and cannot be used: an unknown pin, a check spared without a reason. A sentence each. */
  remarks: string[];
};
