import type { CheckStage } from "../check-graph";

/** One attempt as the order of the work sees it. Instants are milliseconds since 1970, UTC. */
export type AttemptAt = { atMs: number; checkId: string; stage: CheckStage; builder: string };

/** What happened to a check. The first two are attempts; the others change its state without one. */
export type CheckEvent = {
  atMs: number;
  checkId: string;
  what: "conforms" | "does-not-conform" | "conceded" | "withdrawn" | "doubtful" | "reopened";
};

/** Started and stopped by hand; not stopped yet: null. */
export type TypedSession = { builder: string; startMs: number; endMs: number | null };

export type BenchSession = {
  builder: string;
  startMs: number;
  /** Of the last attempt, or when it was stopped. */
  endMs: number;
  /** Whether it was started and stopped by hand; otherwise the gaps between attempts say so. */
  typed: boolean;
  /** In order of time. */
  attempts: AttemptAt[];
  stages: { stage: CheckStage; attempts: number }[];
};

/** Seconds a check takes, by stage; null: not known. */
export type Paces = Readonly<Record<CheckStage, number | null>>;

export const NO_PACES: Paces = {
  inspection: null,
  continuity: null,
  "power-on": null,
  function: null,
  integration: null,
};
