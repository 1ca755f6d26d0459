import type { Paces } from "@/lib/calc/forecast";
import type { Stage } from "@/db/schema/procedures";

export type SessionLine = {
  key: string;
  builder: string;
  isOwn: boolean;
  startedAt: string;
  seconds: number;
  /** Started by hand; otherwise the gaps between attempts say so. */
  typed: boolean;
  isRunning: boolean;
  attempts: number;
  /** "5 continuity, 3 function"; empty: nothing was recorded. */
  stages: string;
  units: string[];
};

export type PaceLine = {
  stage: Stage;
  name: string;
  /** Median seconds a check; null: fewer than three times known. */
  ownS: number | null;
  everybodyS: number | null;
};

export type BenchSessionsView = {
  /** The newest first. */
  sessions: SessionLine[];
  /** When the viewer sat down; null: no session of theirs runs. */
  running: string | null;
  /** What the estimates for the viewer use. */
  paces: Paces;
  paceLines: PaceLine[];
};
